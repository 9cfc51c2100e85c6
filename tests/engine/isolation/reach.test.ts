/** What is live: isolation.md §1, sentence by sentence. */
import { describe, expect, it } from 'vitest';
import { reach } from '../../../shared/isolation/reach';
import { stillLive } from '../../../shared/isolation/stillLive';
import type { Isolator, Panel, Point, Source, Supply } from '../../../shared/panel/panelSchema';
import { dc24, group, isolator, panel, point, source, supply } from './parts';
import { randomPanel } from './randomPanel';

const liveSupplies = (made: Panel, open: string[]): string[] =>
  [...reach(made, new Set(open)).supplies.keys()].sort();

describe('feeds', () => {
  const fed = (supplies: Supply[]) =>
    panel({
      sources: [source('IN1'), source('IN2')],
      isolators: [isolator('Q1'), isolator('Q2'), isolator('Q3')],
      supplies,
    });
  const redundant = fed([
    supply('S', [
      ['IN1', 'Q1'],
      ['IN2', 'Q2'],
    ]),
  ]);
  const series = fed([supply('S', [['IN1', 'Q1', 'Q2']])]);
  const derived = fed([supply('A', [['IN1', 'Q1']]), dc24('B', [['A', 'Q2']])]);
  const noFeed = fed([supply('S', [])]);
  const fromNowhere = fed([supply('S', [['GONE', 'Q1']])]);
  const oneFromNowhere = fed([
    supply('S', [
      ['IN1', 'Q1'],
      ['GONE', 'Q2'],
    ]),
  ]);
  const circle = fed([supply('A', [['B', 'Q1']]), supply('B', [['A', 'Q2']])]);
  const behindCircle = fed([
    supply('A', [['B', 'Q1']]),
    supply('B', [['A', 'Q2']]),
    supply('C', [['A', 'Q3']]),
  ]);
  const fedCircle = fed([
    supply('A', [
      ['B', 'Q1'],
      ['IN1', 'Q3'],
    ]),
    supply('B', [['A', 'Q2']]),
  ]);
  const self = fed([supply('S', [['S', 'Q1']])]);
  const bare = fed([supply('S', [['IN1']])]);

  it.each([
    ['a redundant supply with nothing open', redundant, [], ['S']],
    ['a redundant supply with one feed open', redundant, ['Q1'], ['S']],
    ['a redundant supply with the other feed open', redundant, ['Q2'], ['S']],
    ['a redundant supply with every feed open', redundant, ['Q1', 'Q2'], []],
    ['isolators in series: the first', series, ['Q1'], []],
    ['isolators in series: the second', series, ['Q2'], []],
    ['an isolator that is in no feed', series, ['Q3'], ['S']],
    ['a derived supply behind its own isolator', derived, ['Q2'], ['A']],
    ['a derived supply behind the one upstream', derived, ['Q1'], []],
    ['no feed at all', noFeed, ['Q1', 'Q2', 'Q3'], ['S']],
    ['a feed from nowhere, whatever is open', fromNowhere, ['Q1'], ['S']],
    ['one of two feeds from nowhere', oneFromNowhere, ['Q1', 'Q2'], ['S']],
    ['a circle without a source', circle, ['Q1', 'Q2'], ['A', 'B']],
    ['a supply behind such a circle', behindCircle, [], ['A', 'B', 'C']],
    ['a supply behind such a circle, cut', behindCircle, ['Q3'], ['A', 'B']],
    ['a circle that a source feeds', fedCircle, [], ['A', 'B']],
    ['a circle that a source feeds, cut at the source', fedCircle, ['Q3'], []],
    ['a supply that feeds itself', self, ['Q1'], ['S']],
    ['a feed without an isolator', bare, ['Q1', 'Q2', 'Q3'], ['S']],
    ['an isolator nobody described', fed([supply('S', [['IN1', 'Q9']])]), ['Q9'], ['S']],
  ] as [string, Panel, string[], string[]][])('%s', (_name, made, open, live) => {
    expect(liveSupplies(made, open)).toEqual(live);
  });

  it('gives the path as the reason, from the source to the place', () => {
    const made = panel({
      sources: [source('MCC-2')],
      isolators: [isolator('F7')],
      supplies: [supply('C2', [['MCC-2', 'F7']])],
      groups: [group('G2', 'C2')],
      points: [point('A', 'G2', { terminal: 'X3:14' })],
    });
    expect(reach(made, new Set()).terminals.get('X3:14')).toEqual({
      V: 120,
      maybe: false,
      supply: 'C2',
      path: ['MCC-2', 'F7', 'C2', 'G2', 'X3:14'],
    });
  });
});

describe('what counts as open', () => {
  const opens = (device: Partial<Isolator>, fed: Partial<Supply> = {}, from: Partial<Source> = {}) =>
    liveSupplies(
      panel({
        sources: [source('IN', from)],
        isolators: [isolator('Q', device)],
        supplies: [supply('S', [['IN', 'Q']], fed)],
      }),
      ['Q'],
    ).length === 0;
  const onePole: Partial<Isolator> = { opens: 'one-conductor' };
  const lines = { L1: 'S:1', L2: 'S:2' };

  it.each([
    ['a breaker', {}, {}, {}, true],
    ['one that opens all live conductors', { opens: 'all-live' }, {}, {}, true],
    ['one pole, earthed, to neutral', onePole, {}, {}, true],
    ['one pole, unearthed', onePole, { earthed: false }, {}, false],
    ['one pole, between two phases', onePole, { V: 208, terminals: lines }, { V: 208 }, false],
    ['one pole, the source does not state its volts', onePole, {}, { V: undefined }, false],
    ['one pole, the source does not state its phases', onePole, {}, { phases: undefined }, false],
    ['one pole, before a transformer the file does not draw', onePole, { V: 24 }, {}, false],
    ['one pole, one phase of three to neutral', onePole, {}, { V: 208, phases: 3 }, true],
    ['one pole, a three-phase supply', onePole, { kind: 'ac3' }, { V: 120, phases: 3 }, false],
    ['a contactor', { kind: 'contactor' }, {}, {}, false],
    ['an interlock', { kind: 'interlock' }, {}, {}, false],
    ['one not made for isolation', { suitableForIsolation: false }, {}, {}, false],
    ['a valve drawn in an electrical feed', { kind: 'valve' }, {}, {}, false],
    ['a block drawn in an electrical feed', { kind: 'blocking-device' }, {}, {}, false],
  ] as [string, Partial<Isolator>, Partial<Supply>, Partial<Source>, boolean][])(
    '%s',
    (_name, device, fed, from, dead) => {
      expect(opens(device, fed, from)).toBe(dead);
    },
  );

  it('judges one pole by the supply at the isolator, not by one derived behind it', () => {
    const derived = (upstream: Partial<Supply>, own: Partial<Supply>) =>
      liveSupplies(
        panel({
          sources: [source('IN')],
          isolators: [isolator('Q'), isolator('F', onePole)],
          supplies: [supply('A', [['IN', 'Q']], upstream), dc24('B', [['A', 'F']], own)],
        }),
        ['F'],
      );
    expect(derived({ earthed: true }, { earthed: false })).toEqual(['A']);
    expect(derived({ earthed: false }, { earthed: true })).toEqual(['A', 'B']);
  });

  it('with two descriptions of one tag, counts only when both would', () => {
    const twice = (second: Partial<Isolator>) =>
      liveSupplies(
        panel({
          sources: [source('IN')],
          isolators: [isolator('Q'), isolator('Q', second)],
          supplies: [supply('S', [['IN', 'Q']])],
        }),
        ['Q'],
      );
    expect(twice({ inSight: false })).toEqual([]);
    expect(twice({ suitableForIsolation: false })).toEqual(['S']);
  });
});

describe('incoming sides inside the enclosure', () => {
  const made = panel({
    sources: [source('IN', { V: 400, phases: 3 })],
    isolators: [isolator('F0'), isolator('Q1', { inPanel: true }), isolator('F1', { inPanel: true })],
    supplies: [supply('S', [['IN', 'F0', 'Q1', 'F1']])],
  });
  it.each([
    ['nothing open', [], ['F1', 'Q1']],
    ['the disconnect open: its own incoming side stays live', ['Q1'], ['Q1']],
    ['something upstream of it open', ['F0'], []],
    ['the last one open', ['F1'], ['F1', 'Q1']],
  ] as [string, string[], string[]][])('%s', (_name, open, expected) => {
    expect([...reach(made, new Set(open)).places.keys()].sort()).toEqual(
      expected.map((tag) => `incoming:${tag}`),
    );
  });
  it('has the volts of what comes to it', () => {
    expect(reach(made, new Set(['Q1'])).places.get('incoming:Q1')?.V).toBe(400);
  });
  it('of an isolator that no feed passes may be live: nobody said what comes to it', () => {
    const loose = panel({ isolators: [isolator('Q1', { inPanel: true })] });
    expect(reach(loose, new Set(['Q1'])).places.get('incoming:Q1')?.maybe).toBe(true);
  });
});

describe('foreign voltage and back-feed', () => {
  const made = (more: Partial<Point>, groups = [group('G', 'OWN'), group('H', 'OWN')]) =>
    panel({
      sources: [source('IN'), source('MC2')],
      isolators: [isolator('Q1'), isolator('F12')],
      supplies: [dc24('OWN', [['IN', 'Q1']]), supply('FOR', [['MC2', 'F12']])],
      groups,
      points: [point('A', 'G', more), point('B', 'G'), point('C', 'H')],
    });
  const after = (more: Partial<Point>, open: string[], groups?: Panel['groups']): Record<string, boolean> =>
    Object.fromEntries<boolean>(
      stillLive(made(more, groups), new Set(open))
        .filter(({ terminal }) => terminal !== undefined && !/^(OWN|FOR):/.test(terminal))
        .map(({ terminal = '', maybe }) => [terminal, maybe]),
    );
  const relay: Point['device'] = {
    kind: 'ssr-control',
    Vmin: 3,
    Vmax: 32,
    mA: 10,
    polarised: true,
    rating: { V: 240, current: 'ac', A: 10, polarised: false },
    load: { supply: 'FOR', V: 120, current: 'ac', A: 1, load: 'motor' },
  };
  const backFed = { 'T:A': false, 'T:B': true, 'G:C': true };

  it.each([
    ['own supply off, foreign on', { otherSupply: 'FOR' }, ['Q1'], backFed],
    ['both off', { otherSupply: 'FOR' }, ['Q1', 'F12'], {}],
    ['none stated', { otherSupply: 'none' }, ['Q1'], {}],
    ['nobody has said', { otherSupply: undefined }, ['Q1', 'F12'], { 'T:A': true, 'T:B': true, 'G:C': true }],
    [
      'a supply that the panel does not have',
      { otherSupply: 'X9' },
      ['Q1', 'F12'],
      { 'T:A': true, 'T:B': true, 'G:C': true },
    ],
    ['the load side of a solid-state relay', { device: relay }, ['Q1'], backFed],
    ['a solid-state relay in series', { series: [relay] }, ['Q1'], backFed],
    ['a solid-state relay in parallel', { parallel: [relay] }, ['Q1'], backFed],
    ['a solid-state relay whose load is off', { device: relay }, ['Q1', 'F12'], {}],
  ] as [string, Partial<Point>, string[], Record<string, boolean>][])('%s', (_name, more, open, expected) => {
    expect(after(more, open)).toEqual(expected);
  });

  it('passes a bridge between commons', () => {
    const bridged = [group('G', 'OWN'), group('H', 'OWN', { linkedTo: ['G'] })];
    expect(after({ otherSupply: 'FOR' }, ['Q1'], bridged)).toEqual({ ...backFed, 'T:C': true, 'H:C': true });
  });

  it('passes a bridge from another supply, and back up to the supply of the group', () => {
    const groups = [group('G', 'OWN', { linkedTo: ['H'] }), group('H', 'FOR')];
    const live = reach(made({}, groups), new Set(['Q1']));
    expect(live.groups.get('G')?.maybe).toBe(true);
    expect(live.supplies.get('OWN')).toMatchObject({ maybe: true, supply: 'FOR', V: 120 });
  });

  it.each([
    ['two groups on one terminal', { terminal: 'T:C' }, [group('G', 'OWN'), group('H', 'FOR')]],
    ['two groups on one common', {}, [group('G', 'OWN', { terminal: 'H:C' }), group('H', 'FOR')]],
    [
      'a point on a terminal of another supply',
      { terminal: 'FOR:L' },
      [group('G', 'OWN'), group('H', 'OWN')],
    ],
  ] as [string, Partial<Point>, Panel['groups']][])('takes for a bridge: %s', (_name, more, groups) => {
    expect(reach(made(more, groups), new Set(['Q1'])).terminals.get('T:B')?.maybe).toBe(true);
  });

  it.each([
    ['a common without a supply', group('G', undefined)],
    ['a common on a supply that the panel does not have', group('G', 'X9')],
  ])('may be live for ever: %s', (_name, common) => {
    const live = reach(made({}, [common, group('H', 'OWN')]), new Set(['Q1', 'F12']));
    expect([...live.terminals.keys()].sort()).toEqual(['G:C', 'T:A', 'T:B']);
    expect(live.terminals.get('T:A')).toMatchObject({ maybe: true, V: 120 });
  });

  it('a point without a group may be live for ever', () => {
    const live = reach(made({ group: 'X9' }), new Set(['Q1', 'F12']));
    expect([...live.terminals.keys()]).toEqual(['T:A']);
  });

  it('leaves screens and earth out, and takes every other conductor of a point', () => {
    const conductors: Point['conductors'] = [
      { role: 'signal', wire: '1', terminal: 'T:A' },
      { role: 'return', wire: '2', terminal: 'X9:2' },
      { role: 'screen', wire: '3', terminal: 'X9:3' },
      { role: 'earth', wire: '4', terminal: 'X9:4' },
      { role: 'minus', wire: '5', terminal: 'PE' },
    ];
    const live = reach(made({ conductors }), new Set());
    expect([...live.terminals.keys()].filter((tag) => /^(T:A|X9|PE)/.test(tag))).toEqual(['T:A', 'X9:2']);
  });
});

describe('the still-live picture', () => {
  it('shows what the panel’s own disconnect leaves live, terminals in reading order, then incoming sides', () => {
    const made = panel({
      disconnect: 'Q1',
      sources: [source('IN'), source('MC2')],
      isolators: [isolator('Q1', { inPanel: true }), isolator('F12')],
      supplies: [dc24('OWN', [['IN', 'Q1']]), supply('FOR', [['MC2', 'F12']])],
      groups: [group('G', 'OWN'), group('H', 'FOR')],
      points: [
        point('A', 'H', { terminal: 'X3:14' }),
        point('B', 'H', { terminal: 'X3:9' }),
        point('C', 'G'),
      ],
    });
    const shown = stillLive(made, new Set(['Q1'])).map(
      (one) => one.terminal ?? `incoming ${one.incomingOf ?? ''}`,
    );
    expect(shown).toEqual(['FOR:L', 'FOR:N', 'H:C', 'X3:9', 'X3:14', 'incoming Q1']);
  });
});

describe('opening more', () => {
  it('never makes anything live, over 500 random panels', () => {
    const everything = (made: Panel, open: ReadonlySet<string>) => {
      const { supplies, groups, terminals, places } = reach(made, open);
      return [supplies, groups, terminals, places].flatMap((part, kind) =>
        [...part.keys()].map((tag) => `${kind} ${tag}`),
      );
    };
    let fewer = 0;
    for (let seed = 1; seed <= 500; seed += 1) {
      const { panel: made, random: r } = randomPanel(seed);
      const few = new Set(made.isolators.filter(() => r.chance(0.4)).map(({ tag }) => tag));
      const more = new Set([...few, ...made.isolators.filter(() => r.chance(0.4)).map(({ tag }) => tag)]);
      const before = new Set(everything(made, few));
      const after = everything(made, more);
      expect(
        after.filter((one) => !before.has(one)),
        `seed ${seed}`,
      ).toEqual([]);
      if (after.length < before.size) fewer += 1;
    }
    expect(fewer).toBeGreaterThan(100);
  });
});
