import type { Checklist, Step } from '../../../../shared/checklist/types';
import type { AnswerRecord, JobState } from '../../../../shared/job/types';
import type { LocalJob } from '../../../offline/types';
import { lastAnswered } from '../step/lastAnswered';

/** This person's newest reading on a dead test. */
export function lastDeadReading(
  checklist: Checklist,
  local: LocalJob,
  state: JobState,
  person: string,
): { step: Step; answer: AnswerRecord } | undefined {
  const tests = checklist.steps.filter(({ ask }) => ask.kind === 'reading' && ask.dead);
  const only = Object.fromEntries(
    tests.flatMap(({ id }) => {
      const kept = state.steps[id];
      return kept ? [[id, kept]] : [];
    }),
  );
  const last = lastAnswered(local, { ...state, steps: only }, person);
  const step = tests.find(({ id }) => id === last?.step);
  return last && step ? { step, answer: last.answer } : undefined;
}
