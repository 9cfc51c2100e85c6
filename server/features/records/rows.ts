/** The list of records: one query, newest first, page after page by a cursor. */
import type { EntityManager } from 'typeorm';
import type { z } from 'zod';
import type { recordQuery, RecordRow } from '../../../shared/api/records';

export interface Reach {
  person: string;
  /** Sites where the person reads every record. */
  sites: readonly string[];
  /** Sites where the person holds any role. */
  anySites: readonly string[];
}
export type RecordQuery = z.output<typeof recordQuery>;

interface Row {
  id: string;
  number: number;
  site: string;
  site_name: string;
  panel_tag: string;
  panel_name: string;
  job_number: string;
  sealed_at: Date;
  electricians: string[];
  foreman: string;
  points: number;
  exceptions: number;
  digest: string;
  seal: string;
  amends: string | null;
  cursor: string;
}

const cursor = `to_char(r.sealed_at AT TIME ZONE 'UTC', 'YYYYMMDDHH24MISSUS') || r.id`;

/** What was typed, found anywhere and in any case; `%` and `_` mean themselves. */
const within = (typed: string | undefined): string | null =>
  typed === undefined ? null : `%${typed.replace(/[\\%_]/g, '\\$&')}%`;

const conditions = `
  (r.site = ANY($2) OR (r.site = ANY($3) AND $1 = ANY(r.people)))
  AND ($4::uuid IS NULL OR r.site = $4)
  AND ($5::text IS NULL OR r.panel_tag ILIKE $5 OR r.panel_name ILIKE $5)
  AND ($6::text IS NULL OR r.foreman ILIKE $6 OR EXISTS (SELECT FROM unnest(r.electricians) e WHERE e ILIKE $6))
  AND ($7::date IS NULL OR r.sealed_at >= $7::date)
  AND ($8::date IS NULL OR r.sealed_at < $8::date + 1)
  AND ($9::text IS NULL OR EXISTS (SELECT FROM unnest(r.points) p WHERE p ILIKE $9))
  AND ($10::text IS NULL OR EXISTS (SELECT FROM unnest(r.locks) l WHERE l ILIKE $10))
  AND ($11::boolean IS NULL OR (r.exceptions > 0) = $11)
  AND ($12::uuid IS NULL OR r.id = $12)
  AND ($13::text IS NULL OR ${cursor} < $13)`;

const view = (row: Row): RecordRow => ({
  id: row.id,
  number: row.number,
  site: row.site,
  siteName: row.site_name,
  panelTag: row.panel_tag,
  panelName: row.panel_name,
  jobNumber: row.job_number,
  sealedAt: row.sealed_at.toISOString(),
  electricians: row.electricians,
  foreman: row.foreman,
  points: row.points,
  exceptions: row.exceptions,
  digest: row.digest,
  seal: row.seal,
  amendment: row.amends !== null,
});

export async function recordRows(
  tx: EntityManager,
  reach: Reach,
  query: RecordQuery,
  record: string | null = null,
): Promise<{ row: RecordRow; cursor: string }[]> {
  const rows = await tx.query<Row[]>(
    `SELECT r.id, r.number, r.site, s.name AS site_name, r.panel_tag, r.panel_name, r.job_number, r.sealed_at,
       r.electricians, r.foreman, cardinality(r.points) AS points, r.exceptions, r.digest, r.seal, r.amends,
       ${cursor} AS cursor
     FROM record r JOIN site s ON s.id = r.site WHERE ${conditions} ORDER BY cursor DESC LIMIT $14`,
    [
      reach.person,
      reach.sites,
      reach.anySites,
      query.site ?? null,
      within(query.panel),
      within(query.person),
      query.from ?? null,
      query.to ?? null,
      within(query.point),
      within(query.lock),
      query.exceptions === undefined ? null : query.exceptions === 'true',
      record,
      query.after ?? null,
      query.limit + 1,
    ],
  );
  return rows.map((row) => ({ row: view(row), cursor: row.cursor }));
}
