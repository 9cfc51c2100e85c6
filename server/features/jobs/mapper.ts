import type { JobRow, JobView } from '../../../shared/api/jobs';
import type { JobEntity } from './entity';
import type { JobListRow } from './rows';

const dayMs = 86_400_000;
const ended: readonly JobRow['status'][] = ['sealed', 'cancelled'];

export const jobNumber = (number: number): string => String(number).padStart(4, '0');

/** A job that has not ended is late from the day after it was due. */
function lateness({ due, status }: JobListRow, now: number): JobRow['waiting'] {
  const since = Date.parse(`${due}T00:00:00Z`) + dayMs;
  if (ended.includes(status) || now < since) return [];
  return [{ what: 'late', count: 1, since: new Date(since).toISOString() }];
}

export const jobRow = (row: JobListRow, now: number): JobRow => ({
  id: row.id,
  number: jobNumber(row.number),
  site: row.site,
  panel: row.panel,
  panelTag: row.panel_tag,
  panelName: row.panel_name,
  revision: row.revision,
  status: row.status,
  points: row.points,
  of: row.panel_points,
  due: row.due,
  isolators: row.isolators,
  electricians: row.electricians,
  foreman: row.foreman,
  stage: row.progress?.stage ?? null,
  stageDone: row.progress?.stageDone ?? 0,
  stageOf: row.progress?.stageOf ?? 0,
  stagesDone: row.progress?.stagesDone ?? 0,
  locks: row.progress?.locks ?? [],
  lastHeard: row.last_heard?.toISOString() ?? null,
  waiting: [...(ended.includes(row.status) ? [] : (row.progress?.waiting ?? [])), ...lateness(row, now)],
  newerRevision: row.newest > row.revision,
  record: row.record,
});

export const jobView = (row: JobRow, job: JobEntity, nameOf: (person: string) => string): JobView => ({
  ...row,
  scope: job.scope,
  words: job.words,
  acceptances: job.acceptances,
  pack: job.pack,
  sentAt: job.sentAt?.toISOString() ?? null,
  cancelled:
    job.cancelledAt && job.cancelledBy && job.cancelWords !== null
      ? { at: job.cancelledAt.toISOString(), by: nameOf(job.cancelledBy), words: job.cancelWords }
      : null,
});
