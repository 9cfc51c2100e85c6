/** What relay contacts of a letter-and-number code make and break (IEC 60947-5-1 Annex A). */

interface Letter {
  current: 'ac' | 'dc';
  /** Conventional thermal current, A: never exceeded whatever the voltage. */
  thermalA: number;
  makeVA: number;
  breakVA: number;
}

const letters: Record<string, Letter> = {
  A: { current: 'ac', thermalA: 10, makeVA: 7200, breakVA: 720 },
  B: { current: 'ac', thermalA: 5, makeVA: 3600, breakVA: 360 },
  C: { current: 'ac', thermalA: 2.5, makeVA: 1800, breakVA: 180 },
  D: { current: 'ac', thermalA: 1, makeVA: 432, breakVA: 72 },
  E: { current: 'ac', thermalA: 0.5, makeVA: 216, breakVA: 36 },
  N: { current: 'dc', thermalA: 10, makeVA: 275, breakVA: 275 },
  P: { current: 'dc', thermalA: 5, makeVA: 138, breakVA: 138 },
  Q: { current: 'dc', thermalA: 2.5, makeVA: 69, breakVA: 69 },
  R: { current: 'dc', thermalA: 1, makeVA: 28, breakVA: 28 },
};

// Below this the AC columns no longer follow the VA: the current stays what it is at 120 V.
const leastAcV = 120;

export interface ContactLimit {
  makeA: number;
  breakA: number;
  thermalA: number;
}

/**
 * Most current that a contact of this code makes and breaks at a voltage, in A.
 * @returns undefined for a code of the other kind of current, an unknown one, or a voltage above the code's own.
 */
export function contactLimit(code: string, current: 'ac' | 'dc', V: number): ContactLimit | undefined {
  const letter = letters[code.slice(0, 1)];
  if (!letter || letter.current !== current || V > Number(code.slice(1))) return undefined;
  const { makeVA, breakVA, thermalA } = letter;
  if (current === 'dc') {
    const A = Math.min(breakVA / V, thermalA);
    return { makeA: A, breakA: A, thermalA };
  }
  const volts = Math.max(V, leastAcV);
  return { makeA: makeVA / volts, breakA: Math.min(breakVA / volts, thermalA), thermalA };
}

/** AC-15: makes ten times its rated operational current (IEC 60947-5-1 Table 4; reference §5.3). */
export const ac15MakeFactor = 10;
