import { describe, expect, it } from 'vitest';
import type { ReadingAsk } from '../../shared/checklist/types';
import type { Entry } from '../../shared/job/entry';
import { deadBand, supplyStillOn } from '../../src/features/fieldwork/live/deadBand';
import { liveReading } from '../../src/features/fieldwork/live/liveReading';
import { tenTimes } from '../../src/features/fieldwork/step/tenTimes';
import { electrician, foreman, jobId, samplePack } from '../support/fieldHarness/samplePack';
import { samplePanel } from '../support/fieldHarness/samplePanel';

const dead = (unit: 'V AC' | 'V DC', supply = 'C2'): ReadingAsk => ({
  kind: 'reading',
  unit,
  high: 1,
  dead: { supply, pair: 'L/PE', terminal: 'X5:C2', second: 'PE1', proves: true },
});

describe('a dead reading', () => {
  // Bands of isolation.md §3.
  it.each([
    ['the limit itself', 'V AC', 1, 'dead'],
    ['just above', 'V AC', 1.1, 'not-dead'],
    ['25 V AC', 'V AC', 25, 'not-dead'],
    ['above 25 V AC', 'V AC', 25.1, 'live'],
    ['60 V DC', 'V DC', 60, 'not-dead'],
    ['above 60 V DC', 'V DC', 60.1, 'live'],
    ['probes the other way round', 'V DC', -110, 'live'],
    ['a small negative reading', 'V DC', -0.4, 'dead'],
  ] as const)('%s (%s %d) is %s', (_name, unit, value, band) => {
    expect(deadBand(dead(unit), value)).toBe(band);
  });

  it('without a limit is never dead but at 0', () => {
    const { high: _high, ...ask } = dead('V AC');
    expect(deadBand(ask, 0.1)).toBe('not-dead');
    expect(deadBand(ask, 0)).toBe('dead');
  });

  it.each([
    ['80 % of the supply', 'V DC', 19.2, 'S24'],
    ['below 80 %', 'V DC', 19.1, undefined],
    ['probes the other way round', 'V DC', -24, 'S24'],
    ['the AC supply', 'V AC', 118, 'C2'],
    ['a DC supply read as AC is as live', 'V AC', 24, 'S24'],
  ] as const)('tells a supply that is still on: %s', (_name, unit, value, supply) => {
    expect(supplyStillOn(samplePanel, dead(unit), value)?.tag).toBe(supply);
  });
});

describe('the red screen', () => {
  const phone = '0190a1b2-0000-7000-8000-00000000f001';
  const other = '0190a1b2-0000-7000-8000-00000000f002';
  const theirs = '0190a1b2-0000-7000-8000-00000000f003';
  const facts = {
    people: [],
    logs: { [phone]: electrician.person, [other]: electrician.person, [theirs]: foreman.person },
  };
  const entry = (log: string, seq: number, step: string, value: number, seen: Entry['seen'] = {}): Entry => ({
    id: `0190a1b2-0000-7000-8000-${log.slice(-4)}${String(seq).padStart(8, '0')}`,
    job: jobId,
    log,
    seq,
    previous: null,
    seen,
    kind: 'answer',
    body: { step, value: { kind: 'reading', value }, shown: 'x', language: 'en' },
    pack: samplePack.digest,
    at: '2026-12-01T09:00:00Z',
    signature: 'A'.repeat(86),
  });
  const held = (...entries: Entry[]) =>
    liveReading(samplePack.checklist, entries, facts, electrician.person)?.value;

  it.each([
    ['holds after a live reading', [entry(phone, 1, 'dead-c2', 118)], 118],
    [
      'holds whatever the order of arrival',
      [entry(phone, 2, 'dead-c2', 118), entry(phone, 1, 'dead-c2', 0)],
      118,
    ],
    [
      'lets go after a good reading',
      [entry(phone, 1, 'dead-c2', 118), entry(phone, 2, 'dead-c2', 0.2)],
      undefined,
    ],
    [
      'is not lifted by an answer that is no dead reading',
      [entry(phone, 1, 'dead-c2', 118), entry(phone, 2, 'loop', 2)],
      118,
    ],
    ['counts a negative reading', [entry(phone, 1, 'dead-s24', -24)], -24],
    ['does not hold for another person’s reading', [entry(theirs, 1, 'dead-c2', 118)], undefined],
    [
      'holds on the other phone of the same person',
      [entry(other, 1, 'dead-c2', 118), entry(phone, 1, 'dead-c2', 0)],
      118,
    ],
    [
      'lets go on the other phone when that reading had seen the live one',
      [entry(other, 1, 'dead-c2', 118), entry(phone, 1, 'dead-c2', 0, { [other]: 1 })],
      undefined,
    ],
  ] as const)('%s', (_name, entries, value) => {
    expect(held(...entries)).toBe(value);
  });
});

describe('ten times off', () => {
  const ask = (low?: number, high?: number): ReadingAsk => ({
    kind: 'reading',
    unit: 'V DC',
    ...(low === undefined ? {} : { low }),
    ...(high === undefined ? {} : { high }),
  });
  it.each([
    ['2.4 for 24', ask(18.2, 26.4), 2.4, 24],
    ['240 for 24', ask(18.2, 26.4), 240, 24],
    ['24 for 2.4 ohm', ask(1.6, 3.1), 24, 2.4],
    ['in limits', ask(18.2, 26.4), 24, undefined],
    ['no slip explains it', ask(18.2, 26.4), 12, undefined],
    ['zero', ask(18.2, 26.4), 0, undefined],
    ['only a lower limit: never talked into a pass', ask(1), 0.5, undefined],
    ['a dead test: never offered', dead('V AC'), 8, undefined],
  ])('%s', (_name, given, value, meant) => {
    expect(tenTimes(given, value)).toBe(meant);
  });
});
