/** The part that takes the coil's kick: fitted, of the right kind, in the right place, the right way round. */
import { say } from '../../../panel/says';
import { choice } from '../../asks';
import type { PointFacts } from '../../facts';
import { makeStep } from '../../makeStep';
import type { Step } from '../../types';

// A diode conducts one way only, reversed it is a short; a zener or TVS may be one-way too.
const oneWay: ReadonlySet<string> = new Set(['diode', 'zener', 'tvs']);

export function suppression({ point, supply, where }: PointFacts): Step[] {
  const { address, terminal, suppressor } = point;
  if (!suppressor || suppressor.kind === 'none') return [];
  const what = say(`checklist.suppressor.${suppressor.kind}`);
  const common = { stage: 'wire', family: 'suppression', where } as const;
  const fitted = makeStep({
    ...common,
    id: `wire.${address}.suppressor`,
    title: say(`checklist.wire.suppressor.${suppressor.at}`, { what, terminal }),
    ask: choice(['suppressor-fitted'], ['suppressor-other']),
  });
  const direction = makeStep({
    ...common,
    id: `wire.${address}.suppressor.direction`,
    title: say('checklist.wire.suppressor.direction', { what, terminal }),
    warnings: [{ signal: 'notice', says: say('checklist.warning.diode-reversed') }],
    ask: choice(['band-on-plus'], ['band-on-minus']),
  });
  return oneWay.has(suppressor.kind) && supply?.kind === 'dc' ? [fitted, direction] : [fitted];
}
