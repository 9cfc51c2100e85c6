/** Rate-limit counts in PostgreSQL, so that several server processes share them. */
import type { ClientRateLimitInfo, Store } from 'express-rate-limit';
import type { DataSource } from 'typeorm';

interface Row {
  hits: number;
  resets_at: Date;
}

export function rateLimitStore(database: DataSource, windowMs: number): Store {
  return {
    async increment(key): Promise<ClientRateLimitInfo> {
      const rows = await database.query<Row[]>(
        `INSERT INTO rate_limit AS r (key, hits, resets_at) VALUES ($1, 1, now() + $2 * interval '1 millisecond')
         ON CONFLICT (key) DO UPDATE SET
           hits = CASE WHEN r.resets_at < now() THEN 1 ELSE r.hits + 1 END,
           resets_at = CASE WHEN r.resets_at < now() THEN excluded.resets_at ELSE r.resets_at END
         RETURNING hits, resets_at`,
        [key, windowMs],
      );
      const row = rows[0];
      if (!row) throw new Error('the rate limit row was not written');
      return { totalHits: row.hits, resetTime: row.resets_at };
    },
    async decrement(key) {
      await database.query('UPDATE rate_limit SET hits = greatest(hits - 1, 0) WHERE key = $1', [key]);
    },
    async resetKey(key) {
      await database.query('DELETE FROM rate_limit WHERE key = $1', [key]);
    },
  };
}
