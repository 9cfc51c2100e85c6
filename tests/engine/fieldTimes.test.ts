import { describe, expect, it } from 'vitest';
import { instrumentRefusals, localDate } from '../../src/features/fieldwork/answers/instrumentCheck';
import { longestSince, shortestSince } from '../../src/features/fieldwork/person/elapsed';
import { breakMs, newestOwn } from '../../src/features/fieldwork/step/breakSince';
import { electrician, samplePack } from '../support/fieldHarness/samplePack';
import type { Entry } from '../../shared/job/entry';

const minute = 60_000;

describe('time on a phone whose clocks disagree', () => {
  const then = { wall: 1_000_000, mono: 5_000 };
  it.each([
    ['both agree', 10 * minute, 10 * minute, 10 * minute, 10 * minute],
    ['the wall clock was set forward', 1440 * minute, 2 * minute, 1440 * minute, 2 * minute],
    ['the wall clock was set back', -1440 * minute, 2 * minute, 2 * minute, 0],
    ['the page slept', 30 * minute, 1 * minute, 30 * minute, 1 * minute],
  ])('%s', (_name, wall, mono, longest, shortest) => {
    const now = { wall: then.wall + wall, mono: then.mono + mono };
    expect(longestSince(then, now)).toBe(longest);
    expect(shortestSince(then, now)).toBe(shortest);
  });
});

describe('a break', () => {
  const log = '0190a1b2-0000-7000-8000-00000000f001';
  const entry = (seq: number, at: string): Entry => ({
    id: '0190a1b2-0000-7000-8000-000000000009',
    job: samplePack.job.id,
    log,
    seq,
    previous: null,
    seen: {},
    kind: 'note',
    body: { words: 'x' },
    pack: samplePack.digest,
    at,
    signature: 'A'.repeat(86),
  });
  const facts = { people: [], logs: { [log]: electrician.person } };
  const now = Date.parse('2026-12-01T10:00:00Z');
  it('counts from the newest entry by number, not by clock', () => {
    const newest = newestOwn(
      [entry(2, '2026-12-01T09:45:00Z'), entry(1, '2026-12-01T09:59:00Z')],
      facts,
      electrician.person,
    );
    expect(newest?.seq).toBe(2);
    expect(breakMs(newest, now)).toBe(15 * minute);
  });
  it('is long when the clock was set back, none when nothing was ever entered', () => {
    expect(breakMs(entry(1, '2026-12-01T10:01:00Z'), now)).toBe(Infinity);
    expect(breakMs(undefined, now)).toBe(0);
  });
  it('does not count for another person', () => {
    expect(newestOwn([entry(1, '2026-12-01T09:00:00Z')], facts, 'somebody else')).toBeUndefined();
  });
});

describe('a tester', () => {
  const ask = { kind: 'instrument', minCategory: 'CAT III', minV: 300 } as const;
  const tester = {
    make: 'Sample',
    number: '1',
    category: 'CAT III',
    ratedV: 300,
    checkDue: '2026-12-01',
  } as const;
  it.each([
    ['just strong enough, due today', {}, []],
    ['due yesterday', { checkDue: '2026-11-30' }, ['expired']],
    ['a weaker category', { category: 'CAT II' }, ['weak']],
    ['a stronger category', { category: 'CAT IV' }, []],
    ['too few volts', { ratedV: 299 }, ['volts']],
    [
      'everything wrong',
      { checkDue: '2020-01-01', category: 'CAT II', ratedV: 50 },
      ['expired', 'weak', 'volts'],
    ],
  ] as const)('%s', (_name, change, refusals) => {
    expect(instrumentRefusals(ask, { ...tester, ...change }, '2026-12-01')).toEqual(refusals);
  });
  it('is judged by the date where the phone is', () => {
    expect(localDate(new Date(2026, 0, 5, 0, 30))).toBe('2026-01-05');
  });
});
