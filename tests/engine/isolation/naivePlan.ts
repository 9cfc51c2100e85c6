/**
 * The lock plan by trying every set of isolators, with a reachability of its own that follows the page's sentences
 * one by one and shares no code with the engine: it asks upwards from each supply instead of downwards from sources.
 */
import type { Isolator, Panel, Supply } from '../../../shared/panel/panelSchema';

type Open = ReadonlySet<string>;

/** "Counts as open only for a supply that is earthed and taken to neutral or 0 V, judged by the supply at the isolator." */
function isOpen(panel: Panel, isolator: Isolator | undefined, from: string, fed: Supply): boolean {
  if (!isolator || !isolator.suitableForIsolation) return false;
  if (['contactor', 'interlock', 'valve', 'blocking-device'].includes(isolator.kind)) return false;
  if (isolator.opens !== 'one-conductor') return true;
  const origin = panel.sources.find((one) => one.tag === from);
  const here = origin ? fed : panel.supplies.find((one) => one.tag === from);
  if (!here || !here.earthed) return false;
  if (origin) {
    if (origin.V === undefined || origin.phases === undefined) return false;
    if ((origin.phases === 'dc') !== (here.kind === 'dc') || here.kind === 'ac3') return false;
    const V = origin.phases === 3 ? origin.V / 1.7320508 : origin.V;
    if (Math.abs(V - here.V) > 0.1 * Math.max(V, here.V)) return false;
  }
  const kinds = Object.keys(here.terminals);
  return kinds.join() === 'L,N' || kinds.join() === 'plus,minus';
}

const supplyOf = (panel: Panel, tag: string): Supply | undefined =>
  panel.supplies.find((one) => one.tag === tag);

/** Supplies joined to this one because commons of theirs are bridged; 'unknown' for a common without a supply. */
function bridged(panel: Panel, tag: string): (string | undefined)[] {
  return panel.groups.flatMap((one) =>
    (one.linkedTo ?? []).flatMap((linked) => {
      const other = panel.groups.find((group) => group.tag === linked);
      if (one.supply === tag) return [other?.supply];
      return other?.supply === tag ? [one.supply] : [];
    }),
  );
}

function hasOrigin(panel: Panel, tag: string, asked: string[] = []): boolean {
  if (asked.includes(tag)) return false;
  if (panel.sources.some((one) => one.tag === tag)) return true;
  const supply = supplyOf(panel, tag);
  if (!supply || supply.feeds.length === 0) return true;
  return supply.feeds.some((feed) => hasOrigin(panel, feed.from, [...asked, tag]));
}

function feedsItself(panel: Panel, tag: string): boolean {
  const above = new Set<string>();
  const climb = (from: string): void =>
    supplyOf(panel, from)?.feeds.forEach((feed) => {
      if (above.has(feed.from)) return;
      above.add(feed.from);
      climb(feed.from);
    });
  climb(tag);
  return above.has(tag);
}

export interface Naive {
  alive: (supply: string, open: Open) => boolean;
  safe: (open: Open) => boolean;
}

/** Answers for one panel and scope: is a supply live, is a set of open isolators safe. */
export function naive(panel: Panel, scope: readonly string[]): Naive {
  const circles = new Set(
    panel.supplies.map((one) => one.tag).filter((tag) => feedsItself(panel, tag) && !hasOrigin(panel, tag)),
  );
  const isolators = new Map(panel.isolators.map((one) => [one.tag, one]));
  const known = new Set([...panel.sources, ...panel.supplies].map((one) => one.tag));
  const cutters = new Map(
    panel.supplies.flatMap((fed) =>
      fed.feeds.map((feed) => [
        feed,
        feed.through.filter((tag) => isOpen(panel, isolators.get(tag), feed.from, fed)),
      ]),
    ),
  );
  const joins = new Map(panel.supplies.map((one) => [one.tag, bridged(panel, one.tag)]));

  const alive = (tag: string, open: Open, asked: string[] = []): boolean => {
    if (asked.includes(tag)) return false;
    const fed = supplyOf(panel, tag);
    if (!fed || fed.feeds.length === 0 || circles.has(tag)) return true;
    const further = [...asked, tag];
    const byFeed = fed.feeds.some((feed) => {
      // "A feed from nowhere is always live": whatever is drawn between nowhere and here.
      if (!known.has(feed.from)) return true;
      if ((cutters.get(feed) ?? []).some((one) => open.has(one))) return false;
      return panel.sources.some((one) => one.tag === feed.from) || alive(feed.from, open, further);
    });
    return (
      byFeed || (joins.get(tag) ?? []).some((other) => other === undefined || alive(other, open, further))
    );
  };

  const targets = mustBeDead(panel, scope);
  return { alive, safe: (open) => targets !== null && targets.every((tag) => !alive(tag, open)) };
}

const statedForeign = (panel: Panel, groups: Set<string>): (string | undefined)[] =>
  panel.points
    .filter((one) => groups.has(one.group) && one.otherSupply !== 'none')
    .map((one) => one.otherSupply);

/** Groups joined to these by bridges, in any number of hops. */
function joined(panel: Panel, groups: Set<string>): Set<string> {
  const all = new Set(groups);
  for (let size = -1; size !== all.size;) {
    size = all.size;
    for (const one of panel.groups)
      for (const linked of one.linkedTo ?? [])
        if (all.has(one.tag) || all.has(linked)) all.add(one.tag).add(linked);
  }
  return all;
}

/** The supplies that must be dead; null when something nobody stated enters the panel. */
function mustBeDead(panel: Panel, scope: readonly string[]): string[] | null {
  if (panel.points.some((one) => one.otherSupply === undefined)) return null;
  if (panel.groups.some((one) => one.supply === undefined)) return null;
  const mine = new Set(panel.points.filter((one) => scope.includes(one.address)).map((one) => one.group));
  const modules = new Set(panel.groups.filter((one) => mine.has(one.tag)).map((one) => one.module));
  const fed = new Set(panel.groups.filter((one) => mine.has(one.tag)).map((one) => one.supply));
  const near = new Set(
    panel.groups.filter((one) => modules.has(one.module) || fed.has(one.supply)).map((one) => one.tag),
  );
  const refused = new Set([
    ...panel.groups.filter((one) => near.has(one.tag)).map((one) => one.supply),
    ...statedForeign(panel, near),
  ]);
  const kept = panel.supplies.filter(
    (one) =>
      one.mayStayLive &&
      one.extraLow !== 'none' &&
      one.V * (1 + (one.tolerance?.maxPct ?? 100) / 100) <= (one.kind === 'dc' ? 120 : 50) &&
      !refused.has(one.tag),
  );
  const touching = statedForeign(panel, joined(panel, mine)).filter((tag) => tag !== undefined);
  const dead = panel.supplies.filter((one) => !kept.includes(one)).map((one) => one.tag);
  return [...new Set([...dead, ...touching])];
}

export const naiveWeight = (isolator: Isolator): number =>
  ({ hasp: 10, 'device-needed': 12, 'cannot-lock': 1000 })[isolator.lock] +
  3 * (isolator.alsoFeeds ?? []).length +
  (isolator.inSight ? 0 : 2);

/** Least weight, then fewest, then the sorted list that is least; null when no set is safe. */
export function naivePlan(panel: Panel, scope: readonly string[]): { tags: string[]; weight: number } | null {
  const { safe } = naive(panel, scope);
  const all = [...panel.isolators].sort((a, b) => (a.tag < b.tag ? -1 : 1));
  let best: { tags: string[]; weight: number } | null = null;
  for (let set = 0; set < 1 << all.length; set += 1) {
    const chosen = all.filter((_, bit) => (set >> bit) & 1);
    const candidate = {
      tags: chosen.map((one) => one.tag),
      weight: chosen.reduce((sum, one) => sum + naiveWeight(one), 0),
    };
    if ((best === null || better(candidate, best)) && safe(new Set(candidate.tags))) best = candidate;
  }
  return best;
}

function better(a: { tags: string[]; weight: number }, b: { tags: string[]; weight: number }): boolean {
  if (a.weight !== b.weight) return a.weight < b.weight;
  if (a.tags.length !== b.tags.length) return a.tags.length < b.tags.length;
  const place = a.tags.findIndex((tag, index) => tag !== b.tags[index]);
  return place >= 0 && (a.tags[place] ?? '') < (b.tags[place] ?? '');
}
