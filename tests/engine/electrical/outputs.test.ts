import { describe, expect, test } from 'vitest';
import { contactLimit } from '../../../shared/electrical/contactCodes';
import { fuseAtLeast, fuseAtMost, protectsWire, surelyOpensA } from '../../../shared/electrical/fuseSizes';
import { inrushTimes } from '../../../shared/electrical/inrush';
import { capacitorLeakmA, leakVolts, mostBleederOhm } from '../../../shared/electrical/offState';
import { rcMicrofarad, rcOhm, varistorLeastV } from '../../../shared/electrical/suppressorSizes';

describe('contact codes', () => {
  // IEC 60947-5-1 Annex A as a maker's catalogue prints it (reference §5.4): make / break, A.
  test.each([
    ['A300', 120, 60, 6],
    ['A300', 240, 30, 3],
    ['B300', 120, 30, 3],
    ['B300', 240, 15, 1.5],
    ['C300', 240, 7.5, 0.75],
    ['D300', 120, 3.6, 0.6],
    ['D300', 240, 1.8, 0.3],
    ['E150', 120, 1.8, 0.3],
  ])('%s at %d V AC', (code, V, makeA, breakA) => {
    const limit = contactLimit(code, 'ac', V);
    expect(limit?.makeA).toBeCloseTo(makeA, 2);
    expect(limit?.breakA).toBeCloseTo(breakA, 2);
  });
  test.each([
    ['N300', 125, 2.2],
    ['N300', 250, 1.1],
    ['P300', 125, 1.1],
    ['P300', 250, 0.55],
    ['Q300', 125, 0.55],
    ['Q300', 250, 0.27],
    ['R300', 125, 0.22],
    ['R300', 250, 0.11],
  ])('%s at %d V DC', (code, V, A) => {
    expect(contactLimit(code, 'dc', V)?.breakA).toBeCloseTo(A, 1);
    expect(Math.abs((contactLimit(code, 'dc', V)?.breakA ?? 0) - A)).toBeLessThan(0.01);
  });
  test('says nothing above its volts, of the other current, and of no code', () => {
    expect(contactLimit('R150', 'dc', 151)).toBeUndefined();
    expect(contactLimit('R300', 'ac', 120)).toBeUndefined();
    expect(contactLimit('Z300', 'ac', 120)).toBeUndefined();
  });
  test('never above thermal: N300 at 24 V would be 11.5 A', () => {
    expect(contactLimit('N300', 'dc', 24)?.breakA).toBe(10);
  });
});

describe('suppressors', () => {
  test('24 V and 0.5 A: 12 to 24 ohm, 0.25 to 0.5 µF (reference §13 row 34)', () => {
    expect(rcOhm(24)).toEqual({ low: 12, high: 24 });
    expect(rcMicrofarad(0.5)).toEqual({ low: 0.25, high: 0.5 });
  });
  // Makers sell 250–275 V for 230 V and 130–150 V for 120 V (reference §8, from memory).
  test.each([
    [230, 253, 253],
    [120, 132, 132],
  ])('a varistor for %d V', (nominalV, maxV, least) => {
    expect(varistorLeastV(nominalV, maxV)).toBeCloseTo(least, 6);
  });
});

describe('inrush', () => {
  // Reference §13 row 35, 0.2 A: solenoid 2–4 A, lamp 2–3 A, motor 1–2 A, capacitive 4–8 A.
  test.each([
    ['solenoid', 2, 4],
    ['lamp', 2, 3],
    ['motor', 1, 2],
    ['electronic', 4, 8],
  ] as const)('%s of 0.2 A', (load, low, high) => {
    const times = inrushTimes(load, 'ac');
    expect(0.2 * times.low).toBeCloseTo(low, 9);
    expect(0.2 * times.high).toBeCloseTo(high, 9);
  });
});

describe('fuses', () => {
  test('standard sizes (IEC 60127, IEC 60269; from memory)', () => {
    expect(fuseAtLeast(0.51)).toBe(0.63);
    expect(fuseAtMost(7)).toBe(6.3);
    expect(fuseAtMost(0.05)).toBeUndefined();
    expect(fuseAtLeast(101)).toBeUndefined();
  });
  test('I₂ (factors from memory: 2.1, 1.9, 1.6)', () => {
    expect(surelyOpensA(4, 'gG')).toBeCloseTo(8.4, 9);
    expect(surelyOpensA(10, 'gG')).toBeCloseTo(19, 9);
    expect(surelyOpensA(16, 'gG')).toBeCloseTo(25.6, 9);
    expect(protectsWire(10, 'breaker', 10)).toBe(true);
    expect(protectsWire(10, 'gG', 10)).toBe(false);
  });
});

describe('off state', () => {
  // Corrected forum case (reference §13 row 19): 1 mA, 15 kohm, off at 3 V: 3.75 kohm at most.
  test('the largest bleeder', () => expect(mostBleederOhm(1, 15_000, 3)).toBeCloseTo(3750, 6));
  // Reference §13 rows 17 and 18: 3 mA, 2.4 kohm, 3 V: 1.714 kohm; at 1.25 mA none is needed.
  test('the manual’s cases', () => {
    expect(mostBleederOhm(3, 2400, 3)).toBeCloseTo(1714, 0);
    expect(mostBleederOhm(1.25, 2400, 3)).toBe(Infinity);
  });
  test('never more than the supply', () => expect(leakVolts(10, 100_000, 253)).toBe(253));
  // 2π × 50 Hz × 0.1 µF × 230 V = 7.2257 mA, by hand.
  test('a capacitor across a contact', () => expect(capacitorLeakmA(0.1, 230, 50)).toBeCloseTo(7.2257, 3));
});
