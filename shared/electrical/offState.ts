/** What a load still sees when its output is off. */

/** Current through a capacitor across an open contact, in mA: 2πfCU. On DC it blocks. */
export const capacitorLeakmA = (uF: number, V: number, frequencyHz: number): number =>
  2 * Math.PI * frequencyHz * uF * 1e-6 * V * 1000;

/** Volts that a leakage leaves on a resistance, never more than the supply: I·R. */
export const leakVolts = (leakmA: number, ohm: number, maxV: number): number =>
  Math.min((leakmA / 1000) * ohm, maxV);

/** Resistances in parallel, in ohm; an open one is Infinity. */
export const inParallel = (...ohms: number[]): number => 1 / ohms.reduce((sum, ohm) => sum + 1 / ohm, 0);

/** Largest resistor across a load that brings a leakage down to `offV`: R = U_off/(I − U_off/R_load); Infinity where none is needed. */
export function mostBleederOhm(leakmA: number, loadOhm: number, offV: number): number {
  const left = leakmA / 1000 - offV / loadOhm;
  return left <= 0 ? Infinity : offV / left;
}

/** Drop-out of a coil where its maker states none: 10 % on DC, 15 % on AC (wiring.md, from memory). */
export const dropOutPct = (current: 'ac' | 'dc'): number => (current === 'dc' ? 10 : 15);

/** Pick-up of a coil where its maker states none: 80 % on DC, 85 % on AC (wiring.md, from memory). */
export const pickUpPct = (current: 'ac' | 'dc'): number => (current === 'dc' ? 80 : 85);
