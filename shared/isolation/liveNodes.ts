/** Which nodes energy reaches with some isolators open, each with the one path to show as the reason. */
import type { EnergyGraph } from './energyGraph';
import { nowhere, tagOf } from './graphEdge';
import type { Edge, NodeId } from './graphEdge';

export interface LiveNode {
  maybe: boolean;
  path: string[];
  /** Edges from the origin to here, in order. */
  edges: Edge[];
}

/** Energy passes an edge unless one of the isolators that cut it is open. */
export const passes = (edge: Edge, open: ReadonlySet<string>): boolean =>
  !edge.cuts.some((tag) => open.has(tag));

const pathKey = (live: LiveNode): string => live.path.join('\u0000');

/** The back-feed of a group is no place of its own: its terminals are. */
const shownTag = (to: NodeId): string[] => (to.startsWith('backfeed:') ? [] : [tagOf(to)]);

function step(live: LiveNode, edge: Edge): LiveNode {
  return {
    maybe: live.maybe || edge.maybe,
    path: [...live.path, ...edge.via, ...shownTag(edge.to)],
    edges: [...live.edges, edge],
  };
}

/** One hop on from the nodes just reached; of several ways to a node the path least by code units is kept. */
function hop(
  graph: EnergyGraph,
  open: ReadonlySet<string>,
  reached: Map<NodeId, LiveNode>,
  last: NodeId[],
  wanted: (edge: Edge) => boolean,
): NodeId[] {
  const found = new Map<NodeId, LiveNode>();
  for (const id of last)
    for (const edge of graph.from.get(id) ?? []) {
      const here = reached.get(id);
      if (!here || reached.has(edge.to) || !wanted(edge) || !passes(edge, open)) continue;
      const candidate = step(here, edge);
      const known = found.get(edge.to);
      if (!known || pathKey(candidate) < pathKey(known)) found.set(edge.to, candidate);
    }
  for (const [id, live] of found) reached.set(id, live);
  return [...found.keys()];
}

function spread(
  graph: EnergyGraph,
  open: ReadonlySet<string>,
  reached: Map<NodeId, LiveNode>,
  wanted: (edge: Edge) => boolean,
): void {
  let last = [...reached.keys()];
  while (last.length > 0) last = hop(graph, open, reached, last, wanted);
}

/**
 * Everything live with `open` open. What is known live is found first, then what may be: a known path always
 * wins over a possible one, and the shorter over the longer, so the order of the file changes nothing.
 */
export function liveNodes(graph: EnergyGraph, open: ReadonlySet<string>): Map<NodeId, LiveNode> {
  const reached = new Map<NodeId, LiveNode>();
  for (const root of graph.roots)
    reached.set(root, { maybe: false, path: [root === nowhere ? '?' : tagOf(root)], edges: [] });
  spread(graph, open, reached, (edge) => !edge.maybe);
  spread(graph, open, reached, () => true);
  for (const root of graph.roots) reached.delete(root);
  return reached;
}
