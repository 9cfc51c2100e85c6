/** Edges from commons and foreign supplies to the terminals of points. */
import type { Panel, Point } from '../panel/panelSchema';
import { foreignSupplies } from './foreignSupplies';
import { edge, node, nowhere } from './graphEdge';
import type { Edge } from './graphEdge';
import { pointTerminals } from './pointTerminals';

function fromGroup(point: Point, terminal: string, groups: Set<string>): Edge[] {
  const to = node.terminal(terminal);
  if (!groups.has(point.group)) return [edge(nowhere, to, { maybe: true })];
  return [edge(node.group(point.group), to), edge(node.backfeed(point.group), to, { maybe: true })];
}

/** Foreign voltage is at its terminal, and may reach the whole group through an input or a closed contact. */
function fromForeign(point: Point, supplies: Set<string>): Edge[] {
  return foreignSupplies(point).flatMap((tag) => {
    const stated = tag !== null && supplies.has(tag);
    const from = stated ? node.supply(tag) : nowhere;
    return [
      edge(from, node.terminal(point.terminal), { maybe: !stated }),
      edge(from, node.backfeed(point.group), { via: [point.terminal], maybe: true }),
    ];
  });
}

export function pointEdges(panel: Panel): Edge[] {
  const supplies = new Set(panel.supplies.map((supply) => supply.tag));
  const groups = new Set(panel.groups.map((group) => group.tag));
  return panel.points.flatMap((point) => [
    ...pointTerminals(panel, point).flatMap((terminal) => fromGroup(point, terminal, groups)),
    ...fromForeign(point, supplies),
  ]);
}
