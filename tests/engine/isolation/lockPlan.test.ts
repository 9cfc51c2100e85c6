/** Which isolators: isolation.md §2, sentence by sentence. */
import { describe, expect, it } from 'vitest';
import { lockPlan } from '../../../shared/isolation/lockPlan';
import { lockWeight } from '../../../shared/isolation/lockWeight';
import type { Isolator, Panel, Supply } from '../../../shared/panel/panelSchema';
import { dc24, group, isolator, panel, point, source, supply } from './parts';

const tags = (made: Panel, scope = ['A']): string[] | null =>
  lockPlan(made, scope)?.isolators.map((one) => one.isolator.tag) ?? null;

/** One supply with one feed through the isolators given; one point on it. */
const through = (isolators: Isolator[], more: Partial<Panel> = {}) =>
  panel({
    sources: [source('IN')],
    isolators,
    supplies: [supply('S', [['IN', ...isolators.map(({ tag }) => tag)]])],
    groups: [group('G', 'S')],
    points: [point('A', 'G')],
    ...more,
  });

describe('the weight of an isolator', () => {
  it.each([
    ['takes a hasp', {}, 10],
    ['needs a device', { lock: 'device-needed' }, 12],
    ['cannot be locked', { lock: 'cannot-lock' }, 1000],
    ['feeds two more things', { alsoFeeds: ['Lights', 'Heater'] }, 16],
    ['is not in sight', { inSight: false }, 12],
    ['all together', { lock: 'device-needed', alsoFeeds: ['Lights'], inSight: false }, 17],
  ] as [string, Partial<Isolator>, number][])('%s', (_name, more, weight) => {
    expect(lockWeight(isolator('Q', more))).toBe(weight);
  });
});

describe('the choice between isolators in series', () => {
  it.each([
    ['a hasp before a device', [isolator('Q1', { lock: 'device-needed' }), isolator('Q2')], ['Q2']],
    [
      'any lock before none',
      [isolator('Q1', { lock: 'cannot-lock' }), isolator('Q2', { alsoFeeds: ['a', 'b', 'c'] })],
      ['Q2'],
    ],
    ['in sight before out of sight', [isolator('Q1', { inSight: false }), isolator('Q2')], ['Q2']],
    ['fewer people to tell', [isolator('Q1', { alsoFeeds: ['Lights'] }), isolator('Q2')], ['Q2']],
    ['a tie: the least tag by code units', [isolator('q1'), isolator('Q2'), isolator('Q10')], ['Q10']],
    [
      'never a contactor, whatever it costs',
      [isolator('K1', { kind: 'contactor' }), isolator('Q1', { lock: 'cannot-lock' })],
      ['Q1'],
    ],
    [
      'never one not made for isolation',
      [isolator('F1', { suitableForIsolation: false }), isolator('Q1', { lock: 'cannot-lock' })],
      ['Q1'],
    ],
    ['only a contactor: no plan', [isolator('K1', { kind: 'contactor' })], null],
  ] as [string, Isolator[], string[] | null][])('%s', (_name, isolators, expected) => {
    expect(tags(through(isolators))).toEqual(expected);
  });

  it('takes one dear isolator that two feeds share before two cheap ones that cost more together', () => {
    const shared = (weight: Partial<Isolator>) =>
      panel({
        sources: [source('IN1'), source('IN2')],
        isolators: [isolator('Q1'), isolator('Q2'), isolator('Q9', weight)],
        supplies: [
          supply('S', [
            ['IN1', 'Q9', 'Q1'],
            ['IN2', 'Q9', 'Q2'],
          ]),
        ],
        groups: [group('G', 'S')],
        points: [point('A', 'G')],
      });
    expect(tags(shared({ alsoFeeds: ['a', 'b', 'c'] }))).toEqual(['Q9']);
    expect(tags(shared({ alsoFeeds: ['a', 'b', 'c', 'd'] }))).toEqual(['Q1', 'Q2']);
    // 19 against 20: and at 20 to 20 the fewer.
    expect(tags(shared({ lock: 'device-needed', alsoFeeds: ['a', 'b'], inSight: false }))).toEqual(['Q9']);
  });
});

describe('what must be dead', () => {
  it('is every supply that enters the panel, not only the scope’s own', () => {
    const made = panel({
      sources: [source('IN'), source('MC2')],
      isolators: [isolator('Q1'), isolator('F12')],
      supplies: [dc24('S24', [['IN', 'Q1']]), supply('S120', [['MC2', 'F12']])],
      groups: [group('G', 'S24'), group('H', 'S120')],
      points: [point('A', 'G'), point('B', 'H')],
    });
    expect(tags(made)).toEqual(['F12', 'Q1']);
  });

  it('is no incoming side of an isolator in the panel: it is covered', () => {
    const plan = lockPlan(through([isolator('Q1', { inPanel: true })]), ['A']);
    expect(plan?.cover).toEqual([{ incomingOf: 'Q1', V: 120, maybe: false, path: ['IN', 'Q1'] }]);
  });

  it.each(['Q1:2', 'Q1.T1', 'Q1/3', 'Q1'])(
    'is the incoming side too when the worked terminal is %s',
    (terminal) => {
      const at = [point('A', 'G', { terminal })];
      const alone = [isolator('Q1', { inPanel: true })];
      expect(tags(through(alone, { points: at }))).toBeNull();
      const upstream = [isolator('F0', { lock: 'device-needed' }), ...alone];
      expect(tags(through(upstream, { points: at }))).toEqual(['F0']);
    },
  );

  it('is not the incoming side of Q1 when the worked terminal is on Q10', () => {
    const at = [point('A', 'G', { terminal: 'Q10:1' })];
    expect(tags(through([isolator('Q1', { inPanel: true })], { points: at }))).toEqual(['Q1']);
  });

  it.each([
    [
      'nobody has said whether foreign voltage reaches a point',
      { points: [point('A', 'G', { otherSupply: undefined })] },
    ],
    [
      'it is so at another point of the panel',
      { points: [point('A', 'G'), point('B', 'G', { otherSupply: undefined })] },
    ],
    ['a common has no supply', { groups: [group('G', 'S'), group('H', undefined)] }],
    ['a supply has no feed', { supplies: [supply('S', [['IN', 'Q1']]), supply('T', [])] }],
  ] as [string, Partial<Panel>][])('cannot be made dead when %s', (_name, more) => {
    expect(tags(through([isolator('Q1')], more))).toBeNull();
  });

  it('asks for known points', () => {
    expect(() => lockPlan(through([isolator('Q1')]), ['B'])).toThrow('no point "B" in panel P1');
  });
});

describe('a supply that may stay live', () => {
  const guard = { mayStayLive: { reason: 'Keeps the log', guard: 'Cover' } };
  const beside = (kept: Partial<Supply>, more: Partial<Panel> = {}) =>
    panel({
      sources: [source('IN'), source('UPS')],
      isolators: [isolator('Q1'), isolator('Q2')],
      supplies: [supply('S', [['IN', 'Q1']]), dc24('K', [['UPS', 'Q2']], { ...guard, ...kept })],
      groups: [group('G', 'S'), group('H', 'K')],
      points: [point('A', 'G'), point('B', 'H')],
      ...more,
    });
  const on = ['Q1'];
  const off = ['Q1', 'Q2'];
  const ac = { kind: 'ac1', terminals: { L: 'K:L', N: 'K:N' } } as const;

  it.each([
    ['24 V DC PELV on a module of its own', {}, {}, on],
    ['nothing said of staying live', { mayStayLive: undefined }, {}, off],
    ['declared neither SELV nor PELV', { extraLow: 'none' }, {}, off],
    ['120 V DC at its highest', { V: 100, tolerance: { minPct: 0, maxPct: 20 } }, {}, on],
    ['above 120 V DC at its highest', { V: 100, tolerance: { minPct: 0, maxPct: 21 } }, {}, off],
    ['50 V AC at its highest', { ...ac, V: 50, tolerance: { minPct: 0, maxPct: 0 } }, {}, on],
    ['above 50 V AC at its highest', { ...ac, V: 48, tolerance: { minPct: 0, maxPct: 5 } }, {}, off],
    ['48 V AC of unknown tolerance', { ...ac, V: 48, tolerance: undefined }, {}, off],
    [
      'it shares a module with the scope',
      {},
      { groups: [group('G', 'S', { module: 'M' }), group('H', 'K', { module: 'M' })] },
      off,
    ],
    [
      'it is foreign voltage at a point of the scope',
      {},
      { points: [point('A', 'G', { otherSupply: 'K' })] },
      off,
    ],
    [
      'its common is bridged to the scope’s',
      {},
      { groups: [group('G', 'S', { linkedTo: ['H'] }), group('H', 'K')] },
      off,
    ],
    ['it stands on a terminal of the scope', {}, { points: [point('A', 'G', { terminal: 'K:+' })] }, off],
    ['the scope itself is on it', {}, { points: [point('A', 'H')] }, off],
  ] as [string, Partial<Supply>, Partial<Panel>, string[]][])('%s', (_name, kept, more, expected) => {
    expect(tags(beside(kept, more))).toEqual(expected);
  });

  it('is listed with its reason and guard', () => {
    expect(lockPlan(beside({}), ['A'])?.guarded).toEqual([
      { supply: 'K', reason: 'Keeps the log', guard: 'Cover' },
    ]);
    // Dead anyway: nothing to guard.
    const derived = beside({}, { supplies: [supply('S', [['IN', 'Q1']]), dc24('K', [['S', 'Q2']], guard)] });
    expect(lockPlan(derived, ['A'])?.guarded).toEqual([]);
  });
});

describe('other energy', () => {
  const air = (isolators: string[] | undefined) =>
    source('AIR', { kind: 'pneumatic', V: undefined, phases: undefined, isolators });
  const made = (devices: Isolator[], named: string[] | undefined) =>
    through([isolator('Q1')], {
      sources: [source('IN'), air(named)],
      isolators: [isolator('Q1'), ...devices],
      supplies: [supply('S', [['IN', 'Q1']])],
    });
  const valve = (tag: string) => isolator(tag, { kind: 'valve', purpose: 'motive' });

  it('joins with all its isolators, after the electrical ones', () => {
    const plan = lockPlan(made([valve('B2'), valve('A1')], ['B2', 'A1']), ['A']);
    expect(plan?.isolators.map((one) => one.isolator.tag)).toEqual(['Q1', 'A1', 'B2']);
    expect(plan?.otherEnergy.map(({ tag }) => tag)).toEqual(['AIR']);
    expect(plan?.weight).toBe(30);
  });
  it.each([
    ['that nothing holds back', made([], undefined)],
    ['held by a device that only controls', made([isolator('K1', { kind: 'contactor' })], ['K1'])],
  ])('%s is in the plan as a source without isolators', (_name, panelMade) => {
    const plan = lockPlan(panelMade, ['A']);
    expect(plan?.isolators.map((one) => one.isolator.tag)).toEqual(['Q1']);
    expect(plan?.otherEnergy.map(({ tag }) => tag)).toEqual(['AIR']);
  });
});

describe('the opening order', () => {
  const ordered = (isolators: Isolator[], supplies: Supply[]) =>
    tags(
      panel({
        sources: [source('IN1'), source('IN2')],
        isolators,
        supplies,
        groups: [group('G', supplies[0]?.tag)],
        points: [point('A', 'G')],
      }),
    );
  const two = [
    supply('S', [
      ['IN1', 'B'],
      ['IN2', 'A'],
    ]),
  ];
  const doorOpen: Partial<Isolator> = { operatedFrom: 'door-open' };

  it.each([
    ['from outside before behind the door', [isolator('A', doorOpen), isolator('B')], two, ['B', 'A']],
    [
      'by location when nothing else decides',
      [isolator('A', { location: 'Z' }), isolator('B', { location: 'Y' })],
      two,
      ['B', 'A'],
    ],
    ['by tag in one location', [isolator('A'), isolator('B')], two, ['A', 'B']],
    [
      'what breaks load before what must not',
      [isolator('A', { loadBreak: false }), isolator('B')],
      two,
      ['B', 'A'],
    ],
    [
      'load side first, out of the order of tags',
      [isolator('A'), isolator('B', { lock: 'cannot-lock' }), isolator('C')],
      [supply('S', [['IN1', 'A']]), supply('T', [['IN2', 'B', 'C']])],
      ['C', 'A'],
    ],
  ] as [string, Isolator[], Supply[], string[]][])('%s', (_name, isolators, supplies, expected) => {
    expect(ordered(isolators, supplies)).toEqual(expected);
  });
});

describe('what the plan says of each isolator', () => {
  const plan = lockPlan(
    through([
      isolator('Q1', {
        lock: 'cannot-lock',
        operatedFrom: 'door-open',
        loadBreak: false,
        alsoFeeds: ['Lights', 'Heater'],
      }),
    ]),
    ['A'],
  );
  it('names whom to tell, the door, the current and the extra measure', () => {
    expect(plan?.isolators[0]).toMatchObject({
      tell: ['Lights', 'Heater'],
      afterDoor: true,
      currentMustBeZero: true,
      extraMeasure: true,
    });
    expect(plan?.weight).toBe(1006);
  });
});

describe('as found', () => {
  const before = through([isolator('Q1'), isolator('Q2')], {
    sources: [source('IN'), source('OLD')],
    supplies: [
      supply('S', [
        ['IN', 'Q1'],
        ['OLD', 'Q2'],
      ]),
    ],
  });
  const now = through([isolator('Q1')]);
  it('opens a feed that was deleted on paper only', () => {
    expect(tags(now)).toEqual(['Q1']);
    expect(lockPlan(now, ['A'], { asBuilt: before })?.isolators.map((one) => one.isolator.tag)).toEqual([
      'Q1',
      'Q2',
    ]);
  });
  it('is the same as itself when nothing changed', () => {
    expect(lockPlan(now, ['A'], { asBuilt: now })).toEqual(lockPlan(now, ['A']));
  });
  it('does not trust a device that one of the two calls a contactor', () => {
    const was = through([isolator('Q1', { kind: 'contactor' })]);
    expect(lockPlan(now, ['A'], { asBuilt: was })).toBeNull();
  });
});

describe('the search', () => {
  const numbers = Array.from({ length: 30 }, (_, index) => index);
  const large = (count: number) =>
    panel({
      sources: [source('IN')],
      isolators: numbers
        .slice(0, count)
        .flatMap((n) => [isolator(`A${n}`), isolator(`B${n}`, { inSight: false })]),
      supplies: numbers.slice(0, count).map((n) => supply(`S${n}`, [['IN', `A${n}`, `B${n}`]])),
      groups: [group('G', 'S0')],
      points: [point('A', 'G')],
    });
  it('may be stopped past 24 isolators, and then says that it is not proven least', () => {
    const stopped = lockPlan(large(13), ['A'], { mayGoOn: () => false });
    expect(stopped?.proven).toBe(false);
    // Whatever it had when stopped still cuts every supply, and holds nothing that is not needed.
    expect(stopped?.isolators).toHaveLength(13);
  });
  it('is never stopped up to 24', () => {
    const made = lockPlan(large(12), ['A'], { mayGoOn: () => false });
    expect([made?.proven, made?.weight]).toEqual([true, 120]);
  });
  it('finds the least set of 60 isolators', () => {
    const made = lockPlan(large(30), ['A']);
    expect([made?.proven, made?.weight]).toEqual([true, 300]);
  });
});
