import type { JobRow } from '../../../shared/api/jobs';

export interface JobSections {
  waiting: JobRow[];
  running: JobRow[];
  planned: JobRow[];
  done: JobRow[];
}

const sectionOf = (job: JobRow): keyof JobSections => {
  if (job.status === 'sealed' || job.status === 'cancelled') return 'done';
  if (job.waiting.length > 0) return 'waiting';
  return job.status === 'planned' ? 'planned' : 'running';
};

/** The board: what waits for the foreman, then what runs, what is planned, what is done. */
export function jobSections(jobs: readonly JobRow[]): JobSections {
  const sections: JobSections = { waiting: [], running: [], planned: [], done: [] };
  for (const job of jobs) sections[sectionOf(job)].push(job);
  const since = (job: JobRow) => job.waiting.map((each) => each.since).sort()[0] ?? '';
  sections.waiting.sort((a, b) => since(a).localeCompare(since(b)));
  sections.planned.sort((a, b) => a.due.localeCompare(b.due));
  return sections;
}
