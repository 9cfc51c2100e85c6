/** The most current an input draws at a voltage, for the volts its cable keeps. */
import { standardInput } from '../electrical/inputTypes';
import type { DigitalInput, OptoInput } from '../panel/moduleIo';

/** Amperes at this supply: the maker's, else by its resistance, else the most its declared type may draw; else undefined. */
export function inputAmps(io: DigitalInput | OptoInput, V: number): number | undefined {
  if (io.kind === 'opto-input') return Math.max(0, (V - io.Vf.min) / io.seriesOhm);
  if (io.ratedmA !== undefined) return io.ratedmA / 1000;
  if (io.inputOhm !== undefined) return V / io.inputOhm;
  const most = io.type === 'custom' ? undefined : standardInput(io.V, io.current, io.type)?.mostmA;
  return most === undefined ? undefined : most / 1000;
}
