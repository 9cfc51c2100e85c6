import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { leakageBleeder, loadBleeder } from '../../../shared/electrical/bleeder';
import { nearestE24, nextLowerE24 } from '../../../shared/electrical/eSeries';
import { solveLeakage } from '../../../shared/electrical/inputLoop';
import { standardState } from '../../../shared/electrical/inputState';
import { standardInput } from '../../../shared/electrical/inputTypes';
import { heatW, seriesOhmFor, voltsForLed } from '../../../shared/electrical/optoInput';
import { ratingFor } from '../../../shared/electrical/resistorWatts';
import { dischargeSeconds } from '../../../shared/isolation/dischargeSeconds';

describe('LED resistors', () => {
  test.each([
    ['24 V, 1.5 V, 12 mA, 262 ohm inside: drive maker (row 12)', seriesOhmFor(24, 1.5, 12, 262), 1613],
    ['the same on 12 V (row 13)', seriesOhmFor(12, 1.5, 12, 262), 613],
    ['24 V, 1.2 V, 15 mA (row 14)', seriesOhmFor(24, 1.2, 15), 1520],
    [
      '110 V, 10 mA, forward volts neglected: isolated-input manual (row 15)',
      seriesOhmFor(110, 0, 10),
      11000,
    ],
  ])('%s', (_name, ohm, published) => {
    expect(Math.round(ohm)).toBe(published);
  });

  test('heat: 0.337 W in 1.5 kΩ at 15 mA (row 14), 1.1 W in 11 kΩ at 10 mA (row 15)', () => {
    expect(heatW(15, 1500)).toBeCloseTo(0.3375, 6);
    expect(heatW(10, 11000)).toBeCloseTo(1.1, 6);
  });
});

describe('E24 (IEC 60063, row 16)', () => {
  test.each([
    [4.2, 4.3],
    [613, 620],
    [1613, 1600],
    [1520, 1500],
    [3.0, 3.0],
    [8.2, 8.2],
    [9900, 10000],
  ])('nearest to %d is %d', (ohm, value) => {
    expect(nearestE24(ohm)).toBe(value);
  });

  test.each([
    [1714.2, 1600],
    [3750, 3600],
    [1000, 1000],
    [999.9, 910],
    [2200, 2200],
    [0.5, 0.47],
  ])('next lower than %d is %d', (ohm, value) => {
    expect(nextLowerE24(ohm)).toBe(value);
  });

  test('never above, never more than a step below', () => {
    fc.assert(
      fc.property(fc.double({ min: 0.1, max: 1e7, noNaN: true }), (ohm) => {
        const value = nextLowerE24(ohm);
        expect(value).toBeLessThanOrEqual(ohm * (1 + 1e-9));
        expect(value).toBeGreaterThan(ohm / 1.16);
      }),
    );
  });
});

describe('bleeder', () => {
  const input = (ohm: number, offV: number) => ({ offV, inputmA: (offV / ohm) * 1000, highestV: 28.8 });

  test('3 mA, 2.4 kΩ, off 3 V: at most 1.714 kΩ (controller manual, row 17)', () => {
    const made = leakageBleeder({ ...input(2400, 3), leakmA: 3 });
    expect(made?.atMostOhm).toBeCloseTo(1714.29, 1);
    expect(made?.ohm).toBe(1600);
  });

  test('1.25 mA needs none on the same input (row 18)', () => {
    expect(leakageBleeder({ ...input(2400, 3), leakmA: 1.25 })).toBeUndefined();
    expect(leakageBleeder({ ...input(2400, 3), leakmA: 1.26 })).toBeDefined();
  });

  // Row 19: the forum case, with the right formula and the two wrong ones.
  test.each([
    [3750, 3],
    [10_000, 6],
    [30_000, 10],
  ])('1 mA on 15 kΩ with %d Ω across leaves %d V (row 19)', (bleederOhm, V) => {
    const leak = { leakmA: 1, highestV: 24, bleederOhm, draw: { kind: 'resistive', ohm: 15_000 } as const };
    expect(solveLeakage(leak).V).toBeCloseTo(V, 6);
  });

  test('that case asks for 3.75 kΩ at most (row 19)', () => {
    expect(leakageBleeder({ ...input(15_000, 3), leakmA: 1 })?.atMostOhm).toBeCloseTo(3750, 6);
  });

  test('watts: twice the heat at the highest volts, from the printed list', () => {
    // 28.8² / 1600 = 0.518 W, twice that is 1.04 W: 2 W.
    expect(leakageBleeder({ ...input(2400, 3), leakmA: 3 })).toMatchObject({ W: 2 });
    expect([ratingFor(0.125), ratingFor(0.126), ratingFor(5), ratingFor(5.01)]).toEqual([
      0.25,
      0.5,
      10,
      undefined,
    ]);
  });

  test('least load: 12 V over a lack of 3 mA is 4 kΩ at most', () => {
    const made = loadBleeder({ lowestV: 12, minmA: 5, inputmA: 2, highestV: 28.8 });
    expect(made).toMatchObject({ atMostOhm: 4000, ohm: 3900 });
  });

  test('as computed it holds the input off, and 1 % more would not', () => {
    fc.assert(
      fc.property(
        fc.double({ min: 0.2, max: 20, noNaN: true }),
        fc.double({ min: 500, max: 50_000, noNaN: true }),
        fc.double({ min: 1, max: 10, noNaN: true }),
        (leakmA, ohm, offV) => {
          const made = leakageBleeder({ ...input(ohm, offV), leakmA });
          const left = (bleederOhm: number) =>
            solveLeakage({ leakmA, highestV: 1e6, bleederOhm, draw: { kind: 'resistive', ohm } }).V;
          if (made) {
            expect(left(made.ohm)).toBeLessThanOrEqual(offV * (1 + 1e-9));
            expect(left(made.atMostOhm)).toBeCloseTo(offV, 5);
            // A resistor a million times the input's leads nothing away that doubles can show.
            if (made.atMostOhm < 1e6 * ohm) expect(left(made.atMostOhm * 1.01)).toBeGreaterThan(offV);
          } else expect(left(Infinity)).toBeLessThanOrEqual(offV * (1 + 1e-9));
        },
      ),
    );
  });
});

describe('IEC 61131-2 types (row 31)', () => {
  const state = (type: 1 | 2 | 3, V: number, mA: number, at: [number, 'dc' | 'ac'] = [24, 'dc']) => {
    const range = standardInput(at[0], at[1], type);
    if (!range) throw new Error('not in the table');
    return standardState(range, V, mA);
  };

  test.each([
    ['type 1 at 5.0 V', 1, 5, 3, 'off'],
    ['type 1 at 10 V', 1, 10, 3, 'undefined'],
    ['type 1 at 15 V', 1, 15, 3, 'on'],
    ['type 3 at 11 V', 3, 11, 3, 'on'],
    ['type 3 just below', 3, 10.99, 3, 'undefined'],
    ['type 1 at 14 V with 0.5 mA: off by current', 1, 14, 0.5, 'off'],
    ['type 1 at 14 V with 0.51 mA', 1, 14, 0.51, 'undefined'],
    ['type 1 at 5.01 V with 2 mA', 1, 5.01, 2, 'undefined'],
    ['type 2 at 11 V', 2, 11, 6, 'on'],
  ] as const)('%s', (_name, type, V, mA, expected) => {
    expect(state(type, V, mA)).toBe(expected);
  });

  test.each([
    [120, 'ac', 1, 20, 79],
    [230, 'ac', 1, 40, 164],
    [230, 'ac', 2, 40, 159],
    [48, 'dc', 3, 10, 30],
  ] as const)(
    '%d V %s type %d: off to %d V, on from %d V (makers’ modules, reference §4.3)',
    (V, kind, type, off, on) => {
      expect(standardInput(V, kind, type)).toMatchObject({ UL2_V: off, UH_V: on });
    },
  );

  test('the range ends at 1.1 times the rated volts on AC mains', () => {
    expect(standardInput(230, 'ac', 1)?.mostV).toBeCloseTo(253, 9);
  });

  test.each([
    [12, 'dc', 1],
    [125, 'dc', 1],
    [24, 'ac', 3],
    [60, 'ac', 1],
  ] as const)('holds no row for %d V %s type %d', (V, kind, type) => {
    expect(standardInput(V, kind, type)).toBeUndefined();
  });
});

describe('a resistor across the LED raises its threshold', () => {
  // Own arithmetic: U = VF + (IF + VF/Rp)·Rs (reference §7) = 1.2 + (0.003 + 1.2/1200)·2200 = 10 V.
  test('1.2 V, 3 mA, 1.2 kΩ across, 2.2 kΩ before', () => {
    expect(voltsForLed({ seriesOhm: 2200, parallelOhm: 1200, Vf: 1.2 }, 3)).toEqual({ V: 10, mA: 4 });
  });
});

describe('discharge', () => {
  // Row 20 (worked example, printed 9.8 s), row 21 (resistor maker's calculator), row 22 (IEC 60204-1 6.2.4 limit, own arithmetic).
  test.each([
    [10_000, 470e-6, 400, 50, 9.77],
    [50, 195e-6, 1500, 320, 0.015062769],
    [29_590, 100e-6, 325, 60, 5],
  ])('%d Ω, %d F, %d V to %d V: %d s', (ohm, farad, from, to, seconds) => {
    const is = dischargeSeconds(ohm, farad, from, to);
    expect(Math.abs(is - seconds)).toBeLessThan(seconds * 1e-3);
  });
});
