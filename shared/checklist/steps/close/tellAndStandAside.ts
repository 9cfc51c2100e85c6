/** After the locks are off and before anything closes, the same people hear that power is coming back. */
import { say } from '../../../panel/says';
import { done } from '../../asks';
import type { IsolatorFacts } from '../../facts';
import { makeStep } from '../../makeStep';
import type { Stage, Step } from '../../types';
import { toTell } from '../get-ready/peopleTold';

const prefixes = { close: 'close', 'restore-motion': 'motion' } as const;

export function tellAndStandAside(
  isolators: readonly IsolatorFacts[],
  stage: Extract<Stage, 'close' | 'restore-motion'>,
): Step[] {
  const common = { stage, family: 'tell-and-stand-aside', everyRound: true } as const;
  const id = prefixes[stage];
  if (isolators.length === 0) return [];
  return [
    makeStep({
      ...common,
      id: `${id}.told`,
      title: say('checklist.close.told'),
      ask: done('checklist.answer.told'),
    }),
    ...toTell(isolators).map((who) =>
      makeStep({
        ...common,
        id: `${id}.tell.${who}`,
        title: say('checklist.close.tell', { who }),
        ask: done('checklist.answer.told'),
      }),
    ),
    makeStep({
      ...common,
      id: `${id}.aside`,
      title: say('checklist.close.aside'),
      warnings: [{ signal: 'warning', says: say('checklist.warning.stand-aside') }],
      ask: done('checklist.answer.aside'),
    }),
  ];
}
