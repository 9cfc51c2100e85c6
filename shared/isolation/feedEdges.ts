/** Edges from sources through isolators to supplies, and to the incoming sides of isolators in the enclosure. */
import type { Panel, Supply } from '../panel/panelSchema';
import { electricalKind } from './countsAsIsolation';
import { cutsCircuit } from './cutsCircuit';
import { edge, node, nowhere } from './graphEdge';
import type { Edge, NodeId } from './graphEdge';
import { isolatorsByTag } from './isolatorsByTag';
import { sourcelessCircles } from './sourcelessCircles';

function originOf(panel: Panel, tag: string): NodeId | null {
  // A tag that names both counts as the source: the one that nothing upstream can kill.
  if (panel.sources.some((source) => source.tag === tag)) return node.source(tag);
  if (panel.supplies.some((supply) => supply.tag === tag)) return node.supply(tag);
  return null;
}

type Feed = Supply['feeds'][number];
type Described = ReturnType<typeof isolatorsByTag>;

function edgesOfFeed(panel: Panel, isolators: Described, supply: Supply, feed: Feed): Edge[] {
  const to = node.supply(supply.tag);
  const origin = originOf(panel, feed.from);
  // A feed from nowhere is live whatever stands in it: the drawing cannot be trusted on that wire.
  if (origin === null) return [edge(nowhere, to)];
  const cuts = feed.through.filter((tag) => cutsCircuit(panel, isolators.get(tag), feed.from, supply));
  const incoming = feed.through.flatMap((tag, place) => {
    if (!isolators.get(tag)?.some((one) => one.inPanel)) return [];
    const via = feed.through.slice(0, place);
    return [edge(origin, node.incoming(tag), { via, cuts: via.filter((one) => cuts.includes(one)) })];
  });
  return [edge(origin, to, { via: feed.through, cuts }), ...incoming];
}

/** An isolator inside the enclosure that no feed passes: nobody said what comes to it. */
function unconnectedIncoming(panel: Panel): Edge[] {
  const passed = new Set(panel.supplies.flatMap((supply) => supply.feeds.flatMap((feed) => feed.through)));
  return panel.isolators
    .filter((one) => one.inPanel && electricalKind(one) && !passed.has(one.tag))
    .map((one) => edge(nowhere, node.incoming(one.tag), { maybe: true }));
}

/** A supply without a feed, one fed from nowhere and a circle without a source are always live. */
export function feedEdges(panel: Panel): Edge[] {
  const isolators = isolatorsByTag(panel);
  const feeds = panel.supplies.flatMap((supply) =>
    supply.feeds.length === 0
      ? [edge(nowhere, node.supply(supply.tag))]
      : supply.feeds.flatMap((feed) => edgesOfFeed(panel, isolators, supply, feed)),
  );
  const circles = sourcelessCircles(panel).flatMap((circle) =>
    circle.map((tag) => edge(nowhere, node.supply(tag))),
  );
  return [...feeds, ...circles, ...unconnectedIncoming(panel)];
}
