/** When an input counts as on or off, and where that is written. */
import { customState, standardState, type InputState } from '../../electrical/inputState';
import { voltsForLed } from '../../electrical/optoInput';
import type { Quantity } from '../finding';
import { quantity } from '../rule';
import { rangeOf } from './draws';
import type { InputPlace } from './inputPlace';

export interface Limits {
  /** @param mA of an optocoupler its LED's. */
  state: (V: number, mA: number) => InputState;
  /** Least volts at the terminals that can be on. */
  onV: number;
  /** Volts at which the input is off for sure, and what it then draws if that is known. */
  offV: number;
  /** Off up to this current whatever the volts (declared types: within their upper limit). */
  offmA: number;
  on: Quantity[];
  off: Quantity[];
}

type Io<K extends InputPlace['io']['kind']> = Extract<InputPlace['io'], { kind: K }>;

function ofDigital(io: Io<'digital-input'>, ioPath: string): Limits | undefined {
  if (io.type === 'custom') {
    const { thresholds } = io;
    if (!thresholds) return undefined;
    const basis = `${ioPath}.thresholds`;
    return {
      state: (V, mA) => customState(thresholds, V, mA),
      onV: thresholds.UH_V,
      offV: thresholds.UL_V,
      offmA: thresholds.IT_mA,
      on: [
        quantity('on-volts', thresholds.UH_V, 'V', basis),
        quantity('on-current', thresholds.IH_mA, 'mA', basis),
      ],
      off: [
        quantity('off-volts', thresholds.UL_V, 'V', basis),
        quantity('off-current', thresholds.IT_mA, 'mA', basis),
      ],
    };
  }
  const range = rangeOf(io);
  if (!range) return undefined;
  const basis = `IEC 61131-2 table 7, type ${io.type}`;
  return {
    state: (V, mA) => standardState(range, V, mA),
    onV: range.UH_V,
    offV: range.UL2_V,
    offmA: range.ITmA,
    on: [quantity('on-volts', range.UH_V, 'V', basis)],
    off: [quantity('off-volts', range.UL2_V, 'V', basis), quantity('off-current', range.ITmA, 'mA', basis)],
  };
}

function ofOpto(io: Io<'opto-input'>, ioPath: string): Limits {
  const led = (Vf: number) => ({ seriesOhm: io.seriesOhm, parallelOhm: io.parallelOhm, Vf });
  return {
    state: (_V, mA) => (mA >= io.onmA - 1e-9 ? 'on' : mA <= io.offmA + 1e-9 ? 'off' : 'undefined'),
    onV: voltsForLed(led(io.Vf.max), io.onmA).V,
    offV: voltsForLed(led(io.Vf.min), io.offmA).V,
    offmA: voltsForLed(led(io.Vf.min), io.offmA).mA,
    on: [quantity('led-on-current', io.onmA, 'mA', `${ioPath}.onmA`)],
    off: [quantity('led-off-current', io.offmA, 'mA', `${ioPath}.offmA`)],
  };
}

// Sixteen points share a module's limits; two modules made alike may share one object, so the path counts too.
const known = new WeakMap<InputPlace['io'], Map<string, Limits>>();

/** Undefined for a custom input without thresholds and for a declared type that the table does not hold at these volts. */
export function limitsOf({ io, ioPath }: Pick<InputPlace, 'io' | 'ioPath'>): Limits | undefined {
  const reckoned = known.get(io)?.get(ioPath);
  if (reckoned) return reckoned;
  const limits = io.kind === 'digital-input' ? ofDigital(io, ioPath) : ofOpto(io, ioPath);
  if (limits) known.set(io, (known.get(io) ?? new Map<string, Limits>()).set(ioPath, limits));
  return limits;
}
