import type { RequestHandler } from 'express';

/** Answers of the API are nobody's to keep but the client's own store. */
export const noStore: RequestHandler = (_request, response, next) => {
  response.set('cache-control', 'no-store');
  next();
};
