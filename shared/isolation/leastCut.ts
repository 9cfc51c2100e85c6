/** The cheapest set of isolators that leaves no target reachable: exact branch and bound. */
import type { EnergyGraph } from './energyGraph';
import type { Edge, NodeId } from './graphEdge';
import { byCodeUnits } from './inOrder';
import { passes } from './liveNodes';

export interface CutProblem {
  graph: EnergyGraph;
  targets: ReadonlySet<NodeId>;
  costs: ReadonlyMap<string, bigint>;
  /** Opened whatever it costs. */
  always: ReadonlySet<string>;
  /** Asked between steps; once it says false the best set so far is taken. */
  mayGoOn: () => boolean;
}

export interface Cut {
  open: Set<string>;
  /** False when the search stopped early. */
  proven: boolean;
}

/** For each live target the isolators on one way to it; `null` when none is live. The way with fewest is returned. */
function liveWay(problem: CutProblem, open: ReadonlySet<string>, kept: ReadonlySet<string>): string[] | null {
  const { graph, targets } = problem;
  // Energy of unknown origin at the target itself: nothing cuts it.
  if (graph.roots.some((root) => targets.has(root))) return [];
  const came = new Map<NodeId, Edge | null>(graph.roots.map((root) => [root, null]));
  let best: string[] | null = null;
  for (const id of came.keys())
    for (const edge of graph.from.get(id) ?? []) {
      if (came.has(edge.to) || !passes(edge, open)) continue;
      came.set(edge.to, edge);
      if (!targets.has(edge.to)) continue;
      const way = openable(problem, came, edge, kept);
      if (best === null || way.length < best.length) best = way;
      if (best.length === 0) return best;
    }
  return best;
}

function openable(
  problem: CutProblem,
  came: ReadonlyMap<NodeId, Edge | null>,
  last: Edge,
  kept: ReadonlySet<string>,
): string[] {
  const tags = new Set<string>();
  for (let edge: Edge | null | undefined = last; edge; edge = came.get(edge.from))
    for (const tag of edge.cuts) if (problem.costs.has(tag) && !kept.has(tag)) tags.add(tag);
  return [...tags].sort(
    (a, b) => Number((problem.costs.get(a) ?? 0n) - (problem.costs.get(b) ?? 0n)) || byCodeUnits(a, b),
  );
}

const costOf = (problem: CutProblem, open: Iterable<string>): bigint =>
  [...open].reduce((sum, tag) => sum + (problem.always.has(tag) ? 0n : (problem.costs.get(tag) ?? 0n)), 0n);

/** Ways that share no isolator must each be cut: the sum of their cheapest is a bound. `null`: one cannot be cut. */
function bound(problem: CutProblem, open: ReadonlySet<string>, kept: ReadonlySet<string>): bigint | null {
  const opened = new Set(open);
  let least = 0n;
  for (let way = liveWay(problem, opened, kept); way !== null; way = liveWay(problem, opened, kept)) {
    const cheapest = way[0];
    if (cheapest === undefined) return null;
    least += problem.costs.get(cheapest) ?? 0n;
    for (const tag of way) opened.add(tag);
  }
  return least;
}

/** Closes again whatever is not needed, the dearest first. */
function thinned(problem: CutProblem, open: ReadonlySet<string>): Set<string> {
  const left = new Set(open);
  const none = new Set<string>();
  const cost = (tag: string) => problem.costs.get(tag) ?? 0n;
  for (const tag of [...open].sort((a, b) => (cost(b) > cost(a) ? 1 : -1))) {
    if (problem.always.has(tag)) continue;
    left.delete(tag);
    if (liveWay(problem, left, none) !== null) left.add(tag);
  }
  return left;
}

/** The cheapest cut, or null when even opening everything leaves a target live. */
export function leastCut(problem: CutProblem): Cut | null {
  const everything = new Set([...problem.always, ...problem.costs.keys()]);
  if (liveWay(problem, everything, new Set()) !== null) return null;
  const first = thinned(problem, everything);
  const best = { open: first, cost: costOf(problem, first), proven: true };

  const search = (open: ReadonlySet<string>, kept: ReadonlySet<string>, cost: bigint): void => {
    if (!best.proven || !problem.mayGoOn()) {
      best.proven = false;
      return;
    }
    const way = liveWay(problem, open, kept);
    if (way === null) {
      if (cost < best.cost) [best.open, best.cost] = [new Set(open), cost];
      return;
    }
    const least = bound(problem, open, kept);
    if (least === null || cost + least >= best.cost) return;
    const refused = new Set(kept);
    for (const tag of way) {
      search(new Set([...open, tag]), refused, cost + (problem.costs.get(tag) ?? 0n));
      refused.add(tag);
    }
  };
  search(problem.always, new Set(), 0n);
  return { open: best.proven ? best.open : thinned(problem, best.open), proven: best.proven };
}
