/** Serves the built client: hashed files for ever, the shell never cached, every page URL answered by the shell. */
import { existsSync } from 'node:fs';
import { join, resolve } from 'node:path';
import express, { type RequestHandler } from 'express';

export const clientFolder = resolve(import.meta.dirname, '../../dist/client');

export function staticClient(): RequestHandler {
  return express.static(clientFolder, {
    index: false,
    setHeaders: (response, path) => {
      const hashed = path.includes(join('client', 'assets'));
      response.setHeader('cache-control', hashed ? 'public, max-age=31536000, immutable' : 'no-cache');
    },
  });
}

/** The shell for any page URL; API paths were answered before. */
export const clientShell: RequestHandler = (request, response, next) => {
  const shell = join(clientFolder, 'index.html');
  if (request.method !== 'GET' || request.accepts('html') !== 'html' || !existsSync(shell)) {
    next();
    return;
  }
  response.set('cache-control', 'no-cache').sendFile(shell);
};
