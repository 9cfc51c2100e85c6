/** The loop of an input: supply, closed or leaking device, cable, input and what lies across it. */
import { parallel } from './bleeder';

/**
 * What the terminals of an input draw.
 * `resistive`: volts over ohms. `constant-current`: its milliamperes as soon as the volts allow.
 * `led`: a resistor before an LED of a fixed forward volts, perhaps with a resistor across the LED.
 */
export type Draw =
  | { kind: 'resistive'; ohm: number }
  | { kind: 'constant-current'; mA: number }
  | { kind: 'led'; seriesOhm: number; parallelOhm?: number | undefined; Vf: number };

export interface Loop {
  /** Volts of the supply. */
  V: number;
  /** Volts that the closed devices in series keep, and every other fixed drop. */
  dropV: number;
  /** Resistance of the cable, out and back, ohm. */
  cableOhm: number;
  /** Resistor across the input, ohm. */
  bleederOhm?: number | undefined;
  draw: Draw;
}

export interface Solved {
  /** Volts at the input's terminals. */
  V: number;
  /** What the input draws, mA; of an LED input, all that goes through its series resistor. */
  mA: number;
  /** What the LED alone carries, mA. */
  ledmA?: number;
  /** What the devices and the cable carry, mA: input and bleeder. */
  loopmA: number;
}

/** A straight line `V → mA` that a draw follows above its threshold: `mA = 1000·(V − thresholdV)/ohm`. */
function line(draw: Exclude<Draw, { kind: 'constant-current' }>): { thresholdV: number; ohm: number } {
  if (draw.kind === 'resistive') return { thresholdV: 0, ohm: draw.ohm };
  return { thresholdV: draw.Vf, ohm: draw.seriesOhm };
}

/** Volts at which the LED begins to carry current: below, only the resistor across it does. */
const ledThreshold = ({ seriesOhm, parallelOhm = Infinity, Vf }: Extract<Draw, { kind: 'led' }>) =>
  Vf * (1 + seriesOhm / parallelOhm);

/** Volts over a linear load behind a source of `V` with resistance `ohm`, the load drawing from `thresholdV` up. */
const divided = (V: number, ohm: number, load: { thresholdV: number; ohm: number }): number =>
  V <= load.thresholdV ? V : (V * load.ohm + load.thresholdV * ohm) / (load.ohm + ohm);

function atTerminals(draw: Draw, V: number, sourceOhm: number): Pick<Solved, 'V' | 'mA' | 'ledmA'> {
  if (draw.kind === 'constant-current') {
    const most = sourceOhm === 0 ? Infinity : (V / sourceOhm) * 1000;
    const mA = Math.min(draw.mA, most);
    return { V: Math.max(0, V - (mA * sourceOhm) / 1000), mA: V > 0 ? mA : 0 };
  }
  if (draw.kind === 'led' && draw.parallelOhm !== undefined) {
    const dark = draw.seriesOhm + draw.parallelOhm;
    const darkV = (V * dark) / (dark + sourceOhm);
    if (darkV <= ledThreshold(draw)) return { V: darkV, mA: (darkV / dark) * 1000, ledmA: 0 };
  }
  const { thresholdV, ohm } = line(draw);
  const terminalV = divided(V, sourceOhm, { thresholdV, ohm });
  const mA = Math.max(0, ((terminalV - thresholdV) / ohm) * 1000);
  if (draw.kind === 'resistive') return { V: terminalV, mA };
  const past = draw.parallelOhm === undefined ? 0 : (draw.Vf / draw.parallelOhm) * 1000;
  return { V: terminalV, mA, ledmA: Math.max(0, mA - past) };
}

/** What an input draws at these volts on its terminals, mA. */
export const drawnmA = (draw: Draw, V: number): number => atTerminals(draw, V, 0).mA;

/** Solves the loop with its devices closed. Volts and milliamperes; AC as r.m.s. with drops added as they are. */
export function solveInputLoop({ V, dropV, cableOhm, bleederOhm = Infinity, draw }: Loop): Solved {
  const openV = Math.max(0, V - dropV);
  // The bleeder and the source before it, seen from the input, are one source (Thévenin).
  const seenV = bleederOhm === Infinity ? openV : (openV * bleederOhm) / (bleederOhm + cableOhm);
  const seenOhm = parallel(cableOhm, bleederOhm);
  const input = atTerminals(draw, seenV, seenOhm);
  return { ...input, loopmA: input.mA + (bleederOhm === Infinity ? 0 : (input.V / bleederOhm) * 1000) };
}

/** Volts at the terminals that make an input draw a current. */
function voltsAt(draw: Exclude<Draw, { kind: 'constant-current' }>, mA: number): number {
  if (draw.kind === 'resistive') return (mA / 1000) * draw.ohm;
  const { seriesOhm, parallelOhm, Vf } = draw;
  if (parallelOhm !== undefined && (mA / 1000) * parallelOhm <= Vf)
    return (mA / 1000) * (seriesOhm + parallelOhm);
  return mA > 0 ? Vf + (mA / 1000) * seriesOhm : 0;
}

/** What an off device's leakage leaves at the input: at most the supply, else `I·R` of the input and what lies across it. */
export function solveLeakage(off: {
  leakmA: number;
  highestV: number;
  bleederOhm?: number | undefined;
  draw: Exclude<Draw, { kind: 'constant-current' }>;
}): Solved {
  const { leakmA, highestV, bleederOhm = Infinity, draw } = off;
  // A current source with a resistor across it is a voltage source behind that resistor (Norton).
  const openV =
    bleederOhm === Infinity
      ? voltsAt(draw, leakmA)
      : atTerminals(draw, (leakmA / 1000) * bleederOhm, bleederOhm).V;
  return { ...atTerminals(draw, Math.min(openV, highestV), 0), loopmA: leakmA };
}
