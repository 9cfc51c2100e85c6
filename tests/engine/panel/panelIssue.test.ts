/** What an issued revision may not contain although a draft may. */
import { describe, expect, it } from 'vitest';
import { panelProblems } from '../../../shared/panel/panelIssue';
import type { Panel } from '../../../shared/panel/panelSchema';
import { healthyPanel } from '../../../server/commands/demo/panels/healthy';
import { mixedPanel } from '../../../server/commands/demo/panels/mixed';
import { smallPanel } from '../../support/smallPanel';

const at = <T>(items: T[], index: number): T => {
  const item = items[index];
  if (item === undefined) throw new Error(`nothing at ${index}`);
  return item;
};
/** The small panel with one thing done to it. */
function after(change: (panel: Panel) => void): string[] {
  const panel = smallPanel();
  change(panel);
  return panelProblems(panel).map(({ path, says }) => `${path}: ${says}`);
}

describe('nothing stands in the way of', () => {
  it.each([
    ['the small panel', smallPanel()],
    ['the healthy panel', healthyPanel],
    ['the mixed panel', mixedPanel],
  ])('%s', (_name, panel) => {
    expect(panelProblems(panel)).toEqual([]);
  });
});

describe('a reference that does not resolve', () => {
  it.each([
    ['disconnect', (p) => (p.disconnect = 'Q99'), 'disconnect: no isolator "Q99" in this panel'],
    [
      'isolator of a source',
      (p) => (at(p.sources, 2).isolators = ['V1', 'V9']),
      'sources.2.isolators.1: no isolator "V9" in this panel',
    ],
    [
      'what feeds a supply',
      (p) => (at(at(p.supplies, 0).feeds, 0).from = 'X9'),
      'supplies.0.feeds.0.from: no source or supply "X9" in this panel',
    ],
    [
      'isolator of a feed',
      (p) => (at(at(p.supplies, 0).feeds, 0).through = ['Q1', 'Q9']),
      'supplies.0.feeds.0.through.1: no isolator "Q9" in this panel',
    ],
    [
      'module of a group',
      (p) => (at(p.groups, 1).module = 'DO9'),
      'groups.1.module: no module "DO9" in this panel',
    ],
    [
      'supply of a group',
      (p) => (at(p.groups, 1).supply = 'S9'),
      'groups.1.supply: no supply "S9" in this panel',
    ],
    [
      'a bridged group',
      (p) => (at(p.groups, 0).linkedTo = ['G4', 'G9']),
      'groups.0.linkedTo.1: no group "G9" in this panel',
    ],
    [
      'group of a point',
      (p) => (at(p.points, 3).group = 'G9'),
      'points.3.group: no group "G9" in this panel',
    ],
    [
      'foreign supply of a point',
      (p) => (at(p.points, 0).otherSupply = 'S9'),
      'points.0.otherSupply: no supply "S9" in this panel',
    ],
    [
      'load of a solid-state relay',
      (p) =>
        (at(p.points, 0).device = {
          kind: 'ssr-control',
          Vmin: 3,
          Vmax: 32,
          mA: 10,
          polarised: true,
          rating: { V: 240, current: 'ac', A: 10, polarised: false },
          load: { supply: 'S9', V: 120, current: 'ac', A: 1, load: 'motor' },
        }),
      'points.0.device.load.supply: no supply "S9" in this panel',
    ],
  ] as [string, (panel: Panel) => void, string][])('%s', (_name, change, expected) => {
    expect(after(change)).toEqual([expected]);
  });
});

describe('a fact that nobody stated', () => {
  it.each([
    ['the supply of a common', (p) => delete at(p.groups, 0).supply, 'groups.0.supply: is missing'],
    [
      'foreign voltage',
      (p) => delete at(p.points, 1).otherSupply,
      'points.1.otherSupply: is missing: name the other supply, or "none"',
    ],
  ] as [string, (panel: Panel) => void, string][])('%s', (_name, change, expected) => {
    expect(after(change)).toEqual([expected]);
  });
});

describe('a tag that stands twice', () => {
  const lists = ['sources', 'isolators', 'supplies', 'modules', 'groups', 'stopControls'] as const;
  const twice: Record<(typeof lists)[number], (panel: Panel) => unknown> = {
    sources: (p) => p.sources.push(at(p.sources, 0)),
    isolators: (p) => p.isolators.push(at(p.isolators, 0)),
    supplies: (p) => p.supplies.push(at(p.supplies, 0)),
    modules: (p) => p.modules.push(at(p.modules, 0)),
    groups: (p) => p.groups.push(at(p.groups, 0)),
    stopControls: (p) => p.stopControls.push(at(p.stopControls, 0)),
  };
  it.each(lists)('in %s', (list) => {
    const panel = smallPanel();
    const { length } = panel[list];
    twice[list](panel);
    const tag = panel[list][0]?.tag ?? '';
    expect(panelProblems(panel)).toEqual([
      { path: `${list}.${length}.tag`, says: `"${tag}" already stands at ${list}.0` },
    ]);
  });
  it('as an address', () => {
    expect(after((p) => (at(p.points, 4).address = 'DI3.02'))).toEqual([
      'points.4.address: "DI3.02" already stands at points.1',
    ]);
  });
  it('as a source and a supply at once', () => {
    expect(after((p) => (at(p.sources, 0).tag = 'S230'))).toContain(
      'supplies: "S230" names both a source and a supply',
    );
  });
  it('in two kinds is no problem', () => {
    expect(after((p) => (at(p.stopControls, 0).tag = 'Q1'))).toEqual([]);
  });
});
