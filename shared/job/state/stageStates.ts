/** How far each stage is. */
import { stages } from '../../checklist/types';
import type { Lookup } from '../known/lookup';
import { isPassed, isSettled } from '../known/passing';
import type { JobState, StepState } from '../types';

export function stageStates(lookup: Lookup, steps: Record<string, StepState>): JobState['stages'] {
  let current = false;
  return stages.map((stage, number) => {
    const states = (lookup.inStage[number] ?? []).flatMap(
      (step) => steps[lookup.steps[step]?.id ?? ''] ?? [],
    );
    const done = states.filter(({ status }) => isSettled(status)).length;
    const counts = { stage, done, of: states.length };
    if (states.every(({ status }) => isPassed(status, stage))) return { ...counts, status: 'done' };
    if (!current) {
      current = true;
      return { ...counts, status: 'current' };
    }
    return { ...counts, status: done > 0 ? 'open' : 'locked' };
  });
}
