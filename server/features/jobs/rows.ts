/** Reads of jobs for boards: one query, with names, scope and progress. */
import type { EntityManager } from 'typeorm';
import type { JobRow } from '../../../shared/api/jobs';
import type { Progress } from './entity';

export interface JobListRow {
  id: string;
  number: number;
  site: string;
  panel: string;
  panel_tag: string;
  panel_name: string;
  revision: number;
  newest: number;
  status: JobRow['status'];
  points: number;
  panel_points: number;
  due: string;
  isolators: string[];
  electricians: { id: string; name: string }[];
  foreman: { id: string; name: string };
  progress: Progress | null;
  last_heard: Date | null;
  record: string | null;
  /** Created at and id, the cursor of a list. */
  cursor: string;
}

/** Which jobs: of sites where the person reads all, or those they are on. */
export interface JobFilter {
  person: string;
  /** Sites where the person sees every job. */
  sites: readonly string[];
  /** Sites where the person holds any role: a job they were on elsewhere is closed to them. */
  anySites: readonly string[];
  job?: string | undefined;
  site?: string | undefined;
  panel?: string | undefined;
  status?: JobRow['status'] | undefined;
  waitingForMe?: boolean;
  after?: string | undefined;
  limit: number;
}

const endedList = `('sealed', 'cancelled')`;
const cursor = `to_char(j.created_at AT TIME ZONE 'UTC', 'YYYYMMDDHH24MISSUS') || j.id`;

const columns = `
  j.id, j.number, j.site, j.panel, j.panel_tag, j.panel_name, j.revision, p.revision AS newest, j.status,
  jsonb_array_length(j.scope) AS points, j.panel_points, j.due::text AS due, j.isolators,
  (SELECT coalesce(json_agg(json_build_object('id', e.id, 'name', e.name) ORDER BY e.name, e.id), '[]')
     FROM job_person m JOIN person e ON e.id = m.person WHERE m.job = j.id AND m.part = 'electrician') AS electricians,
  json_build_object('id', f.id, 'name', f.name) AS foreman,
  j.progress, j.last_heard, j.record, ${cursor} AS cursor`;

const conditions = `
  (j.site = ANY($2) OR (j.site = ANY($3) AND EXISTS (SELECT FROM job_person m WHERE m.job = j.id AND m.person = $1)))
  AND ($4::uuid IS NULL OR j.id = $4)
  AND ($5::uuid IS NULL OR j.site = $5)
  AND ($6::uuid IS NULL OR j.panel = $6)
  AND ($7::text IS NULL OR j.status = $7)
  AND (NOT $8::boolean OR (j.foreman = $1 AND j.status NOT IN ${endedList} AND (j.waits OR j.due < current_date)))
  AND ($9::text IS NULL OR ${cursor} < $9)`;

const parametersOf = (filter: JobFilter): unknown[] => [
  filter.person,
  filter.sites,
  filter.anySites,
  filter.job ?? null,
  filter.site ?? null,
  filter.panel ?? null,
  filter.status ?? null,
  filter.waitingForMe ?? false,
  filter.after ?? null,
];

/** Newest first; one more than `limit`, so that the caller sees whether there is a next page. */
export function jobRows(tx: EntityManager, filter: JobFilter): Promise<JobListRow[]> {
  return tx.query(
    `SELECT ${columns} FROM job j JOIN panel p ON p.id = j.panel JOIN person f ON f.id = j.foreman
     WHERE ${conditions} ORDER BY cursor DESC LIMIT $10`,
    [...parametersOf(filter), filter.limit + 1],
  );
}

/** Jobs within the filter's reach whose progress is older than their newest entry. */
export async function staleJobs(tx: EntityManager, filter: JobFilter): Promise<string[]> {
  const rows = await tx.query<{ id: string }[]>(
    `SELECT j.id FROM job j WHERE j.progress_order < j.last_order AND j.pack IS NOT NULL AND ${conditions}`,
    parametersOf({ ...filter, status: undefined, waitingForMe: false, after: undefined }),
  );
  return rows.map(({ id }) => id);
}
