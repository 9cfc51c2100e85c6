/** Refuses too many failed tries of one kind from one key; counted in PostgreSQL, so every server counts the same. */
import type { Request, RequestHandler } from 'express';
import { rateLimit } from 'express-rate-limit';
import type { DataSource } from 'typeorm';
import { rateLimitStore } from './rateLimitStore';
import { Refused } from './refused';

const minute = 60_000;

export interface Tries {
  prefix: string;
  windowMs: number;
  limit: number;
  key: (request: Request) => string;
}
export type Limiter = (tries: Tries) => RequestHandler;

export const limiterOn =
  (database: DataSource): Limiter =>
  ({ prefix, windowMs, limit, key }) =>
    rateLimit({
      windowMs,
      limit,
      standardHeaders: 'draft-8',
      legacyHeaders: false,
      skipSuccessfulRequests: true,
      store: rateLimitStore(database, windowMs),
      keyGenerator: (request) => `${prefix}:${key(request)}`,
      handler: () => {
        throw new Refused(429, 'too-many-tries', { minutes: windowMs / minute }, [], {
          'retry-after': String(windowMs / 1000),
        });
      },
      validate: { unsharedStore: false, keyGeneratorIpFallback: false },
    });
