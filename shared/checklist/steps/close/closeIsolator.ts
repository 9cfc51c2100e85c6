/** At the isolator: look, count the padlocks, and only at none close it. */
import { say } from '../../../panel/says';
import type { IsolatorFacts } from '../../facts';
import { makeStep } from '../../makeStep';
import type { Stage, Step, Warning } from '../../types';

function warnings({ isolator, holds }: IsolatorFacts): Warning[] {
  if (holds)
    return [{ signal: 'warning', says: say('checklist.warning.energy-returns', { tag: isolator.tag }) }];
  return isolator.purpose === 'control'
    ? []
    : [{ signal: 'warning', says: say('checklist.warning.motion-returns', { tag: isolator.tag }) }];
}

export const closeIsolator = (facts: IsolatorFacts, stage: Stage): Step =>
  makeStep({
    id: `close.${facts.isolator.tag}`,
    stage,
    family: 'close-isolator',
    title: say('checklist.close.isolator', { tag: facts.isolator.tag }),
    detail: [say('checklist.close.count'), say('checklist.at', { location: facts.isolator.location })],
    warnings: warnings(facts),
    where: { isolator: facts.isolator.tag },
    ask: { kind: 'close', isolator: facts.isolator.tag },
    everyRound: true,
    picture: { kind: 'energy' },
  });
