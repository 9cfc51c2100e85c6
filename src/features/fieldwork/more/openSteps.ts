import type { Checklist, Step } from '../../../../shared/checklist/types';
import type { JobState } from '../../../../shared/job/types';
import { ownAnswer } from '../step/ownAnswer';

/** The steps that still wait for this person, in order. */
export const openSteps = (checklist: Checklist, state: JobState, person: string): Step[] =>
  checklist.steps.filter((step) => {
    const { status } = ownAnswer(state, step, person);
    const whole = state.steps[step.id]?.status;
    return (status === 'open' || status === 'out') && whole !== 'out-of-scope' && whole !== 'accepted';
  });
