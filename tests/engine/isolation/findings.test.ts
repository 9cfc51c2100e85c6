/** The findings of isolation.md: each where it belongs, and not where it does not. */
import { describe, expect, it } from 'vitest';
import { isolationFindings, isolationReport } from '../../../shared/isolation/isolationFindings';
import type { Isolator, Panel, Point, Source, Supply } from '../../../shared/panel/panelSchema';
import { blocksScope } from '../../../shared/rules/findingsInScope';
import { messageOf, render } from '../../../shared/wording/render';
import { dc24, group, isolator, panel, point, source, supply } from './parts';

const healthy = (more: Partial<Panel> = {}): Panel =>
  panel({
    disconnect: 'Q1',
    sources: [source('IN'), source('MC2')],
    isolators: [isolator('Q1'), isolator('F12')],
    supplies: [dc24('S', [['IN', 'Q1']]), supply('T', [['MC2', 'F12']])],
    groups: [group('G', 'S'), group('H', 'T')],
    points: [point('A', 'G'), point('B', 'H')],
    ...more,
  });
const supplies = (first: Partial<Supply>): Partial<Panel> => ({
  supplies: [dc24('S', [['IN', 'Q1']], first), supply('T', [['MC2', 'F12']])],
});
const devices = (first: Partial<Isolator>): Partial<Panel> => ({
  isolators: [isolator('Q1', first), isolator('F12')],
});
const sources = (...more: Source[]): Partial<Panel> => ({ sources: [source('IN'), source('MC2'), ...more] });
const points = (first: Partial<Point>): Partial<Panel> => ({
  points: [point('A', 'G', first), point('B', 'H')],
});
const air = (isolators?: string[]) =>
  source('AIR', { kind: 'pneumatic', V: undefined, phases: undefined, isolators });
const bank = { uF: 4700 };
const circle = [...healthy().supplies, dc24('U', [['W', 'Q1']]), dc24('W', [['U', 'Q1']])];

const found = (made: Panel, scope = ['A']) =>
  isolationFindings(made, scope).map(({ rule, harm, where }) => `${rule} ${harm} ${JSON.stringify(where)}`);

describe('a panel with nothing to say', () => {
  it('has no finding', () => {
    expect(found(healthy())).toEqual([]);
  });
});

describe('each finding', () => {
  it.each([
    ['no set of isolators', devices({ suitableForIsolation: false }), 'isolation.none hurts {}'],
    ['a supply without a feed', supplies({ feeds: [] }), 'isolation.no-feed hurts {"supply":"S"}'],
    [
      'a feed from nowhere',
      supplies({ feeds: [{ from: 'GONE', through: ['Q1'] }] }),
      'isolation.no-feed hurts {"supply":"S"}',
    ],
    ['a circle without a source', { supplies: circle }, 'isolation.derived-loop hurts {"supply":"U"}'],
    [
      'one pole as the only means',
      { ...devices({ opens: 'one-conductor' }), ...supplies({ earthed: false }) },
      'isolation.one-pole hurts {"isolator":"Q1","supply":"S"}',
    ],
    [
      'a contactor as the only means',
      devices({ kind: 'contactor' }),
      'isolation.control-device-as-isolator hurts {"isolator":"Q1","supply":"S"}',
    ],
    [
      'an electronic breaker as the only means',
      devices({ suitableForIsolation: false }),
      'isolation.control-device-as-isolator hurts {"isolator":"Q1","supply":"S"}',
    ],
    ['air that nothing holds', sources(air()), 'isolation.other-energy hurts {"source":"AIR"}'],
    ['air that names no device', sources(air([])), 'isolation.other-energy hurts {"source":"AIR"}'],
    [
      'air held by a device nobody described',
      sources(air(['V9'])),
      'isolation.other-energy hurts {"source":"AIR"}',
    ],
    [
      'air of which one device only controls',
      {
        ...sources(air(['Q1', 'K1'])),
        isolators: [isolator('Q1'), isolator('F12'), isolator('K1', { kind: 'interlock' })],
      },
      'isolation.other-energy hurts {"source":"AIR"}',
    ],
    [
      'an isolator that cannot be locked',
      devices({ lock: 'cannot-lock' }),
      'isolation.single-point-cannot-lock tells {"isolator":"Q1"}',
    ],
    [
      'an isolator out of sight',
      devices({ inSight: false }),
      'isolation.not-in-sight tells {"isolator":"Q1"}',
    ],
    [
      'an isolator that must not break load',
      devices({ loadBreak: false }),
      'isolation.no-load-break tells {"isolator":"Q1"}',
    ],
    [
      'foreign voltage',
      points({ otherSupply: 'T' }),
      'isolation.foreign-voltage tells {"point":"A","supply":"T","terminal":"T:A"}',
    ],
    [
      'stored charge of unknown time',
      supplies({ bulk: bank }),
      'isolation.stored-unknown tells {"supply":"S"}',
    ],
    [
      'stored charge of unknown voltage',
      supplies({ bulk: { ...bank, bleedOhm: 1000 }, tolerance: undefined }),
      'isolation.stored-unknown tells {"supply":"S"}',
    ],
    [
      'a redundant feed',
      supplies({
        feeds: [
          { from: 'IN', through: ['Q1'] },
          { from: 'MC2', through: ['F12'] },
        ],
      }),
      'isolation.redundant-feed tells {"supply":"S"}',
    ],
    ['a battery', sources(source('UPS', { kind: 'battery' })), 'isolation.ups tells {"source":"UPS"}'],
  ] as [string, Partial<Panel>, string][])('%s', (_name, more, expected) => {
    expect(found(healthy(more))).toContain(expected);
  });

  it.each([
    [
      'one pole on an earthed supply to 0 V',
      {
        ...devices({ opens: 'one-conductor' }),
        sources: [source('IN', { V: 24, phases: 'dc' }), source('MC2')],
      },
      'isolation.one-pole',
    ],
    [
      'one pole with a full one beside it',
      {
        isolators: [isolator('Q1', { opens: 'one-conductor' }), isolator('F12'), isolator('F1')],
        ...supplies({ earthed: false, feeds: [{ from: 'IN', through: ['Q1', 'F1'] }] }),
      },
      'isolation.one-pole',
    ],
    [
      'a contactor behind a disconnect',
      {
        isolators: [isolator('Q1'), isolator('F12'), isolator('K1', { kind: 'contactor' })],
        ...supplies({ feeds: [{ from: 'IN', through: ['Q1', 'K1'] }] }),
      },
      'isolation.control-device-as-isolator',
    ],
    [
      'a contactor behind a supply that can be cut',
      {
        isolators: [isolator('Q1'), isolator('F12'), isolator('K1', { kind: 'contactor' })],
        supplies: [...healthy().supplies, dc24('U', [['S', 'K1']])],
      },
      'isolation.control-device-as-isolator',
    ],
    [
      'air behind its valve',
      {
        ...sources(air(['V1'])),
        isolators: [isolator('Q1'), isolator('F12'), isolator('V1', { kind: 'valve' })],
      },
      'isolation.other-energy',
    ],
    [
      'a circle that a source feeds',
      {
        supplies: [
          ...healthy().supplies,
          dc24('U', [
            ['W', 'Q1'],
            ['IN', 'Q1'],
          ]),
          dc24('W', [['U', 'Q1']]),
        ],
      },
      'isolation.derived-loop',
    ],
    [
      'stored charge with a bleeder',
      supplies({ bulk: { ...bank, bleedOhm: 1000 } }),
      'isolation.stored-unknown',
    ],
    [
      'stored charge with a stated time',
      supplies({ bulk: { ...bank, dischargeS: 20 } }),
      'isolation.stored-unknown',
    ],
    [
      'an isolator out of sight that is not in the plan',
      { isolators: [isolator('Q1'), isolator('F12'), isolator('F9', { inSight: false })] },
      'isolation.not-in-sight',
    ],
    ['the group’s own supply named again', points({ otherSupply: 'S' }), 'isolation.foreign-voltage'],
  ] as [string, Partial<Panel>, string][])('is not there: %s', (_name, more, rule) => {
    expect(found(healthy(more)).filter((one) => one.startsWith(`${rule} `))).toEqual([]);
  });

  it.each([
    ['stays live, IEC colours', 'IEC 60204-1', { otherSupply: 'T' }, 'isolation.foreign-voltage.stays.iec'],
    ['stays live, NFPA colours', 'NFPA 79', { otherSupply: 'T' }, 'isolation.foreign-voltage.stays.nfpa'],
  ] as [string, Panel['practice'], Partial<Point>, string][])(
    'foreign voltage that %s',
    (_name, practice, more, key) => {
      const [finding] = isolationFindings(healthy({ practice, ...points(more) }), ['A']);
      expect(finding?.says.key).toBe(key);
    },
  );
  it('foreign voltage that goes off with the disconnect has no colour of its own', () => {
    const made = healthy({
      ...points({ otherSupply: 'T' }),
      supplies: [dc24('S', [['IN', 'Q1']]), supply('T', [['IN', 'Q1']])],
    });
    expect(isolationFindings(made, ['A'])[0]?.says.key).toBe('isolation.foreign-voltage');
  });
});

describe('one tag in two panels of a site', () => {
  const here = healthy();
  const differs = (other: Isolator) =>
    isolationFindings(here, ['A'], { sitePanels: [{ ...healthy({ isolators: [other] }), tag: 'P2' }] }).map(
      ({ rule }) => rule,
    );
  it.each([
    ['the same device', isolator('F12'), []],
    ['another lock', isolator('F12', { lock: 'cannot-lock' }), ['isolation.same-tag-differs']],
    ['another place', isolator('F12', { location: 'Dosing room' }), ['isolation.same-tag-differs']],
    ['seen from elsewhere', isolator('F12', { inSight: false, alsoFeeds: ['Lights'] }), []],
    ['inside the other panel', isolator('F12', { inPanel: true, kind: 'fuse-carrier' }), []],
  ] as [string, Isolator, string[]][])('%s', (_name, other, expected) => {
    expect(differs(other)).toEqual(expected);
  });
  it('could not be asked without the other panels, and says so', () => {
    const alone = isolationReport(here, ['A']);
    expect(alone.couldNotRun.map(({ rule, where }) => [rule, where.isolator])).toEqual([
      ['isolation.same-tag-differs', 'Q1'],
      ['isolation.same-tag-differs', 'F12'],
    ]);
    const together = isolationReport(here, ['A'], { sitePanels: [] });
    expect([together.couldNotRun, together.checks]).toEqual([[], alone.checks]);
    // 1 for the plan; 2 supplies in three checks, 2 devices in two, 2 in the plan in three, 2 points, 2 sources, 2 tags.
    expect(alone.checks).toBe(1 + 3 * 2 + 2 * 2 + 3 * 2 + 2 + 2 + 2);
  });
});

describe('a finding that hurts', () => {
  it.each([
    ['no plan', devices({ suitableForIsolation: false })],
    ['air that nothing holds', sources(air())],
    ['a supply of another group without a feed', { supplies: [dc24('S', [['IN', 'Q1']]), supply('T', [])] }],
  ] as [string, Partial<Panel>][])('stops a job on one point: %s', (_name, more) => {
    const made = healthy(more);
    expect(blocksScope(made, isolationFindings(made, ['A']), ['A'], [], ['Q1']).length).toBeGreaterThan(0);
  });
});

describe('every sentence', () => {
  const everything = healthy({
    ...sources(air(), source('UPS', { kind: 'battery' })),
    ...points({ otherSupply: 'T' }),
    isolators: [
      isolator('Q1', { kind: 'contactor' }),
      isolator('F12', {
        inPanel: true,
        opens: 'one-conductor',
        lock: 'cannot-lock',
        inSight: false,
        loadBreak: false,
      }),
    ],
    supplies: [
      ...circle,
      dc24('X', []),
      supply(
        'Y',
        [
          ['MC2', 'F12'],
          ['MC2', 'F12'],
        ],
        { earthed: false, bulk: bank },
      ),
    ],
  });
  const planned = healthy(devices({ lock: 'cannot-lock', inSight: false, loadBreak: false }));
  it.each(['en', 'es'] as const)('can be read in %s, remedies and quantities too', (language) => {
    const findings = [...isolationFindings(everything, ['A']), ...isolationFindings(planned, ['A'])];
    expect(new Set(findings.map(({ rule }) => rule)).size).toBe(13);
    for (const { says, remedy, because } of findings) {
      expect(render(language, says)).not.toMatch(/[{}]|undefined/);
      if (remedy) expect(render(language, remedy.says)).not.toMatch(/[{}]|undefined/);
      for (const { name } of because) expect(messageOf(language, name)).toBeDefined();
    }
  });
});
