/** Everything that was brought in comes out, everything that was taken off goes back on. */
import { say } from '../../../panel/says';
import { choice } from '../../asks';
import type { Facts } from '../../facts';
import { makeStep } from '../../makeStep';
import type { Step } from '../../types';
import { hasForeignVoltage } from '../wire/readInWire';

const common = { stage: 'close-up', family: 'leave-clean' } as const;

const earthsOff = ({ points }: Facts): Step[] =>
  points
    .filter(({ point }) => hasForeignVoltage(point))
    .map(({ point: { address, terminal } }) =>
      makeStep({
        ...common,
        id: `closeup.backfeed.${address}`,
        title: say('checklist.closeup.backfeed', { terminal }),
        where: { point: address, terminal },
        ask: choice(['earth-off', 'no-earth-fitted'], ['earth-still-on']),
      }),
    );

const modulesIn = ({ modules }: Facts): Step[] =>
  modules
    .filter(({ pluggable }) => pluggable)
    .map(({ tag, slot }) =>
      makeStep({
        ...common,
        id: `closeup.module.${tag}`,
        title: say('checklist.closeup.module', { module: tag, slot }),
        where: { module: tag },
        ask: choice(['module-in'], ['module-out']),
      }),
    );

export function leaveClean(facts: Facts): Step[] {
  const plain = (name: string, good: string, bad: string) =>
    makeStep({
      ...common,
      id: `closeup.${name}`,
      title: say(`checklist.closeup.${name}`, { panel: facts.panel.tag }),
      ask: choice([good], [bad]),
    });
  return [
    ...earthsOff(facts),
    plain('temporary', 'all-put-back', 'not-all-back'),
    ...modulesIn(facts),
    plain('tools', 'tools-all-out', 'tool-missing'),
    plain('covers', 'covers-on', 'cover-off'),
    plain('door', 'door-shut', 'door-open'),
    plain('people', 'everyone-clear', 'someone-near'),
  ];
}
