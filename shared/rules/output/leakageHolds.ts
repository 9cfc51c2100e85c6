/** The leakage of an output that is off may hold its load in: a valve that stays open, a motor that does not stop. */
import { nextLowerE24 } from '../../electrical/eSeries';
import { dropOutPct, inParallel, leakVolts, mostBleederOhm } from '../../electrical/offState';
import { ratingFor } from '../../electrical/resistorWatts';
import type { PointPlace } from '../context';
import type { Quantity, Remedy } from '../finding';
import { settleOnSite } from '../settleOnSite';
import { found, missing, quantity, titleOf, type Outcome, type RuleAt } from '../rule';
import { currentOf, inCircuits, type Circuit } from './circuits';
import type { DrawnLoad } from './drawnLoads';
import { leakageOf } from './leakage';
import { atOutput } from './outputPlace';

const id = 'output.leakage-holds';

/** Rated volts over rated amps, as wiring.md asks; a coil's true impedance when it is out is lower. */
const loadOhm = (loads: readonly DrawnLoad[]): number => inParallel(...loads.map(({ V, A }) => V / A));

interface OffLimit {
  V: number;
  because: Quantity;
}

/** Volts below which every load of the circuit lets go. */
function offLimit(circuit: Circuit): OffLimit {
  const limits = circuit.loads.map(({ V, dropOutPct: stated, path }) => {
    const limit = (V * (stated ?? dropOutPct(currentOf(circuit)))) / 100;
    const basis = stated === undefined ? 'default drop-out, from memory' : `${path}.dropOutPct`;
    return { V: limit, because: quantity('drop-out', limit, 'V', basis) };
  });
  return limits.reduce((least, limit) => (limit.V < least.V ? limit : least));
}

/** A resistor across the load that leads the leakage past it; none where it would burn. */
function bleederRemedy(mA: number, ohm: number, offV: number, maxV: number): Remedy {
  const most = mostBleederOhm(mA, ohm, offV);
  const fitted = nextLowerE24(most);
  const W = ratingFor(maxV ** 2 / fitted);
  if (W === undefined) return { says: { key: 'remedy.output.leakage-holds.relay' } };
  const values = { ohm: fitted, W };
  return { says: { key: 'remedy.output.leakage-holds', params: values }, values };
}

function judge(circuit: Circuit, place: PointPlace, frequencyHz: number): Outcome[] {
  if (circuit.loads.length === 0) return [];
  const leak = leakageOf(circuit, frequencyHz);
  if (typeof leak !== 'object' || !('mA' in leak)) return [leak];
  const { maxV, known, tolerancePath } = circuit.volts;
  const ohm = loadOhm(circuit.loads);
  const bleeder = circuit.side === 'point' ? place.point.bleeder : undefined;
  const limit = offLimit(circuit);
  const offV = leakVolts(leak.mA, bleeder ? inParallel(ohm, bleeder.ohm) : ohm, maxV);
  if (offV <= limit.V * (1 + 1e-9)) return [known || leak.mA === 0 ? 'ok' : missing(tolerancePath)];
  const moves = circuit.loads.some((load) => load.moves);
  return [
    found(id, {
      harm: moves ? 'hurts' : 'fails',
      where: place.where,
      variant: moves ? 'moves' : 'stays',
      params: { leakmA: leak.mA, offV, limitV: limit.V, load: circuit.loads[0]?.tag ?? place.point.address },
      because: [
        ...leak.because,
        quantity('load-resistance', ohm, 'ohm', `${circuit.loads[0]?.path}.V / A`),
        quantity('off-voltage', offV, 'V', 'I·R, at most the high supply'),
        limit.because,
      ],
      remedy: bleederRemedy(leak.mA, ohm, limit.V, maxV),
      ...(moves ? {} : { addsSteps: settleOnSite(id, place.where) }),
    }),
  ];
}

export const leakageHolds: RuleAt<'point'> = {
  id,
  title: titleOf(id),
  basis: 'IEC 60204-1 9.4; leakage × impedance of the load against its drop-out',
  appliesTo: 'point',
  check: (place, context) =>
    atOutput(place, (at) =>
      inCircuits(at, context, (circuit) => judge(circuit, place, context.panel.frequencyHz)),
    ),
};
