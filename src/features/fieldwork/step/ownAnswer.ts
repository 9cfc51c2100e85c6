import type { Step } from '../../../../shared/checklist/types';
import type { AnswerRecord, JobState, StepStatus } from '../../../../shared/job/types';

/** The key under which a step keeps this person's answer. */
export const answerKey = (step: Step, person: string): string => (step.by === 'each' ? person : '');

/** What stands on a step for this person: their own on an `each` step, the crew's on a `one` step. */
export function ownAnswer(
  state: JobState,
  step: Step,
  person: string,
): { status: StepStatus; answer?: AnswerRecord } {
  return state.steps[step.id]?.by[answerKey(step, person)] ?? { status: 'open' };
}
