/** Which statuses let the job go on. */
import type { Stage } from '../../checklist/types';
import type { StepStatus } from '../types';

const settled: ReadonlySet<StepStatus> = new Set(['done', 'accepted', 'out-of-scope']);
// The job goes on past a held point (checklist.md, Answers); everywhere else a hold waits for the foreman first.
const goesOnPastHolds: ReadonlySet<Stage> = new Set(['wire', 'check-cold']);

/** Answered in limits, or settled by the foreman. */
export const isSettled = (status: StepStatus): boolean => settled.has(status);

/** May what comes after this step begin? */
export const isPassed = (status: StepStatus, stage: Stage): boolean =>
  isSettled(status) || (status === 'held' && goesOnPastHolds.has(stage));
