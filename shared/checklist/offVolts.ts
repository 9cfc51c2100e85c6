/** The voltage at which an input is off for sure: the one place where the checklist asks the input tables. */
import { standardInput } from '../electrical/inputTypes';
import { voltsForLed } from '../electrical/optoInput';
import type { DigitalInput, OptoInput } from '../panel/moduleIo';

/**
 * Volts: a declared type's limit for any current (IEC 61131-2 table 7), a maker's own limit,
 * or what keeps an optocoupler's LED at its off current. Undefined where none of them is known.
 */
export function offVolts(io: DigitalInput | OptoInput): number | undefined {
  if (io.kind === 'opto-input')
    return voltsForLed({ seriesOhm: io.seriesOhm, parallelOhm: io.parallelOhm, Vf: io.Vf.min }, io.offmA).V;
  if (io.thresholds) return io.thresholds.UL_V;
  return io.type === 'custom' ? undefined : standardInput(io.V, io.current, io.type)?.UL2_V;
}
