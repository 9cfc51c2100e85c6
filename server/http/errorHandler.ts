/** Turns what was thrown into application/problem+json; a fault is logged and told without its inside. */
import type { ErrorRequestHandler } from 'express';
import type { Logger } from 'pino';
import type { Language, Problem } from '../../shared/api/common';
import { render } from '../../shared/wording/render';
import { languageOf } from './language';
import { Refused, type PathError } from './refused';

/** What Express and its body parsers throw carries a status and a type. */
function fromParser(error: unknown): Refused | null {
  if (typeof error !== 'object' || error === null || !('status' in error) || typeof error.status !== 'number')
    return null;
  if (error.status === 413) return new Refused(413, 'too-large');
  if (error.status === 415) return new Refused(415, 'unreadable');
  if (error.status >= 400 && error.status < 500) return new Refused(400, 'unreadable');
  return null;
}

const inWords =
  (language: Language) =>
  ({ path, says }: PathError) => ({
    path,
    says: typeof says === 'string' ? says : render(language, says),
  });

function problemOf(refused: Refused, language: Language): Problem {
  return {
    type: `urn:coldloop:problem:${refused.code}`,
    title: render(language, { key: `problem.${refused.code}`, params: refused.params }),
    status: refused.status,
    code: refused.code,
    ...(refused.errors.length > 0 ? { errors: refused.errors.map(inWords(language)) } : {}),
    ...refused.facts,
  };
}

export function errorHandler(log: Logger): ErrorRequestHandler {
  return (error: unknown, request, response, next) => {
    if (response.headersSent) {
      next(error);
      return;
    }
    const expected = error instanceof Refused ? error : fromParser(error);
    if (!expected) log.error({ err: error, method: request.method, path: request.path }, 'request failed');
    const refused = expected ?? new Refused(500, 'fault');
    response
      .status(refused.status)
      .set(refused.headers)
      .type('application/problem+json')
      .send(JSON.stringify(problemOf(refused, languageOf(request))));
  };
}
