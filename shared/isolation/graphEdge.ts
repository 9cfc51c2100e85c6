/** The parts of the energy graph: nodes that energy can be at, and edges it can pass. */

/** Something energy can be at: `source:…`, `supply:…`, `group:…`, `backfeed:…` (of a group), `terminal:…`, `incoming:…`. */
export type NodeId = string;

export interface Edge {
  from: NodeId;
  to: NodeId;
  /** Tags passed between the two, for the path a person reads. */
  via: readonly string[];
  /** Isolators that stop the energy here when open. */
  cuts: readonly string[];
  /** True when the energy may pass (back-feed, something nobody stated), not when it surely does. */
  maybe: boolean;
}

/** Energy whose origin nobody described: never dead. */
export const nowhere: NodeId = 'source:?';

export const node = {
  source: (tag: string): NodeId => `source:${tag}`,
  supply: (tag: string): NodeId => `supply:${tag}`,
  group: (tag: string): NodeId => `group:${tag}`,
  backfeed: (group: string): NodeId => `backfeed:${group}`,
  terminal: (tag: string): NodeId => `terminal:${tag}`,
  incoming: (isolator: string): NodeId => `incoming:${isolator}`,
};

/** The tag of a node, without its kind. */
export const tagOf = (id: NodeId): string => id.slice(id.indexOf(':') + 1);

// Most edges pass nothing: they share one empty list.
const nothing: readonly string[] = [];

export const edge = (from: NodeId, to: NodeId, more: Partial<Edge> = {}): Edge => ({
  from,
  to,
  via: more.via ?? nothing,
  cuts: more.cuts ?? nothing,
  maybe: more.maybe ?? false,
});
