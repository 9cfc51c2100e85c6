/** What must be measured before anyone touches a worked terminal, and between which two terminals. */
import type { Group, Panel, Point, Supply } from '../panel/panelSchema';
import { foreignSupplies } from './foreignSupplies';
import { inReadingOrder } from './inOrder';
import { commonPole, conductorPole, probesAt, supplyProbes } from './poles';
import type { Probe } from './poles';
import { pointTerminals } from './pointTerminals';
import type { DeadTest, LockPlan } from './types';

// Above this a reading is not dead (common practice, no source); a site may lower it.
const usualLimitV = 1;

interface Site {
  panel: Panel;
  limitV: number;
  /** Supplies that the plan leaves dead, by tag. */
  supplies: Map<string, Supply[]>;
}

function testOf(site: Site, at: DeadTest['at'], supply: Supply, probe: Probe, worked: boolean): DeadTest {
  const place = 'point' in at ? at.point : 'group' in at ? at.group : at.supply;
  const toEarth = probe.second === site.panel.earthTerminal;
  return {
    id: `dead.${place}.${probe.pair.replace('/', '-').replace(' ', '')}`,
    at,
    ...probe,
    supply: supply.tag,
    limitV: site.limitV,
    // On an unearthed supply a live pole may read nothing to earth.
    proves: !toEarth || supply.earthed,
    ...(worked ? { worked } : {}),
  };
}

const atSupply = (site: Site, supply: Supply): DeadTest[] =>
  supplyProbes(supply, site.panel.earthTerminal).map((probe) =>
    testOf(site, { supply: supply.tag }, supply, probe, false),
  );

const atGroup = (site: Site, group: Group): DeadTest[] =>
  (site.supplies.get(group.supply ?? '') ?? []).flatMap((supply) =>
    probesAt(group.terminal, commonPole(group, supply), supply, site.panel.earthTerminal).map((probe) =>
      testOf(site, { group: group.tag }, supply, probe, false),
    ),
  );

/** Foreign voltage may be either pole; only an earthed supply has a return that gives the other away. */
function atForeign(site: Site, point: Point, worked: boolean): DeadTest[] {
  const tags = foreignSupplies(point).filter((tag) => tag !== null);
  return tags
    .flatMap((tag) => site.supplies.get(tag) ?? [])
    .flatMap((supply) => {
      const pole = supply.earthed ? conductorPole('signal', supply) : null;
      return probesAt(point.terminal, pole, supply, site.panel.earthTerminal).map((probe) =>
        testOf(site, { point: point.address }, supply, probe, worked),
      );
    });
}

function atPoint(site: Site, point: Point, groups: Group[]): DeadTest[] {
  const supplies = groups.flatMap((group) => site.supplies.get(group.supply ?? '') ?? []);
  return supplies.flatMap((supply) =>
    pointTerminals(site.panel, point).flatMap((terminal) => {
      const conductor = (point.conductors ?? []).find((one) => one.terminal === terminal);
      const own = terminal === point.terminal;
      const pole = conductorPole(own ? 'signal' : (conductor?.role ?? 'signal'), supply);
      return probesAt(terminal, pole, supply, site.panel.earthTerminal).map((probe) => {
        const test = testOf(site, { point: point.address }, supply, probe, true);
        return own ? test : { ...test, id: test.id.replace(/\.[^.]*$/, (pair) => `.${terminal}${pair}`) };
      });
    }),
  );
}

/** The same two terminals are read once. It proves something only when it does so for every supply it was asked for. */
function eachOnce(tests: DeadTest[]): DeadTest[] {
  const kept = new Map<string, DeadTest>();
  for (const test of tests) {
    const key = `${test.terminal}\u0000${test.second}`;
    const known = kept.get(key);
    kept.set(key, known ? { ...known, proves: known.proves && test.proves } : test);
  }
  return [...kept.values()];
}

/** Tags are unique only in their kind: a later test under an id already taken names its terminals too. */
function withOwnIds(tests: DeadTest[]): DeadTest[] {
  const taken = new Set<string>();
  return tests.map((test) => {
    const id = taken.has(test.id) ? `${test.id}.${test.terminal}-${test.second}` : test.id;
    taken.add(id);
    return id === test.id ? test : { ...test, id };
  });
}

const byTag = <T extends { tag: string }>(items: T[]): T[] => inReadingOrder(items, ({ tag }) => tag);

/**
 * Every pair to be read dead: supplies at their own terminals, the commons they feed, points with foreign voltage and
 * each terminal of the scope's points. Supplies that the plan leaves on with a guard are left out.
 * @param deadLimitV volts; above it a reading is not dead.
 */
export function deadTests(
  panel: Panel,
  scope: readonly string[],
  plan: LockPlan,
  deadLimitV: number = usualLimitV,
): DeadTest[] {
  const guarded = new Set(plan.guarded.map((one) => one.supply));
  const dead = byTag(panel.supplies).filter((supply) => !guarded.has(supply.tag));
  const supplies = new Map<string, Supply[]>();
  for (const supply of dead) supplies.set(supply.tag, [...(supplies.get(supply.tag) ?? []), supply]);
  const groups = new Map<string, Group[]>();
  for (const group of panel.groups) groups.set(group.tag, [...(groups.get(group.tag) ?? []), group]);
  const site: Site = { panel, limitV: deadLimitV, supplies };
  const wanted = new Set(scope);
  const points = inReadingOrder(panel.points, (point) => point.address);
  return withOwnIds(
    eachOnce([
      ...dead.flatMap((supply) => atSupply(site, supply)),
      ...byTag(panel.groups).flatMap((group) => atGroup(site, group)),
      ...points.flatMap((point) => atForeign(site, point, wanted.has(point.address))),
      ...points
        .filter((point) => wanted.has(point.address))
        .flatMap((point) => atPoint(site, point, groups.get(point.group) ?? [])),
    ]),
  );
}
