/** The panel as a directed graph of energy: where it comes from, what can cut it, what it makes live. */
import type { Panel } from '../panel/panelSchema';
import { feedEdges } from './feedEdges';
import { edge, node, nowhere } from './graphEdge';
import type { Edge, NodeId } from './graphEdge';
import { groupEdges } from './groupEdges';
import { pointEdges } from './pointEdges';
import { supplyTerminals } from './supplyTerminals';

export interface EnergyGraph {
  roots: NodeId[];
  edges: Edge[];
  /** Edges by where they start. */
  from: Map<NodeId, Edge[]>;
}

export function graphOf(roots: NodeId[], edges: Edge[]): EnergyGraph {
  const from = new Map<NodeId, Edge[]>();
  for (const one of edges) {
    const known = from.get(one.from);
    if (known) known.push(one);
    else from.set(one.from, [one]);
  }
  return { roots, edges, from };
}

/** The same graph up to the commons, for questions that are not about terminals. */
export const withoutTerminals = (graph: EnergyGraph): EnergyGraph =>
  graphOf(
    graph.roots,
    graph.edges.filter((edge) => !edge.to.startsWith('terminal:')),
  );

/** Builds the graph. Duplicate tags add up: a thing is live when any of its descriptions says so. */
export function energyGraph(panel: Panel): EnergyGraph {
  const measured = panel.supplies.flatMap((supply) =>
    supplyTerminals(supply).map((tag) => edge(node.supply(supply.tag), node.terminal(tag))),
  );
  const roots = [nowhere, ...new Set(panel.sources.map((source) => node.source(source.tag)))];
  return graphOf(roots, [...feedEdges(panel), ...measured, ...groupEdges(panel), ...pointEdges(panel)]);
}
