/** Edges from supplies to the commons they feed, and between commons that are bridged. */
import type { Group, Panel } from '../panel/panelSchema';
import { edge, node, nowhere } from './graphEdge';
import type { Edge } from './graphEdge';
import { sharedTerminals } from './sharedTerminals';

type GroupsByTag = Map<string, Group[]>;

/** From a bridged common back up to its own supply, which the bridge may make live while its feeds are open. */
const upwards = (group: Group): Edge[] =>
  group.supply === undefined ? [] : [edge(node.group(group.tag), node.supply(group.supply), { maybe: true })];

function linkEdges(group: Group, linked: string, groups: GroupsByTag): Edge[] {
  const here = node.group(group.tag);
  const others = groups.get(linked);
  if (!others) return [edge(nowhere, here, { maybe: true }), ...upwards(group)];
  return [
    edge(here, node.group(linked), { maybe: true }),
    edge(node.group(linked), here, { maybe: true }),
    edge(node.backfeed(group.tag), node.backfeed(linked), { maybe: true }),
    edge(node.backfeed(linked), node.backfeed(group.tag), { maybe: true }),
    ...upwards(group),
    ...others.flatMap(upwards),
  ];
}

function edgesOfGroup(group: Group, supplies: Set<string>, groups: GroupsByTag): Edge[] {
  const to = node.group(group.tag);
  const stated = group.supply !== undefined && supplies.has(group.supply);
  return [
    // A common that nobody gave a supply may hang on anything.
    stated ? edge(node.supply(group.supply ?? ''), to) : edge(nowhere, to, { maybe: true }),
    edge(to, node.terminal(group.terminal)),
    edge(node.backfeed(group.tag), node.terminal(group.terminal), { maybe: true }),
    ...(group.linkedTo ?? []).flatMap((tag) => linkEdges(group, tag, groups)),
  ];
}

/** A terminal of two circuits is a bridge that nobody stated. */
function meetingEdges(panel: Panel, groups: GroupsByTag): Edge[] {
  return sharedTerminals(panel).flatMap(({ terminal, groups: tags, supplies }) => [
    ...tags
      .slice(1)
      .flatMap((tag) => (groups.get(tags[0] ?? '') ?? []).flatMap((first) => linkEdges(first, tag, groups))),
    ...supplies.flatMap((supply) =>
      tags.map((tag) => edge(node.supply(supply), node.backfeed(tag), { via: [terminal], maybe: true })),
    ),
  ]);
}

export function groupEdges(panel: Panel): Edge[] {
  const supplies = new Set(panel.supplies.map((supply) => supply.tag));
  const groups: GroupsByTag = new Map();
  for (const group of panel.groups) {
    const known = groups.get(group.tag);
    if (known) known.push(group);
    else groups.set(group.tag, [group]);
  }
  return [
    ...panel.groups.flatMap((group) => edgesOfGroup(group, supplies, groups)),
    ...meetingEdges(panel, groups),
  ];
}
