/** Sessions in PostgreSQL and the person behind them. */
import connectPgSimple from 'connect-pg-simple';
import type { RequestHandler } from 'express';
import session from 'express-session';
import passport from 'passport';
import { Strategy } from 'passport-local';
import { Pool } from 'pg';
import type { Config } from '../../config';
import type { PeopleService } from '../people/service';

const days = 24 * 3_600_000;
/** A shift rota repeats within two weeks; a phone used in it should not ask for the password again. */
const sessionMs = 14 * days;

export interface SessionParts {
  passport: passport.Authenticator;
  handlers: RequestHandler[];
  close: () => Promise<void>;
}

export function sessionParts(config: Config, people: PeopleService): SessionParts {
  const pool = new Pool({ connectionString: config.databaseUrl, max: 5, options: '-c role=coldloop_app' });
  const PgStore = connectPgSimple(session);
  const store = new PgStore({ pool, tableName: 'session', pruneSessionInterval: 900 });
  const own = new passport.Passport();
  own.use(
    new Strategy({ usernameField: 'email', session: true }, (email, password, done) => {
      people.checkPassword(email, password).then(
        (found) => done(null, found ?? false),
        (error: unknown) => done(error),
      );
    }),
  );
  own.serializeUser((user, done) => done(null, { person: user.person, epoch: user.epoch }));
  own.deserializeUser((kept: { person: string; epoch: number }, done) => {
    people.actor(kept.person, kept.epoch).then(
      (actor) => done(null, actor ?? false),
      (error: unknown) => done(error),
    );
  });
  return {
    passport: own,
    handlers: [
      session({
        store,
        secret: config.sessionSecret,
        name: 'coldloop',
        resave: false,
        saveUninitialized: false,
        rolling: true,
        cookie: {
          httpOnly: true,
          sameSite: 'lax',
          secure: config.baseUrl.startsWith('https:'),
          maxAge: sessionMs,
        },
      }),
      own.session() as RequestHandler,
    ],
    close: async () => {
      store.close();
      await pool.end();
    },
  };
}
