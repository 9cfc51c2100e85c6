import type { Checklist } from '../../../../shared/checklist/types';
import type { AnswerValue } from '../../../../shared/job/entry';
import type { JobState } from '../../../../shared/job/types';
import { ownAnswer } from '../step/ownAnswer';

export type Instrument = Extract<AnswerValue, { kind: 'instrument' }>;

/** The tester this person named in *Get ready*, the newest if they named several. */
export function meterOf(checklist: Checklist, state: JobState, person: string): Instrument | undefined {
  return checklist.steps
    .filter(({ ask }) => ask.kind === 'instrument')
    .flatMap((step) => {
      const value = ownAnswer(state, step, person).answer?.value;
      return value?.kind === 'instrument' ? [value] : [];
    })
    .at(-1);
}
