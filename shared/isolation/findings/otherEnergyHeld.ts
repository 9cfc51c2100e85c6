/** Air, oil, weights, springs and heat that nothing holds back. */
import { say } from '../../panel/says';
import { heldBack, otherEnergySources } from '../otherEnergy';
import type { IsolationCheck } from './context';

export const otherEnergyHeld: IsolationCheck = ({ panel }) =>
  otherEnergySources(panel)
    .filter((source) => !heldBack(panel, source))
    .map((source) => ({
      rule: 'isolation.other-energy',
      harm: 'hurts',
      where: { source: source.tag },
      says: say('isolation.other-energy', { source: source.tag, description: source.description }),
      because: [],
      remedy: { says: say('isolation.remedy.other-energy', { source: source.tag }) },
    }));
