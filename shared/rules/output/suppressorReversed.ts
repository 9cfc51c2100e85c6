/** A one-way suppressor the wrong way round conducts the supply: a short at the first switching on. */
import type { PointPlace } from '../context';
import { settleOnSite } from '../settleOnSite';
import { found, missing, quantity, titleOf, type Outcome, type RuleAt } from '../rule';
import { currentOf, inCircuits, type Circuit } from './circuits';
import { atOutput } from './outputPlace';

const id = 'output.suppressor-reversed';

/** The kinds that have a direction; of a two-way TVS the file says `reversed: false`. */
const oneWay: ReadonlySet<string> = new Set(['diode', 'zener', 'tvs']);

function judge(circuit: Circuit, { where, point }: PointPlace): Outcome[] {
  const { suppressor, suppressorPath, volts, supply } = circuit;
  if (!suppressor || !oneWay.has(suppressor.kind) || currentOf(circuit) === 'ac') return [];
  if (suppressor.reversed === undefined) return [missing(`${suppressorPath}.reversed`)];
  if (!suppressor.reversed) return ['ok'];
  return [
    found(id, {
      harm: 'damages',
      where,
      params: { terminal: point.terminal },
      because: [quantity('supply-high', volts.maxV, 'V DC', `supplies.${supply.tag}.V, tolerance`)],
      remedy: { says: { key: 'remedy.output.suppressor-reversed' } },
      addsSteps: settleOnSite(id, where),
    }),
  ];
}

export const suppressorReversed: RuleAt<'point'> = {
  id,
  title: titleOf(id),
  basis: 'cathode to plus: the suppressor blocks the supply and conducts the spike',
  appliesTo: 'point',
  check: (place, context) =>
    atOutput(place, (at) => inCircuits(at, context, (circuit) => judge(circuit, place))),
};
