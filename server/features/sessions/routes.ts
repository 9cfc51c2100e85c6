import { Router, type Request, type RequestHandler, type Response } from 'express';
import type passport from 'passport';
import { signInRequest } from '../../../shared/api/people';
import { actorOf, authorise } from '../../http/authorise';
import type { Limiter, Tries } from '../../http/limiter';
import { parse } from '../../http/parse';
import { Refused } from '../../http/refused';
import type { SessionsService } from './service';

const minutes = 60_000;
/** Ten wrong tries in a quarter of an hour: enough for cold fingers, too few for guessing. */
const perAccount: Tries = {
  prefix: 'sign-in',
  windowMs: 15 * minutes,
  limit: 10,
  key: (request) => parse(signInRequest, request.body).email,
};
/** Many people share a site's address, so it gets more. */
const perAddress: Tries = {
  prefix: 'sign-in-from',
  windowMs: 15 * minutes,
  limit: 100,
  key: (request) => request.ip ?? 'unknown',
};

/** passport and the session store call back with whatever went wrong. */
const asError = (error: unknown): Error =>
  error instanceof Error ? error : new Error('sign-in failed', { cause: error });

const signedIn = (
  authenticator: passport.Authenticator,
  request: Request,
  response: Response,
): Promise<Express.User | false> =>
  new Promise((resolve, reject) => {
    const handler = authenticator.authenticate('local', (error: unknown, user: Express.User | false) => {
      if (error) reject(asError(error));
      else resolve(user);
    }) as RequestHandler;
    void handler(request, response, reject);
  });

/** passport regenerates the session on logIn, so a session id from before sign-in is worth nothing. */
const openSession = (request: Request, user: Express.User): Promise<void> =>
  new Promise((resolve, reject) =>
    request.logIn(user, (error: unknown) => (error ? reject(asError(error)) : resolve())),
  );
const closeSession = (request: Request): Promise<void> =>
  new Promise((resolve, reject) =>
    request.session.destroy((error: unknown) => (error ? reject(asError(error)) : resolve())),
  );

export function sessionRoutes(
  limiter: Limiter,
  authenticator: passport.Authenticator,
  sessions: SessionsService,
): Router {
  const router = Router();
  router.post(
    '/session',
    authorise({ who: 'anyone' }),
    limiter(perAddress),
    limiter(perAccount),
    async (request, response) => {
      const user = await signedIn(authenticator, request, response);
      if (!user) throw new Refused(401, 'wrong-sign-in');
      await openSession(request, user);
      response.json(await sessions.view(user.person));
    },
  );
  router.get('/session', authorise({ who: 'signed-in' }), async (request, response) => {
    response.json(await sessions.view(actorOf(request).person));
  });
  router.delete('/session', authorise({ who: 'signed-in' }), async (request, response) => {
    await closeSession(request);
    response.clearCookie('coldloop').status(204).end();
  });
  return router;
}
