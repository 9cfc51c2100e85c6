/** What is live in a panel with some isolators open, and by which path. */
import type { Panel } from '../panel/panelSchema';
import { energyGraph } from './energyGraph';
import type { EnergyGraph } from './energyGraph';
import { nowhere, tagOf } from './graphEdge';
import type { NodeId } from './graphEdge';
import { highestVolts } from './highestVolts';
import { liveNodes } from './liveNodes';
import type { LiveNode } from './liveNodes';
import type { Live, Reach } from './types';

const isFeed = (from: NodeId): boolean => from.startsWith('source:') || from.startsWith('supply:');

/** The last supply on the path that a feed made live: a supply reached back through a bridge carries the other's volts. */
function carriedSupply(live: LiveNode): string | undefined {
  const fed = live.edges.filter((edge) => edge.to.startsWith('supply:') && isFeed(edge.from)).at(-1);
  return fed && tagOf(fed.to);
}

interface Volts {
  supplies: Map<string, number>;
  sources: Map<string, number | undefined>;
  highest: number;
}

function voltsOf(panel: Panel): Volts {
  const supplies = new Map<string, number>();
  for (const supply of panel.supplies)
    supplies.set(supply.tag, Math.max(supply.V, supplies.get(supply.tag) ?? 0));
  const sources = new Map(panel.sources.map((source) => [source.tag, source.V]));
  return { supplies, sources, highest: highestVolts(panel) };
}

function liveOf(node: LiveNode, volts: Volts): Live {
  const supply = carriedSupply(node);
  const origin = node.edges[0]?.from ?? nowhere;
  // An incoming side straight on a source has the source's volts; unstated, it may have the highest there is.
  const V =
    supply === undefined
      ? (volts.sources.get(tagOf(origin)) ?? volts.highest)
      : (volts.supplies.get(supply) ?? volts.highest);
  const live: Live = { V, maybe: node.maybe, path: node.path };
  return supply === undefined ? live : { ...live, supply };
}

/** Puts a live node under its tag; what is known live wins over what may be. */
function keep(into: Map<string, Live>, key: string, live: Live): void {
  const known = into.get(key);
  if (!known || (known.maybe && !live.maybe)) into.set(key, live);
}

/** `reach` over a graph that was built before, for callers that ask many times. */
export function reachIn(panel: Panel, graph: EnergyGraph, open: ReadonlySet<string>): Reach {
  const answer: Reach = { supplies: new Map(), groups: new Map(), terminals: new Map(), places: new Map() };
  const volts = voltsOf(panel);
  for (const [id, node] of liveNodes(graph, open)) {
    const live = liveOf(node, volts);
    const kind = id.slice(0, id.indexOf(':'));
    if (kind === 'supply') keep(answer.supplies, tagOf(id), live);
    else if (kind === 'group' || kind === 'backfeed') keep(answer.groups, tagOf(id), live);
    else if (kind === 'terminal') keep(answer.terminals, tagOf(id), live);
    else if (kind === 'incoming') keep(answer.places, id, live);
  }
  return answer;
}

/**
 * What is live, or may be, with the isolators in `open` open: supplies, groups, terminals and the incoming sides of
 * isolators inside the enclosure, each with one path as the reason. A missing datum never makes anything dead.
 */
export const reach = (panel: Panel, open: ReadonlySet<string>): Reach =>
  reachIn(panel, energyGraph(panel), open);
