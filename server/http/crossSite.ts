/** Refuses unsafe requests that another site's page made with a person's cookie. */
import type { Request, RequestHandler } from 'express';
import { Refused } from './refused';

const safe = new Set(['GET', 'HEAD', 'OPTIONS']);

function sameOrigin(request: Request): boolean {
  const site = request.get('sec-fetch-site');
  if (site !== undefined) return site === 'same-origin';
  const origin = request.get('origin');
  if (origin !== undefined) return URL.canParse(origin) && new URL(origin).host === request.get('host');
  // Neither header: no browser made this request; with a cookie it is refused all the same.
  return request.get('cookie') === undefined;
}

export const crossSite: RequestHandler = (request, _response, next) => {
  if (!safe.has(request.method) && !sameOrigin(request)) throw new Refused(403, 'cross-site');
  next();
};
