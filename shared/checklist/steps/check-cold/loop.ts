/** The finished loop, still dead: through, not to earth, not to its neighbour, the right way round. */
import type { Point } from '../../../panel/panelSchema';
import { say } from '../../../panel/says';
import { choice } from '../../asks';
import type { Facts, PointFacts } from '../../facts';
import { loopOhms } from '../../loopOhms';
import { makeStep } from '../../makeStep';
import type { ReadingAsk, Step } from '../../types';
import { isElectronic } from './electronic';

type Own = Pick<Step, 'id' | 'title' | 'ask' | 'detail' | 'picture'>;

const cold = ({ where }: PointFacts, { id, title, ask, detail, picture }: Own): Step =>
  makeStep({ id, stage: 'check-cold', family: 'loop', title, ask, detail, where, picture });

// Shared by every point: a checklist holds thousands of these.
const beforeContinuity = [say('checklist.cold.loop.zero'), say('checklist.cold.loop.short')];

/** Limits only where the cable gives them: no cable, no invented number. */
function continuityAsk(point: Point): ReadingAsk {
  const expected = point.cable && loopOhms(point.cable);
  if (!point.cable || !expected) return { kind: 'reading', unit: 'ohm', low: 0 };
  return {
    kind: 'reading',
    unit: 'ohm',
    low: expected.low,
    high: expected.high,
    why: say('checklist.why.loop', {
      m: point.cable.lengthM,
      perKm: expected.ohmPerKm,
      ohm: expected.ohm,
    }),
  };
}

function continuity(worked: PointFacts): Step[] {
  const { point } = worked;
  const devices = [point.device, ...(point.series ?? []), ...(point.parallel ?? [])];
  if (devices.some(isElectronic)) return [];
  return [
    cold(worked, {
      id: `cold.${point.address}.loop`,
      title: say('checklist.cold.loop', { terminal: point.terminal }),
      detail: beforeContinuity,
      ask: continuityAsk(point),
      picture: worked.loop,
    }),
    cold(worked, {
      id: `cold.${point.address}.loop.open`,
      title: say('checklist.cold.loop.open', { terminal: point.terminal }),
      ask: choice(['short-off'], ['short-on']),
    }),
  ];
}

export function loop(facts: Facts, worked: PointFacts): Step[] {
  const { point, supply } = worked;
  const { address, terminal } = point;
  const neighbours = facts.beside(worked.module.tag, terminal);
  const beside = (neighbour: string) =>
    cold(worked, {
      id: `cold.${address}.neighbour.${neighbour}`,
      title: say('checklist.cold.neighbour', { terminal, neighbour }),
      ask: choice(['no-connection'], ['connection']),
    });
  return [
    ...continuity(worked),
    cold(worked, {
      id: `cold.${address}.earth`,
      title: say('checklist.cold.earth', { terminal, earth: facts.panel.earthTerminal }),
      ask: choice(['no-connection'], ['connection']),
    }),
    ...neighbours.map(beside),
    cold(worked, {
      id: `cold.${address}.polarity`,
      title: say(`checklist.cold.polarity.${supply?.kind === 'dc' ? 'dc' : 'ac'}`, { terminal }),
      ask: choice(['ends-match'], ['ends-differ']),
      picture: worked.loop,
    }),
  ];
}
