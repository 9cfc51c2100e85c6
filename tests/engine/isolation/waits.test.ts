/** How long stored charge takes: isolation.md §3, with values from outside. */
import { describe, expect, it } from 'vitest';
import { dischargeSeconds } from '../../../shared/isolation/dischargeSeconds';
import { waits } from '../../../shared/isolation/waits';
import type { Supply } from '../../../shared/panel/panelSchema';
import { dc24, isolator, panel, source, supply } from './parts';

describe('the discharge of a capacitor', () => {
  // Values of reference/standards.md §13, rows 20 to 22.
  it('400 V to 50 V, 10 kΩ, 470 µF: 9.77 s (a worked example in a textbook page)', () => {
    expect(dischargeSeconds(10_000, 470e-6, 400, 50)).toBeCloseTo(9.77, 2);
  });
  it('1500 V to 320 V, 50 Ω, 195 µF: 0.015062769 s (a resistor maker’s calculation sheet)', () => {
    expect(dischargeSeconds(50, 195e-6, 1500, 320)).toBeCloseTo(0.015062769, 9);
  });
  it('325 V to 60 V in 5 s, 100 µF: 29.59 kΩ (limit of IEC 60204-1 6.2.4)', () => {
    // The row rounds the resistance to four figures.
    expect(dischargeSeconds(29_590, 100e-6, 325, 60)).toBeCloseTo(5, 2);
  });
  it('is never below 0', () => {
    expect(dischargeSeconds(1000, 1e-3, 24, 60)).toBe(0);
  });
});

const waitOf = (fed: Supply, more: Supply[] = []) =>
  waits(panel({ sources: [source('IN')], isolators: [isolator('Q1')], supplies: [...more, fed] }), []).find(
    (one) => one.supply === fed.tag,
  );
const feed = [['IN', 'Q1']];
const tolerance = { minPct: -10, maxPct: 20 };
// Sums by hand: τ = R·C·1.2; t = τ·ln(V0/V).
const tau = 1000 * 0.01 * 1.2;
const bank = { uF: 10_000, bleedOhm: 1000 };

describe('the waits of a supply', () => {
  it('of 24 V +20 % start from 28.8 V: no wait to come near, and one until it should read dead', () => {
    const wait = waitOf(dc24('S', feed, { tolerance, bulk: bank }));
    expect(wait?.t60S).toBe(0);
    expect(wait?.t1S).toBeCloseTo(tau * Math.log(28.8), 9);
    expect(wait).not.toHaveProperty('statedS');
  });
  it('of 300 V DC start from its highest', () => {
    const wait = waitOf(dc24('S', feed, { V: 300, tolerance, bulk: bank, extraLow: 'none' }));
    expect(wait?.t60S).toBeCloseTo(tau * Math.log(360 / 60), 9);
    expect(wait?.t1S).toBeCloseTo(tau * Math.log(360), 9);
  });
  it('behind a rectifier start from √2 of the AC supply’s highest', () => {
    const mains = supply('M', feed, { V: 230, tolerance: { minPct: -10, maxPct: 10 } });
    const wait = waitOf(dc24('S', [['M']], { tolerance, bulk: { ...bank, rectified: true } }), [mains]);
    expect(wait?.t60S).toBeCloseTo(tau * Math.log((Math.SQRT2 * 253) / 60), 9);
  });
  it('behind two rectifiers start from the higher', () => {
    const low = supply('M', feed, { V: 120 });
    const high = supply('N', feed, { V: 230 });
    const wait = waitOf(dc24('S', [['M'], ['N']], { tolerance, bulk: { ...bank, rectified: true } }), [
      low,
      high,
    ]);
    expect(wait?.t60S).toBeCloseTo(tau * Math.log((Math.SQRT2 * 253) / 60), 9);
  });
  it('that makes more than its rectified mains start from its own highest', () => {
    const mains = supply('M', feed, { V: 24 });
    const wait = waitOf(dc24('S', [['M']], { V: 400, tolerance, bulk: { ...bank, rectified: true } }), [
      mains,
    ]);
    expect(wait?.t60S).toBeCloseTo(tau * Math.log(480 / 60), 9);
  });
  it('on AC start from the peak', () => {
    const wait = waitOf(supply('S', feed, { V: 230, bulk: bank }));
    expect(wait?.t60S).toBeCloseTo(tau * Math.log((Math.SQRT2 * 253) / 60), 9);
  });

  const ac = (more: Partial<Supply>) => supply('M', feed, { V: 230, ...more });
  const rectified = dc24('S', [['M']], { tolerance, bulk: { ...bank, rectified: true } });
  it.each([
    ['no bleeder is stated', dc24('S', feed, { tolerance, bulk: { uF: 10_000 } }), []],
    ['no tolerance is stated', dc24('S', feed, { tolerance: undefined, bulk: bank }), []],
    ['the rectified supply states no tolerance', rectified, [ac({ tolerance: undefined })]],
    [
      'the rectifier stands straight on a source',
      dc24('S', feed, { tolerance, bulk: { ...bank, rectified: true } }),
      [],
    ],
    [
      'one of two rectified feeds is not known',
      dc24('S', [['M'], ['IN', 'Q1']], { tolerance, bulk: { ...bank, rectified: true } }),
      [ac({})],
    ],
  ] as [string, Supply, Supply[]][])('promise no time when %s', (_name, fed, more) => {
    expect(waitOf(fed, more)).toEqual({ supply: 'S', t60S: null, t1S: null });
  });

  it('show the time its maker states, beside what can be worked out', () => {
    const stated = { uF: 10_000, dischargeS: 30 };
    expect(waitOf(dc24('S', feed, { tolerance, bulk: stated }))).toEqual({
      supply: 'S',
      t60S: null,
      t1S: null,
      statedS: 30,
    });
    expect(waitOf(dc24('S', feed, { tolerance, bulk: { ...stated, bleedOhm: 1000 } }))).toMatchObject({
      t60S: 0,
      statedS: 30,
    });
  });
  it('are none for a supply that stores nothing, or that stays live with its guard', () => {
    expect(waitOf(dc24('S', feed))).toBeUndefined();
    const guarded = { bulk: bank, mayStayLive: { reason: 'Log', guard: 'Cover' } };
    expect(waitOf(dc24('S', feed, guarded))).toBeUndefined();
  });
});
