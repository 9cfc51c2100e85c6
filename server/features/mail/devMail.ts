/** The local mail fake: an SMTP server that keeps each mail as a file, and the page that shows them. Never in production. */
import { mkdir, readdir, readFile, writeFile } from 'node:fs/promises';
import { join } from 'node:path';
import { Router } from 'express';
import { simpleParser } from 'mailparser';
import { SMTPServer } from 'smtp-server';
import { z } from 'zod';
import { authorise } from '../../http/authorise';

const keptMail = z.object({
  at: z.string(),
  to: z.string(),
  subject: z.string(),
  text: z.string(),
  attachments: z.array(z.string()),
});
type KeptMail = z.infer<typeof keptMail>;

async function keep(folder: string, raw: NodeJS.ReadableStream): Promise<void> {
  const mail = await simpleParser(raw as never);
  const to = Array.isArray(mail.to) ? mail.to.map((each) => each.text).join(', ') : (mail.to?.text ?? '');
  const kept: KeptMail = {
    at: new Date().toISOString(),
    to,
    subject: mail.subject ?? '',
    text: mail.text ?? '',
    attachments: mail.attachments.map((each) => each.filename ?? 'file'),
  };
  await writeFile(
    join(folder, `${kept.at.replace(/[:.]/g, '-')}-${process.hrtime.bigint()}.json`),
    JSON.stringify(kept),
  );
}

/** Starts the fake on a loopback port (0 = any free one) and answers the port. */
export async function startMailFake(
  folder: string,
  port = 0,
): Promise<{ port: number; close: () => Promise<void> }> {
  await mkdir(folder, { recursive: true });
  const server = new SMTPServer({
    authOptional: true,
    disabledCommands: ['STARTTLS', 'AUTH'],
    onData: (stream, _session, done) => {
      keep(folder, stream).then(
        () => done(),
        (error: unknown) => done(error as Error),
      );
    },
  });
  await new Promise<void>((resolve, reject) => {
    server.once('error', reject);
    server.listen(port, '127.0.0.1', resolve);
  });
  const address = server.server.address();
  if (address === null || typeof address === 'string') throw new Error('the mail fake has no port');
  return { port: address.port, close: () => new Promise((resolve) => server.close(() => resolve())) };
}

export async function readDevMail(folder: string): Promise<KeptMail[]> {
  const names = (await readdir(folder).catch(() => []))
    .filter((name) => name.endsWith('.json'))
    .sort()
    .reverse();
  return Promise.all(
    names
      .slice(0, 200)
      .map(async (name) => keptMail.parse(JSON.parse(await readFile(join(folder, name), 'utf8')))),
  );
}

const escapeHtml = (value: string): string => value.replace(/[&<>"']/g, (sign) => `&#${sign.charCodeAt(0)};`);
const withLinks = (escaped: string): string =>
  escaped.replace(/https?:\/\/[^\s]+/g, (url) => `<a href="${url}">${url}</a>`);

const card = (mail: KeptMail): string =>
  `<article><h2>${escapeHtml(mail.subject)}</h2><p>${escapeHtml(mail.to)} · ${escapeHtml(mail.at)}</p><pre>${withLinks(escapeHtml(mail.text))}</pre>${mail.attachments.map((name) => `<p>[${escapeHtml(name)}]</p>`).join('')}</article>`;

export function devMailRoutes(folder: string): Router {
  const router = Router();
  router.get('/dev/mail', authorise({ who: 'anyone' }), async (_request, response) => {
    const mails = await readDevMail(folder);
    const body = mails.length === 0 ? '<p>No mail yet.</p>' : mails.map(card).join('<hr>');
    response
      .type('html')
      .set('cache-control', 'no-store')
      .send(
        `<!doctype html><html lang="en"><head><meta charset="utf-8"><meta name="viewport" content="width=device-width"><title>Local mail</title></head><body><main><h1>Local mail</h1>${body}</main></body></html>`,
      );
  });
  return router;
}
