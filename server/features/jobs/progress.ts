/** What a fold says, in short, for boards. */
import type { JobRow } from '../../../shared/api/jobs';
import type { JobState } from '../../../shared/job/types';
import type { JobEntity, Progress } from './entity';

type Waiting = JobRow['waiting'][number];

/** One line for a reason to wait: how often, and since when the first of them. */
function line(what: Waiting['what'], since: readonly string[]): Waiting[] {
  const [first] = [...since].sort();
  return first === undefined ? [] : [{ what, count: since.length, since: first }];
}

/** Times of entries by id, for reasons that name entries only. */
export function waitingOf(state: JobState, atOf: (entry: string) => string): Waiting[] {
  const steps = Object.values(state.steps);
  const last = (entries: readonly string[]) => entries.map(atOf).sort().at(-1) ?? '';
  const signed = state.status === 'signed' ? [last(state.signatures.map(({ entry }) => entry))] : [];
  return [
    ...line('countersign', signed),
    ...line(
      'hold',
      steps.flatMap(({ hold }) => (hold && !hold.decided ? [hold.at] : [])),
    ),
    ...line(
      'two-answers',
      steps
        .filter(({ status }) => status === 'two-answers')
        .map(({ history }) => last(history.map(({ entry }) => entry))),
    ),
    ...line(
      'drawing-differs',
      state.drawingDiffers.map(({ at }) => at),
    ),
    ...line(
      'contradiction',
      state.contradictions.map(({ entries }) => last(entries)),
    ),
  ].filter(({ since }) => since !== '');
}

export function progressOf(
  state: JobState,
  atOf: (entry: string) => string,
  nameOf: (person: string) => string,
): Progress {
  const current = state.stages.find(({ status }) => status === 'current');
  return {
    stage: current?.stage ?? null,
    stageDone: current?.done ?? 0,
    stageOf: current?.of ?? 0,
    stagesDone: state.stages.filter(({ status }) => status === 'done').length,
    locks: state.locks
      .filter(({ offAt }) => offAt === undefined)
      .map(({ isolator, lock, person }) => ({ isolator, lock, person: nameOf(person) })),
    waiting: waitingOf(state, atOf),
  };
}

/** Facts of the server stand above what the entries say. */
export function statusOf(job: JobEntity, state: JobState | undefined): JobRow['status'] {
  if (job.record !== null) return 'sealed';
  if (job.cancelledAt !== null) return 'cancelled';
  if (job.pack === null || !state) return 'planned';
  return state.status;
}
