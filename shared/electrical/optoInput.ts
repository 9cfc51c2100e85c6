/** The LED of an optocoupler: which volts keep it dark, what its resistor turns into heat, whether its transistor saturates. */

/** Volts at the terminals that let the LED carry `mA`, its other resistor's share included. */
export function voltsForLed(
  led: { seriesOhm: number; parallelOhm?: number | undefined; Vf: number },
  mA: number,
): { V: number; mA: number } {
  const total = mA + (led.parallelOhm === undefined ? 0 : (led.Vf / led.parallelOhm) * 1000);
  return { V: led.Vf + (total * led.seriesOhm) / 1000, mA: total };
}

/** Heat in a resistor, W: `I²·R`. */
export const heatW = (mA: number, ohm: number): number => (mA / 1000) ** 2 * ohm;

/** Series resistor for a wanted LED current, ohm: `(V − Vf)/I − R_internal`. */
export const seriesOhmFor = (V: number, Vf: number, mA: number, internalOhm = 0): number =>
  ((V - Vf) / mA) * 1000 - internalOhm;

/** Collector current that an aged coupler still carries, mA: `I_F·CTR·(1 − age)`. */
export const collectormA = (ledmA: number, ctrPct: number, agePct: number): number =>
  ledmA * (ctrPct / 100) * (1 - agePct / 100);

/** Collector current that saturation asks for, mA: `(V_logic − V_CEsat)/R_load`. */
export const saturationmA = (logicV: number, vceSat: number, loadOhm: number): number =>
  ((logicV - vceSat) / loadOhm) * 1000;
