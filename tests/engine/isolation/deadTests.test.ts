/** What must be measured: isolation.md §3, where and in which pairs. */
import { describe, expect, it } from 'vitest';
import { deadTests } from '../../../shared/isolation/deadTests';
import { lockPlan } from '../../../shared/isolation/lockPlan';
import type { DeadTest } from '../../../shared/isolation/types';
import type { Group, Panel, Point, Supply } from '../../../shared/panel/panelSchema';
import { dc24, group, isolator, panel, point, source, supply } from './parts';

function made(fed: Supply, more: Partial<Panel> = {}): Panel {
  return panel({
    sources: [source('IN'), source('MC2')],
    isolators: [isolator('Q1'), isolator('F12')],
    supplies: [fed],
    ...more,
  });
}
function testsOf(built: Panel, scope: string[] = []): DeadTest[] {
  const plan = lockPlan(built, scope);
  if (!plan) throw new Error('no plan');
  return deadTests(built, scope, plan);
}
const short = (tests: DeadTest[]) =>
  tests.map(({ pair, terminal, second }) => `${pair} ${terminal} ${second}`);
const at = (tests: DeadTest[], place: 'supply' | 'group' | 'point', tag: string) =>
  tests.filter((test) => place in test.at && Object.values(test.at)[0] === tag);

const fedBy = [['IN', 'Q1']];
const three = (terminals: Supply['terminals'], more: Partial<Supply> = {}) =>
  supply('S', fedBy, { kind: 'ac3', V: 400, terminals, ...more });
const lines = { L1: 'X:1', L2: 'X:2', L3: 'X:3' };

describe('the pairs of a supply, at its own terminals', () => {
  it.each([
    ['dc', dc24('S', fedBy), ['+/0 V S:+ S:-', '+/PE S:+ PE', '0 V/PE S:- PE']],
    ['ac1 with a neutral', supply('S', fedBy), ['L/N S:L S:N', 'L/PE S:L PE', 'N/PE S:N PE']],
    [
      'ac1 between two phases',
      supply('S', fedBy, { terminals: { L1: 'X:1', L2: 'X:2' } }),
      ['L1/L2 X:1 X:2', 'L1/PE X:1 PE', 'L2/PE X:2 PE'],
    ],
    [
      'ac3 without a neutral',
      three(lines),
      ['L1/L2 X:1 X:2', 'L1/L3 X:1 X:3', 'L2/L3 X:2 X:3', 'L1/PE X:1 PE', 'L2/PE X:2 PE', 'L3/PE X:3 PE'],
    ],
    [
      'ac3 with a neutral',
      three({ ...lines, N: 'X:4' }),
      [
        'L1/L2 X:1 X:2',
        'L1/L3 X:1 X:3',
        'L1/N X:1 X:4',
        'L2/L3 X:2 X:3',
        'L2/N X:2 X:4',
        'L3/N X:3 X:4',
        'L1/PE X:1 PE',
        'L2/PE X:2 PE',
        'L3/PE X:3 PE',
        'N/PE X:4 PE',
      ],
    ],
    [
      '0 V bonded at the earth terminal itself',
      dc24('S', fedBy, { terminals: { plus: 'S:+', minus: 'PE' } }),
      ['+/0 V S:+ PE'],
    ],
  ] as [string, Supply, string[]][])('%s', (_name, fed, expected) => {
    expect(short(testsOf(made(fed)))).toEqual(expected);
  });

  it('to PE prove nothing on an unearthed supply; pole to pole counts', () => {
    const proving = (earthed: boolean) =>
      Object.fromEntries(
        testsOf(made(dc24('S', fedBy, { earthed }))).map(({ pair, proves }) => [pair, proves]),
      );
    expect(proving(false)).toEqual({ '+/0 V': true, '+/PE': false, '0 V/PE': false });
    expect(proving(true)).toEqual({ '+/0 V': true, '+/PE': true, '0 V/PE': true });
  });
});

describe('the pairs of a common', () => {
  const common = (fed: Supply, more: Partial<Group>) =>
    short(at(testsOf(made(fed, { groups: [group('G', 'S', more)] })), 'group', 'G'));
  const star = three({ ...lines, N: 'X:4' });

  it.each([
    ['positive', dc24('S', fedBy), { common: 'positive' }, ['+/0 V G:C S:-', '+/PE G:C PE']],
    ['negative', dc24('S', fedBy), { common: 'negative' }, ['+/0 V G:C S:+', '0 V/PE G:C PE']],
    ['line', supply('S', fedBy), { common: 'line' }, ['L/N G:C S:N', 'L/PE G:C PE']],
    ['neutral', supply('S', fedBy), { common: 'neutral' }, ['L/N G:C S:L', 'N/PE G:C PE']],
    [
      'phase L2 of three',
      star,
      { common: 'line', phase: 'L2' },
      ['L1/L2 G:C X:1', 'L2/L3 G:C X:3', 'L2/N G:C X:4', 'L2/PE G:C PE'],
    ],
    [
      'a phase nobody named',
      star,
      { common: 'line' },
      ['?/L1 G:C X:1', '?/L2 G:C X:2', '?/L3 G:C X:3', '?/N G:C X:4', '?/PE G:C PE'],
    ],
  ] as [string, Supply, Partial<Group>, string[]][])('%s', (_name, fed, more, expected) => {
    expect(common(fed, more)).toEqual(expected);
  });
});

describe('the pairs of a point', () => {
  const groups = [group('G', 'S', { common: 'positive' })];
  const atPoint = (more: Partial<Point>, scope: string[], extra: Supply[] = []) => {
    const built = made(dc24('S', fedBy), { groups, points: [point('A', 'G', more)] });
    return at(testsOf({ ...built, supplies: [...built.supplies, ...extra] }, scope), 'point', 'A');
  };
  const foreign = supply('FOR', [['MC2', 'F12']]);

  it('in scope are read at its own terminal, to the other pole and to PE', () => {
    const tests = atPoint({}, ['A']);
    expect(short(tests)).toEqual(['+/0 V T:A S:-', '+/PE T:A PE']);
    expect(tests.every(({ worked }) => worked)).toBe(true);
  });
  it('out of scope are not read', () => {
    expect(atPoint({}, [])).toEqual([]);
  });
  it('with foreign voltage are read in scope or not', () => {
    const foreignPairs = ['L/N T:A FOR:N', 'L/PE T:A PE'];
    expect(short(atPoint({ otherSupply: 'FOR' }, [], [foreign]))).toEqual(foreignPairs);
    expect(short(atPoint({ otherSupply: 'FOR' }, ['A'], [foreign]))).toEqual([
      ...foreignPairs,
      '+/0 V T:A S:-',
    ]);
  });
  it('with unearthed foreign voltage are read against both its poles, and PE proves nothing', () => {
    const tests = atPoint({ otherSupply: 'FOR' }, ['A'], [{ ...foreign, earthed: false }]);
    expect(short(tests)).toEqual(['?/L T:A FOR:L', '?/N T:A FOR:N', '?/PE T:A PE', '+/0 V T:A S:-']);
    expect(tests.find(({ second }) => second === 'PE')?.proves).toBe(false);
  });
  it('are read at every conductor but screen and earth, and not against themselves', () => {
    const conductors: Point['conductors'] = [
      { role: 'signal', wire: '1', terminal: 'T:A' },
      { role: 'minus', wire: '2', terminal: 'X9:2' },
      { role: 'screen', wire: '3', terminal: 'X9:3' },
      { role: 'earth', wire: '4', terminal: 'PE' },
    ];
    expect(short(atPoint({ conductors }, ['A']))).toEqual([
      '+/0 V T:A S:-',
      '+/PE T:A PE',
      '+/0 V X9:2 S:+',
      '0 V/PE X9:2 PE',
    ]);
  });
});

describe('the list', () => {
  const both = panel({
    sources: [source('IN'), source('MC2')],
    isolators: [isolator('Q1'), isolator('F12')],
    supplies: [
      dc24('S', [['IN', 'Q1']]),
      dc24('K', [['MC2', 'F12']], { mayStayLive: { reason: 'Log', guard: 'Cover' } }),
    ],
    groups: [
      group('G', 'S', { common: 'positive' }),
      group('H', 'K', { common: 'positive', terminal: 'S:+' }),
    ],
    points: [point('A', 'G')],
  });
  it('leaves out a supply that the plan leaves on with its guard', () => {
    const apart = { ...both, groups: [group('G', 'S', { common: 'positive' }), group('H', 'K')] } as Panel;
    expect(testsOf(apart, ['A']).filter((test) => test.supply === 'K')).toEqual([]);
    expect(testsOf(apart, ['A']).length).toBeGreaterThan(0);
  });
  it('asks for two terminals once, and they prove only what they prove for every supply', () => {
    const tests = testsOf(
      {
        ...both,
        supplies: both.supplies.map((one) => ({ ...one, mayStayLive: undefined, earthed: one.tag === 'S' })),
      },
      ['A'],
    );
    const pairs = tests.map(({ terminal, second }) => `${terminal} ${second}`);
    expect(new Set(pairs).size).toBe(pairs.length);
    expect(tests.find(({ terminal, second }) => terminal === 'S:+' && second === 'PE')?.proves).toBe(false);
  });
  it('gives every test its own id, also when a supply, a group and a point share a tag', () => {
    const same = made(dc24('A', fedBy), {
      groups: [group('A', 'A', { common: 'positive' })],
      points: [point('A', 'A')],
    });
    const ids = testsOf(same, ['A']).map(({ id }) => id);
    expect(new Set(ids).size).toBe(ids.length);
    expect(ids).toHaveLength(7);
  });
  it('names its tests so that they stay the same', () => {
    expect(testsOf(made(dc24('S', fedBy))).map(({ id }) => id)).toEqual([
      'dead.S.+-0V',
      'dead.S.+-PE',
      'dead.S.0V-PE',
    ]);
  });
  it('takes the limit of the site, else 1 V', () => {
    const built = made(dc24('S', fedBy));
    const plan = lockPlan(built, []);
    if (!plan) throw new Error('no plan');
    expect(new Set(deadTests(built, [], plan, 0.5).map(({ limitV }) => limitV))).toEqual(new Set([0.5]));
    expect(new Set(deadTests(built, [], plan).map(({ limitV }) => limitV))).toEqual(new Set([1]));
  });
});
