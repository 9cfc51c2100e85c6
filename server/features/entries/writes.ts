/** The statements of a push: what is held, and what is added, each one statement however many entries there are. */
import type { EntityManager } from 'typeorm';
import type { Arrival } from './received';
import { placeOf, type Held } from './sorting';

/** Reads what the database holds of the ids and parents that these arrivals name. The job's row must be taken. */
export async function readHeld(tx: EntityManager, arrivals: readonly Arrival[]): Promise<Held> {
  const ids = arrivals.map(({ entry }) => entry.id);
  const entries = await tx.query<{ id: string; hash: string; order: number }[]>(
    'SELECT id, hash, "order" FROM entry WHERE id = ANY($1)',
    [ids],
  );
  const aside = await tx.query<{ id: string; hash: string }[]>(
    'SELECT id, hash FROM entry_set_aside WHERE id = ANY($1)',
    [ids],
  );
  const named = arrivals.filter(({ entry }) => entry.previous !== null);
  const parents = await tx.query<{ log: string; hash: string; seq: number }[]>(
    `WITH named AS (SELECT DISTINCT * FROM unnest($1::uuid[], $2::text[]) AS n (log, hash))
     SELECT e.log, e.hash, e.seq FROM named n JOIN entry e USING (log, hash)
     UNION SELECT s.log, s.hash, s.seq FROM named n JOIN entry_set_aside s USING (log, hash)`,
    [named.map(({ entry }) => entry.log), named.map(({ entry }) => entry.previous)],
  );
  return {
    entries: new Map(entries.map(({ id, hash, order }) => [id, { hash, order }])),
    setAside: new Set(aside.map(({ id, hash }) => `${id} ${hash}`)),
    parents: new Map(parents.map(({ log, hash, seq }) => [placeOf(log, hash), seq])),
  };
}

/** Highest seq held of each log; 0 for none. */
export async function headsOf(tx: EntityManager, logs: readonly string[]): Promise<Record<string, number>> {
  const rows = await tx.query<{ log: string; seq: number }[]>(
    `SELECT n.log, greatest(
       coalesce((SELECT max(seq) FROM entry e WHERE e.log = n.log), 0),
       coalesce((SELECT max(seq) FROM entry_set_aside s WHERE s.log = n.log), 0)) AS seq
     FROM unnest($1::uuid[]) AS n (log)`,
    [logs],
  );
  return Object.fromEntries(rows.map(({ log, seq }) => [log, seq]));
}

export interface NewEntry extends Arrival {
  order: number;
  afterAccess: boolean;
}

/** @returns how many were added: fewer than given only when another job took an id in this moment. */
export async function addEntries(
  tx: EntityManager,
  job: string,
  entries: readonly NewEntry[],
  at: Date,
): Promise<number> {
  if (entries.length === 0) return 0;
  const column = <T>(read: (entry: NewEntry) => T): T[] => entries.map(read);
  const rows = await tx.query<unknown[]>(
    `INSERT INTO entry (id, job, "order", log, seq, hash, previous, kind, pack, key, content, received_at, after_access)
     SELECT n.id, $1, n."order", n.log, n.seq, n.hash, n.previous, n.kind, n.pack, n.key, n.content, $2, n.after_access
     FROM unnest($3::uuid[], $4::int[], $5::uuid[], $6::int[], $7::text[], $8::text[], $9::text[], $10::text[],
       $11::uuid[], $12::text[], $13::boolean[])
       AS n (id, "order", log, seq, hash, previous, kind, pack, key, content, after_access)
     ON CONFLICT DO NOTHING RETURNING 1`,
    [
      job,
      at,
      column(({ entry }) => entry.id),
      column(({ order }) => order),
      column(({ entry }) => entry.log),
      column(({ entry }) => entry.seq),
      column(({ hash }) => hash),
      column(({ entry }) => entry.previous),
      column(({ entry }) => entry.kind),
      column(({ entry }) => entry.pack),
      column(({ key }) => key),
      column(({ content }) => content),
      column(({ afterAccess }) => afterAccess),
    ],
  );
  return rows.length;
}

export async function addSetAside(
  tx: EntityManager,
  job: string,
  arrivals: readonly Arrival[],
  at: Date,
): Promise<void> {
  if (arrivals.length === 0) return;
  const column = <T>(read: (arrival: Arrival) => T): T[] => arrivals.map(read);
  await tx.query(
    `INSERT INTO entry_set_aside (id, hash, job, log, seq, kind, key, content, received_at)
     SELECT n.id, n.hash, $1, n.log, n.seq, n.kind, n.key, n.content, $2
     FROM unnest($3::uuid[], $4::text[], $5::uuid[], $6::int[], $7::text[], $8::uuid[], $9::text[])
       AS n (id, hash, log, seq, kind, key, content)
     ON CONFLICT DO NOTHING`,
    [
      job,
      at,
      column(({ entry }) => entry.id),
      column(({ hash }) => hash),
      column(({ entry }) => entry.log),
      column(({ entry }) => entry.seq),
      column(({ entry }) => entry.kind),
      column(({ key }) => key),
      column(({ content }) => content),
    ],
  );
}
