/** Which isolators to lock for work on a scope: the set of least weight that leaves no worked terminal reachable. */
import type { Isolator, Panel, Source } from '../panel/panelSchema';
import { asFound } from './asFound';
import { energyGraph, withoutTerminals } from './energyGraph';
import type { EnergyGraph } from './energyGraph';
import { node } from './graphEdge';
import type { NodeId } from './graphEdge';
import { isolatorCosts } from './isolatorCosts';
import { isolatorsByTag } from './isolatorsByTag';
import { leastCut } from './leastCut';
import { lockWeight } from './lockWeight';
import { openingOrder } from './openingOrder';
import { otherEnergyIsolators, otherEnergySources } from './otherEnergy';
import { reachIn } from './reach';
import { liveIncoming } from './stillLive';
import type { LockPlan, PlannedIsolator, Reach } from './types';
import { workedTerminals } from './workedTerminals';
import type { Worked } from './workedTerminals';

export interface LockPlanOptions {
  /** The newest sealed job's revision, else the previous issued one. */
  asBuilt?: Panel;
  /** For a caller with a clock: asked during the search past 24 isolators; false stops it. */
  mayGoOn?: () => boolean;
}

// Up to here the search is always finished; past it a caller may stop it (isolation.md §2).
const alwaysFinished = 24;

/** Whatever makes a worked terminal live without an isolator between, and what must be dead itself. */
function targetsOf(graph: EnergyGraph, worked: Worked): Set<NodeId> {
  const terminals = new Set(worked.terminals.map(node.terminal));
  return new Set([
    ...graph.edges.filter((edge) => terminals.has(edge.to)).map((edge) => edge.from),
    ...worked.supplies.map(node.supply),
    ...worked.groups.flatMap((tag) => [node.group(tag), node.backfeed(tag)]),
    ...worked.incoming.map(node.incoming),
  ]);
}

/** The places of the worked set that energy reaches: empty is what a plan must leave. */
export function stillWorked(live: Reach, worked: Worked): string[] {
  return [
    ...worked.terminals.filter((tag) => live.terminals.has(tag)),
    ...worked.supplies.filter((tag) => live.supplies.has(tag)),
    ...worked.groups.filter((tag) => live.groups.has(tag)),
    ...worked.incoming.filter((tag) => live.places.has(node.incoming(tag))),
  ];
}

function planned(described: Isolator[]): PlannedIsolator[] {
  const shown = described[0];
  if (!shown) return [];
  return [
    {
      isolator: shown,
      tell: [...new Set(described.flatMap((one) => one.alsoFeeds ?? []))],
      afterDoor: described.some((one) => one.operatedFrom === 'door-open'),
      currentMustBeZero: described.some((one) => !one.loadBreak),
      extraMeasure: described.some((one) => one.lock === 'cannot-lock'),
    },
  ];
}

function guardedOf(panel: Panel, worked: Worked, live: Reach): LockPlan['guarded'] {
  return worked.mayStayOn.flatMap((tag) => {
    const guard = panel.supplies.find((supply) => supply.tag === tag)?.mayStayLive;
    return guard && live.supplies.has(tag) ? [{ supply: tag, ...guard }] : [];
  });
}

const bySourceTag = (sources: Source[]): Source[] =>
  [...new Map([...sources].reverse().map((source) => [source.tag, source])).values()].sort((a, b) =>
    a.tag < b.tag ? -1 : 1,
  );

/**
 * The lock plan for work on these points, in opening order, or null when no set of isolators makes them safe.
 * Exact; past 24 isolators `mayGoOn` may stop it, and `proven` says so. Checked by `reach` before it is answered.
 * @throws Error when the scope names an unknown address, or when the plan fails its own check.
 */
export function lockPlan(
  panel: Panel,
  scope: readonly string[],
  options: LockPlanOptions = {},
): LockPlan | null {
  const found = asFound(panel, options.asBuilt);
  const worked = workedTerminals(found, scope);
  const graph = energyGraph(found);
  const cut = cutOf(found, graph, worked, options.mayGoOn);
  if (cut === null) return null;
  const live = reachIn(found, graph, cut.open);
  const left = stillWorked(live, worked);
  if (left.length > 0)
    throw new Error(`the lock plan of ${panel.tag} failed its check: ${left[0]} is still live`);

  const described = isolatorsByTag(found);
  const chosen = [...cut.open].flatMap((tag) => described.get(tag)?.[0] ?? []);
  const ordered = openingOrder(found, chosen, otherEnergyIsolators(found));
  return {
    isolators: ordered.flatMap((one) => planned(described.get(one.tag) ?? [])),
    weight: ordered.reduce((sum, one) => sum + lockWeight(one), 0),
    guarded: guardedOf(found, worked, live),
    cover: liveIncoming(live.places),
    otherEnergy: bySourceTag(otherEnergySources(found)),
    proven: cut.proven,
  };
}

function cutOf(panel: Panel, graph: EnergyGraph, worked: Worked, mayGoOn: (() => boolean) | undefined) {
  // Terminals are dead when what feeds them is: without them the search walks a far smaller graph.
  const inner = withoutTerminals(graph);
  const described = isolatorsByTag(panel);
  const cutting = new Set(inner.edges.flatMap((edge) => edge.cuts));
  const weights = new Map(
    [...cutting].flatMap((tag) => {
      const one = described.get(tag)?.[0];
      return one ? [[tag, lockWeight(one)] as const] : [];
    }),
  );
  return leastCut({
    graph: inner,
    targets: targetsOf(graph, worked),
    costs: isolatorCosts(weights),
    always: otherEnergyIsolators(panel),
    mayGoOn: weights.size > alwaysFinished && mayGoOn ? mayGoOn : () => true,
  });
}
