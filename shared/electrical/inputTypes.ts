/** The standard operating ranges of digital inputs, IEC 61131-2:2007 table 7. */

export type InputType = 1 | 2 | 3;

/** When an input is on and when it is off. Volts and milliamperes, AC values r.m.s. */
export interface InputLimits {
  /** Off up to here while the current is at most `ITmA`. */
  UL1_V: number;
  /** Off up to here with any current. */
  UL2_V: number;
  /** Off up to this current, with the voltage at most `UL1_V`. */
  ITmA: number;
  /** On from here. */
  UH_V: number;
  /** The least an input draws that is on. */
  IHmA: number;
}

export interface StandardInput extends InputLimits {
  /** The most such an input may draw, mA. */
  mostmA: number;
  /** The most volts that still read as on: the end of the standard range. */
  mostV: number;
}

interface Row extends Omit<StandardInput, 'mostV'> {
  mostV: number | null;
  type: InputType;
  current: 'dc' | 'ac';
  /** Rated volts, from and to. */
  from: number;
  to: number;
}

const row = (
  [current, from, to]: ['dc' | 'ac', number, number],
  type: InputType,
  [UL1_V, UL2_V, mostmA, ITmA, mostV, UH_V, IHmA]: readonly [
    number,
    number,
    number,
    number,
    number | null,
    number,
    number,
  ],
): Row => ({ type, current, from, to, UL1_V, UL2_V, mostmA, ITmA, mostV, UH_V, IHmA });

const dc24 = ['dc', 24, 24] as ['dc', number, number];
const dc48 = ['dc', 48, 48] as ['dc', number, number];
const ac24 = ['ac', 24, 24] as ['ac', number, number];
const ac120 = ['ac', 100, 120] as ['ac', number, number];
const ac230 = ['ac', 200, 240] as ['ac', number, number];

/**
 * 24 V DC confirmed by makers' pages, the others from memory. The type-3 AC currents differ between copies: the lower
 * IT min (harder for off) and the lower IH min (harder for a sensor's least load) stand here.
 * For 100 to 240 V AC the range ends at 1.1 times the rated volts: `null` in the fifth column.
 */
const rows: readonly Row[] = [
  row(dc24, 1, [15, 5, 15, 0.5, 30, 15, 2]),
  row(dc24, 2, [11, 5, 30, 2, 30, 11, 6]),
  row(dc24, 3, [11, 5, 15, 1.5, 30, 11, 2]),
  row(dc48, 1, [34, 10, 15, 0.5, 60, 34, 2]),
  row(dc48, 2, [30, 10, 30, 2, 60, 30, 6]),
  row(dc48, 3, [30, 10, 15, 1.5, 60, 30, 2]),
  row(ac24, 1, [14, 5, 15, 1, 27, 14, 2]),
  row(ac24, 2, [10, 5, 30, 4, 27, 10, 6]),
  row(ac120, 1, [79, 20, 15, 1, null, 79, 2]),
  row(ac120, 2, [74, 20, 30, 4, null, 74, 6]),
  row(ac120, 3, [74, 20, 15, 2, null, 74, 2.5]),
  row(ac230, 1, [164, 40, 15, 2, null, 164, 3]),
  row(ac230, 2, [159, 40, 30, 5, null, 159, 7]),
  row(ac230, 3, [159, 40, 15, 2, null, 159, 3]),
];
const acEnd = 1.1;

/** The range of a declared type at its rated volts; undefined where the table has no such row. */
export function standardInput(V: number, current: 'dc' | 'ac', type: InputType): StandardInput | undefined {
  const found = rows.find(
    (one) => one.type === type && one.current === current && V >= one.from && V <= one.to,
  );
  if (!found) return undefined;
  const { UL1_V, UL2_V, ITmA, UH_V, IHmA, mostmA, mostV } = found;
  return { UL1_V, UL2_V, ITmA, UH_V, IHmA, mostmA, mostV: mostV ?? V * acEnd };
}
