import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { ampacity } from '../../../shared/electrical/ampacity';
import { conductorResistance } from '../../../shared/electrical/conductorResistance';
import { loopDrop } from '../../../shared/electrical/loopDrop';
import { areaMm2, awgDiameterMm, gaugeOf } from '../../../shared/electrical/size';
import { smallConductorCap } from '../../../shared/electrical/smallConductorCap';

/** `share`: how far the value may be from the published one, as a part of it. */
interface Row {
  name: string;
  /** Published source, and the row of ../shared/reference/standards.md §13 that names it. */
  source: string;
  is: number;
  published: number;
  share: number;
}

const ohm = (awg: number) => conductorResistance({ awg }, 'class1-2', 20);
const inch = 25.4;
const kft = 0.3048;

const rows: Row[] = [
  {
    name: 'diameter of 36 AWG, in',
    source: 'ASTM B258 (row 1)',
    is: awgDiameterMm(36) / inch,
    published: 0.005,
    share: 1e-3,
  },
  {
    name: 'diameter of 4/0 AWG, in',
    source: 'ASTM B258 (row 1)',
    is: awgDiameterMm(-3) / inch,
    published: 0.46,
    share: 1e-3,
  },
  {
    name: 'diameter of 24 AWG, in',
    source: 'wire tables (row 1)',
    is: awgDiameterMm(24) / inch,
    published: 0.0201,
    share: 1e-3,
  },
  {
    name: 'step from gauge to gauge',
    source: 'ASTM B258 (row 2)',
    is: awgDiameterMm(17) / awgDiameterMm(18),
    published: 1.1229322,
    share: 1e-7,
  },
  {
    name: '18 AWG, mm²',
    source: 'wire tables (reference §6.2)',
    is: areaMm2({ awg: 18 }),
    published: 0.823,
    share: 1e-3,
  },
  {
    name: '14 AWG, mm²',
    source: 'wire tables (reference §6.2)',
    is: areaMm2({ awg: 14 }),
    published: 2.0809,
    share: 1e-3,
  },
  { name: '18 AWG, ohm/km', source: 'wire tables (row 3)', is: ohm(18), published: 20.94, share: 1e-3 },
  { name: '22 AWG, ohm/km', source: 'wire tables (row 3)', is: ohm(22), published: 52.94, share: 1e-3 },
  { name: '24 AWG, ohm/km', source: 'wire tables (row 3)', is: ohm(24), published: 84.2, share: 1e-3 },
  { name: '30 AWG, ohm/km', source: 'wire tables (row 3)', is: ohm(30), published: 338.5, share: 1e-3 },
  {
    name: '14 AWG solid at 75 °C, ohm per 1000 ft',
    source: 'NEC chapter 9 table 8 (row 4)',
    is: conductorResistance({ awg: 14 }, 'class1-2', 75) * kft,
    published: 3.07,
    share: 2e-3,
  },
  {
    name: '14 AWG stranded at 75 °C, ohm per 1000 ft',
    source: 'NEC chapter 9 table 8 (row 4)',
    is: conductorResistance({ awg: 14 }, 'class5', 75) * kft,
    published: 3.14,
    share: 4e-3,
  },
  {
    name: '20 to 75 °C',
    source: 'annotated NEC table 8: 1.216 (row 5)',
    is: conductorResistance({ awg: 14 }, 'class1-2', 75) / ohm(14),
    published: 1.21615,
    share: 1e-5,
  },
  // Row 6: the published factors are 250/(230 + t); ours is 1 + 0.00393·(t − 20), 0.5 % apart.
  ...(
    [
      [40, 0.926],
      [75, 0.82],
      [90, 0.781],
    ] as const
  ).map(([temp, kt]): Row => ({
    name: `factor back from ${temp} °C`,
    source: 'IEC 60228 (row 6)',
    is: ohm(14) / conductorResistance({ awg: 14 }, 'class1-2', temp),
    published: kt,
    share: 5e-3,
  })),
  {
    name: '1.5 mm² class 2, ohm/km',
    source: 'IEC 60228 (row 7)',
    is: conductorResistance({ mm2: 1.5 }, 'class1-2', 20),
    published: 12.1,
    share: 0,
  },
  {
    name: '1.5 mm² class 5, ohm/km',
    source: 'IEC 60228 (row 7)',
    is: conductorResistance({ mm2: 1.5 }, 'class5', 20),
    published: 13.3,
    share: 0,
  },
  {
    name: 'drop of 12 AWG, 20 A, 100 ft one way, V',
    source: 'licence-exam page, K = 12.9 (row 8)',
    is: loopDrop(20, conductorResistance({ awg: 12 }, 'class5', 75), 100 * kft),
    published: 7.9,
    share: 5e-3,
  },
  {
    name: 'drop of 1.5 mm² class 5, 2 A, 50 m, V',
    source: 'own arithmetic from IEC 60228 (row 9)',
    is: loopDrop(2, conductorResistance({ mm2: 1.5 }, 'class5', 20), 50),
    published: 2.66,
    share: 1e-6,
  },
  {
    name: 'the same, three phases',
    source: 'own arithmetic: √3 instead of 2 (reference §6.5)',
    is: loopDrop(2, 13.3, 50, 'ac3'),
    published: 2.3036,
    share: 1e-4,
  },
];

describe('conductors', () => {
  test.each(rows)('$name: $source', ({ is, published, share }) => {
    expect(Math.abs(is - published)).toBeLessThanOrEqual(published * share);
  });

  test('a gauge and its cross-section are one conductor', () => {
    fc.assert(
      fc.property(fc.integer({ min: -3, max: 36 }), fc.constantFrom('class1-2', 'class5'), (awg, made) => {
        const mm2 = areaMm2({ awg });
        expect(gaugeOf(mm2)).toBeCloseTo(awg, 6);
        expect(conductorResistance({ mm2 }, made, 70)).toBeCloseTo(conductorResistance({ awg }, made, 70), 6);
        for (const practice of ['IEC 60204-1', 'NFPA 79'] as const)
          expect(ampacity({ mm2 }, { practice })).toBe(ampacity({ awg }, { practice }));
        expect(smallConductorCap({ mm2 })).toEqual(smallConductorCap({ awg }));
      }),
    );
  });
});

describe('ampacity', () => {
  const iec = { practice: 'IEC 60204-1' } as const;
  const nfpa = { practice: 'NFPA 79' } as const;

  // Row 11: IEC 60364-5-52, PVC, three loaded, 40 °C, method B2 (machine manual "Cable sizing according IEC").
  test.each([
    [1.5, 13],
    [2.5, 17],
    [4, 23],
    [6, 30],
    [10, 40],
    [16, 54],
  ])('%d mm² carries %d A in method B2 to the ampere (row 11)', (mm2, A) => {
    expect(Math.round(ampacity({ mm2 }, iec) ?? 0)).toBe(A);
  });

  // Pattern of 4 mm² B2 over temperature: 27 (30 °C) / 23 (40) / 21 (45) / 19 (50) / 16 (55) (reference §3.6).
  test.each([
    [30, 27],
    [40, 23],
    [45, 21],
    [50, 19],
    [55, 16],
  ])('4 mm² in B2 at %d °C carries %d A', (ambientC, A) => {
    expect(Math.abs((ampacity({ mm2: 4 }, { ...iec, ambientC }) ?? 0) - A)).toBeLessThan(0.6);
  });

  test.each([
    ['between sizes the lower', { mm2: 2 }, iec, 13.1],
    ['below 0.75 mm² the electronics row (from memory)', { mm2: 0.34 }, iec, 4.3],
    ['thinner than the table: nothing', { mm2: 0.14 }, iec, undefined],
    ['between temperatures the hotter', { mm2: 1.5 }, { ...iec, ambientC: 41 }, 13.1 * 0.91],
    ['hotter than the table: nothing', { mm2: 1.5 }, { ...iec, ambientC: 61 }, undefined],
    ['three circuits in one conduit (from memory)', { mm2: 1.5 }, { ...iec, grouped: 3 }, 13.1 * 0.7],
    ['ten circuits: as twelve', { mm2: 1.5 }, { ...iec, grouped: 10 }, 13.1 * 0.45],
    ['14 AWG in cable, NFPA 79 table 12.5.1', { awg: 14 }, nfpa, 15],
    ['14 AWG inside the enclosure', { awg: 14 }, { ...nfpa, inEnclosure: true }, 20],
    ['16 AWG', { awg: 16 }, nfpa, 10],
    ['a metric size counts as the next thinner gauge', { mm2: 0.75 }, nfpa, 5],
    ['thinner than 30 AWG: nothing', { awg: 32 }, nfpa, undefined],
    ['at 40 °C (NEC 310.15, from memory)', { awg: 14 }, { ...nfpa, ambientC: 40 }, 15 * 0.82],
  ] as const)('%s', (_name, size, laid, A) => {
    const found = ampacity(size, laid);
    if (A === undefined) expect(found).toBeUndefined();
    else expect(found).toBeCloseTo(A, 9);
  });

  test('a gauge under IEC takes the lower metric row', () => {
    // 14 AWG is 2.08 mm².
    expect(ampacity({ awg: 14 }, iec)).toBe(13.1);
  });

  // NEC 240.4(D) (row 10).
  test.each([
    [18, 7, 5.6],
    [16, 10, 8],
    [14, 15, undefined],
    [12, 20, undefined],
    [10, 30, undefined],
  ])('%d AWG: fuse %d A at most', (awg, fuseA, continuousA) => {
    expect(smallConductorCap({ awg })).toEqual({
      fuseA,
      ...(continuousA !== undefined && { continuousA }),
    });
  });

  test('240.4(D) says nothing of 20 AWG and 8 AWG', () => {
    expect([smallConductorCap({ awg: 20 }), smallConductorCap({ awg: 8 })]).toEqual([undefined, undefined]);
  });

  test('hotter or fuller never carries more', () => {
    const laid = fc.record({
      practice: fc.constantFrom('IEC 60204-1', 'NFPA 79'),
      method: fc.constantFrom('B1', 'B2', 'C', 'E'),
    });
    const amps = (...parts: Parameters<typeof ampacity>) => ampacity(...parts) ?? 0;
    fc.assert(
      fc.property(
        laid,
        fc.double({ min: 0.1, max: 20, noNaN: true }),
        fc.integer({ min: 10, max: 70 }),
        fc.integer({ min: 1, max: 25 }),
        fc.integer({ min: 0, max: 20 }),
        (how, mm2, ambientC, grouped, more) => {
          const here = amps({ mm2 }, { ...how, ambientC, grouped });
          expect(amps({ mm2 }, { ...how, ambientC: ambientC + more, grouped })).toBeLessThanOrEqual(here);
          expect(amps({ mm2 }, { ...how, ambientC, grouped: grouped + more })).toBeLessThanOrEqual(here);
          expect(amps({ mm2: mm2 + more }, { ...how, ambientC, grouped })).toBeGreaterThanOrEqual(here);
        },
      ),
    );
  });
});
