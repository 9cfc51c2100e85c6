import { describe, expect, test } from 'vitest';
import { recordExceptions } from '../../../shared/api/recordExceptions';
import type { RecordDocument } from '../../../shared/api/recordDocument';

type Test = RecordDocument['deadTests'][number];
const deadTest = (value: number, verdict: Test['verdict'], at: string, terminal = 'X1:1'): Test => ({
  terminal,
  second: 'PE',
  pair: '+/PE',
  supply: 'S24',
  value,
  unit: 'V AC',
  person: 'Mara Lind',
  at,
  round: 1,
  verdict,
});
const land = (answer: string, verdict: Test['verdict']) => ({
  step: 'wire.P1.land',
  stage: 'wire',
  shown: 'Land wire 1',
  answer,
  person: 'Mara Lind',
  at: '2026-11-30T09:00:00Z',
  round: 1,
  verdict,
});

const told = (deadTests: Test[], steps: ReturnType<typeof land>[] = []) =>
  recordExceptions({ deadTests, points: [], steps } as unknown as RecordDocument);

describe('the exceptions of a record', () => {
  test('name a live reading and how it ended', () => {
    const live = deadTest(118, 'out', '2026-11-30T08:00:00Z');
    const found = told([
      live,
      deadTest(0, 'ok', '2026-11-30T08:05:00Z'),
      deadTest(0.1, 'ok', live.at, 'X1:2'),
    ]);
    expect(found).toEqual([
      {
        verdict: 'out',
        shown: null,
        between: ['X1:1', 'PE'],
        answer: '118 V AC',
        person: 'Mara Lind',
        at: live.at,
        then: ['0 V AC'],
      },
    ]);
  });

  test('name an answer that nothing has mended', () => {
    expect(told([], [land('Is loose', 'out')]).map(({ answer, then }) => [answer, then])).toEqual([
      ['Is loose', []],
    ]);
  });

  test('are none when everything was in limits', () => {
    expect(told([deadTest(0, 'ok', '2026-11-30T08:00:00Z')], [land('Is tight', 'ok')])).toEqual([]);
  });
});
