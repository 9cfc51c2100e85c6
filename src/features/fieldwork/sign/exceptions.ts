/** What a signer and a foreman look at first: every step whose story is not simply "answered, in limits". */
import type { Checklist } from '../../../../shared/checklist/types';
import type { JobState, StepState } from '../../../../shared/job/types';

export type ExceptionKind = 'out' | 'mended' | 'held' | 'two' | 'refused' | 'returned';

export interface Exception {
  stepState: StepState;
  kinds: ExceptionKind[];
}

/** Each check looks at one thing; a step can be an exception for several. Worst first. */
const checks: readonly [ExceptionKind, (state: StepState) => boolean][] = [
  ['out', ({ status }) => status === 'out'],
  ['held', ({ hold }) => hold !== undefined],
  ['two', ({ status }) => status === 'two-answers'],
  ['refused', ({ history }) => history.some(({ verdict }) => verdict === 'refused')],
  ['mended', ({ status, history }) => status !== 'out' && history.some(({ verdict }) => verdict === 'out')],
  ['returned', ({ returned }) => returned !== undefined],
];

/** In the order of the checklist. */
export function exceptions(checklist: Checklist, state: JobState): Exception[] {
  return checklist.steps.flatMap(({ id }) => {
    const stepState = state.steps[id];
    if (!stepState) return [];
    const kinds = checks.filter(([, holds]) => holds(stepState)).map(([kind]) => kind);
    return kinds.length > 0 ? [{ stepState, kinds }] : [];
  });
}
