import { Router, type Request, type RequestHandler } from 'express';
import { rateLimit } from 'express-rate-limit';
import type passport from 'passport';
import type { DataSource } from 'typeorm';
import { signInRequest } from '../../../shared/api/people';
import { actorOf, authorise } from '../../http/authorise';
import { parse } from '../../http/parse';
import { rateLimitStore } from '../../http/rateLimitStore';
import { Refused } from '../../http/refused';
import type { SessionsService } from './service';

const minutes = 60_000;
/** Ten wrong tries in a quarter of an hour: enough for cold fingers, too few for guessing. */
const tries = { windowMs: 15 * minutes, limit: 10 };
/** Many people share a site's address, so it gets more. */
const triesOfAddress = { windowMs: 15 * minutes, limit: 100 };

function limiter(
  database: DataSource,
  { windowMs, limit }: typeof tries,
  prefix: string,
  key: (request: Request) => string,
): RequestHandler {
  return rateLimit({
    windowMs,
    limit,
    standardHeaders: 'draft-8',
    legacyHeaders: false,
    skipSuccessfulRequests: true,
    store: rateLimitStore(database, windowMs),
    keyGenerator: (request) => `${prefix}:${key(request)}`,
    handler: () => {
      throw new Refused(429, 'too-many-tries', { minutes: windowMs / minutes }, [], {
        'retry-after': String(windowMs / 1000),
      });
    },
    validate: { unsharedStore: false, keyGeneratorIpFallback: false },
  });
}

const signedIn = (authenticator: passport.Authenticator, request: Request): Promise<Express.User | false> =>
  new Promise((resolve, reject) => {
    const handler = authenticator.authenticate('local', (error: unknown, user: Express.User | false) => {
      if (error) reject(error as Error);
      else resolve(user);
    }) as RequestHandler;
    void handler(request, request.res!, reject);
  });

/** passport regenerates the session on logIn, so a session id from before sign-in is worth nothing. */
const openSession = (request: Request, user: Express.User): Promise<void> =>
  new Promise((resolve, reject) =>
    request.logIn(user, (error: unknown) => (error ? reject(error as Error) : resolve())),
  );
const closeSession = (request: Request): Promise<void> =>
  new Promise((resolve, reject) =>
    request.session.destroy((error: unknown) => (error ? reject(error as Error) : resolve())),
  );

export function sessionRoutes(
  database: DataSource,
  authenticator: passport.Authenticator,
  sessions: SessionsService,
): Router {
  const router = Router();
  const perAccount = limiter(
    database,
    tries,
    'sign-in',
    (request) => parse(signInRequest, request.body).email,
  );
  const perAddress = limiter(database, triesOfAddress, 'sign-in-from', (request) => request.ip ?? 'unknown');
  router.post('/session', authorise({ who: 'anyone' }), perAddress, perAccount, async (request, response) => {
    const user = await signedIn(authenticator, request);
    if (!user) throw new Refused(401, 'wrong-sign-in');
    await openSession(request, user);
    response.json(await sessions.view(user.person));
  });
  router.get('/session', authorise({ who: 'signed-in' }), async (request, response) => {
    response.json(await sessions.view(actorOf(request).person));
  });
  router.delete('/session', authorise({ who: 'signed-in' }), async (request, response) => {
    await closeSession(request);
    response.clearCookie('coldloop').status(204).end();
  });
  return router;
}
