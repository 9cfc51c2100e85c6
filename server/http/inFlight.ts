/** Back-pressure: past so many requests at once the next is asked to come again, instead of all growing slow. */
import type { RequestHandler } from 'express';
import { Refused } from './refused';

/** @param most requests of these routes being worked on in this process. */
export function limitInFlight(most: number, retryAfterS: number): RequestHandler {
  let working = 0;
  return (_request, response, next) => {
    if (working >= most) throw new Refused(503, 'busy', {}, [], { 'retry-after': String(retryAfterS) });
    working += 1;
    response.once('close', () => {
      working -= 1;
    });
    next();
  };
}
