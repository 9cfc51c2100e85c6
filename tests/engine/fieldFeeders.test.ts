import { describe, expect, it } from 'vitest';
import type { ReadingAsk } from '../../shared/checklist/types';
import { feeders, type Feeder } from '../../src/features/fieldwork/live/feeders';
import { samplePanel } from '../support/fieldHarness/samplePanel';

const ask = (unit: 'V AC' | 'V DC', supply: string, terminal: string): ReadingAsk => ({
  kind: 'reading',
  unit,
  high: 1,
  dead: { supply, pair: 'L/PE', terminal, second: 'PE1', proves: true },
});
const foreign = ask('V AC', 'C2', 'X5:1');
const brief = (feeder: Feeder): string => {
  if (feeder.why === 'path') return `path ${feeder.path.join(' ')} open ${feeder.open?.tag ?? 'none'}`;
  if (feeder.why === 'not-opened') return `not-opened ${feeder.isolator.tag}`;
  return feeder.why === 'stored' ? `stored ${feeder.supply}` : feeder.why;
};
const found = (given: ReadingAsk, ...locked: string[]) =>
  feeders(samplePanel, given, new Set(locked)).map(brief);

describe('what can feed a terminal', () => {
  it('names the path that own locks do not break, and the isolator to go to', () => {
    const [first] = found(foreign, 'Q1');
    expect(first).toMatch(/^path HQ-MC2 F12 C2/);
    expect(first).toMatch(/open F12$/);
  });
  it('counts only the locks given: nothing locked leaves every path', () => {
    expect(found(ask('V DC', 'S24', 'X1:1'))[0]).toMatch(/^path HQ-DB1 Q1 S24.* open Q1$/);
  });
  it('with every path locked, doubts the isolator on the way and not one beside it', () => {
    expect(found(foreign, 'Q1', 'F12')).toEqual(['not-opened F12', 'induced', 'wrong-terminal']);
  });
  it('thinks of stored charge where a supply has it', () => {
    expect(found(ask('V DC', 'S24', 'X1:1'), 'Q1', 'F12')).toEqual([
      'not-opened Q1',
      'stored S24',
      'wrong-terminal',
    ]);
  });
  it('always ends with the doubt that does not depend on the panel file', () => {
    for (const locked of [[], ['Q1'], ['F12'], ['Q1', 'F12']])
      expect(found(foreign, ...locked).at(-1)).toBe('wrong-terminal');
  });
});
