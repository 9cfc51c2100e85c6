/** The current that a switched-on two-wire sensor gets, against the least it needs to stay on. */
import { quantity } from '../rule';
import type { Quantity } from '../finding';
import { drawsOf } from './draws';
import { fittedDevices } from './fieldDevices';
import type { InputPlace } from './inputPlace';
import type { Known } from './onState';
import { solveInput } from './solveInput';

export interface LeastLoad {
  minmA: number;
  /** What flows at the supply's low limit, with the resistor if there is one. */
  mA: number;
  /** At the input then, V. */
  V: number;
  because: Quantity[];
}

/** The most that any two-wire sensor of the point asks for; 0 where there is none. */
export const askedmA = (at: InputPlace): number =>
  Math.max(0, ...fittedDevices(at).map(({ device }) => (device.kind === 'two-wire' ? device.minmA : 0)));

/** `missing` where the answer hangs on a datum that is not stated. */
export function leastLoad(at: InputPlace, bleederOhm = at.point.bleeder?.ohm ?? Infinity): Known<LeastLoad> {
  const { io, ioPath, volts, point, path } = at;
  const minmA = askedmA(at);
  const { models, lacks, unbounded } = drawsOf(io, 'max');
  const solved = models.map((draw) => solveInput(at, { V: volts.minV, draw, bleederOhm }));
  const [first] = solved.sort((a, b) => a.loopmA - b.loopmA);
  const last = solved.at(-1);
  if (!first || !last) return { missing: ioPath };
  const few = first.loopmA < minmA;
  if (lacks !== undefined && few && (unbounded === true || last.loopmA >= minmA))
    return { missing: `${ioPath}.${lacks}` };
  // A constant current hangs neither on the cable nor on the supply.
  const steady = models.every(({ kind }) => kind === 'constant-current') && bleederOhm === Infinity;
  if (!few && !steady && !point.cable) return { missing: `${path}.cable` };
  if (!few && !steady && !volts.known) return { missing: volts.tolerancePath };
  const because = [
    quantity('supply-low', volts.minV, 'V', volts.tolerancePath),
    quantity('sensor-current', first.loopmA, 'mA', 'solved loop'),
    quantity('least-load', minmA, 'mA', `${path}.device.minmA`),
  ];
  return { is: { minmA, mA: first.loopmA, V: first.V, because } };
}
