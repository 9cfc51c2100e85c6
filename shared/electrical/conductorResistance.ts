/** What a copper conductor resists, per kilometre, at a temperature. */
import { areaMm2, type Size } from './size';

export type ConductorClass = 'class1-2' | 'class5';

/**
 * Greatest resistance at 20 °C, plain copper, ohm/km: mm², class 1 and 2, class 5.
 * 0.5 to 16 mm²: IEC 60228. From 25 mm²: IEC 60228, from memory. Below 0.5 mm²: DIN VDE 0295 stranded, for both columns.
 */
const greatestAt20: readonly (readonly [number, number, number])[] = [
  [0.14, 134, 134],
  [0.25, 76, 76],
  [0.34, 53, 53],
  [0.5, 36.0, 39.0],
  [0.75, 24.5, 26.0],
  [1, 18.1, 19.5],
  [1.5, 12.1, 13.3],
  [2.5, 7.41, 7.98],
  [4, 4.61, 4.95],
  [6, 3.08, 3.3],
  [10, 1.83, 1.91],
  [16, 1.15, 1.21],
  [25, 0.727, 0.78],
  [35, 0.524, 0.554],
  [50, 0.387, 0.386],
  [70, 0.268, 0.272],
  [95, 0.193, 0.206],
  [120, 0.153, 0.161],
];

const tabulated = new Map(greatestAt20.map(([mm2, solid, fine]) => [mm2, { solid, fine }]));

/** IEC 60028: 0.017241 ohm·mm²/m at 20 °C, as ohm·mm²/km. */
const copper = 17.241;
/** Per kelvin at 20 °C (IEC 60028). */
const alpha20 = 0.00393;
/** Stranding makes the wire longer than the conductor: the most that NEC chapter 9 table 8 shows (12 AWG, 1.98 / 1.93). */
const stranding = 1.026;

function at20(size: Size, conductor: ConductorClass): number {
  const listed = 'mm2' in size ? tabulated.get(size.mm2) : undefined;
  if (listed) return conductor === 'class5' ? listed.fine : listed.solid;
  const solid = copper / areaMm2(size);
  return conductor === 'class5' ? solid * stranding : solid;
}

/**
 * Ohm/km. Tabulated metric sizes by IEC 60228 (maxima); AWG and sizes between by cross-section (ASTM B258, IACS copper).
 * `R(T) = R20·(1 + 0.00393·(T − 20))`.
 */
export const conductorResistance = (size: Size, conductor: ConductorClass, tempC: number): number =>
  at20(size, conductor) * (1 + alpha20 * (tempC - 20));
