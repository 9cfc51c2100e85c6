/** The panel as it may stand in the cabinet: this revision and the last as-built one together. */
import type { Panel } from '../panel/panelSchema';

function both<T>(now: readonly T[], before: readonly T[]): T[] {
  const known = new Set(now.map((one) => JSON.stringify(one)));
  return [...now, ...before.filter((one) => !known.has(JSON.stringify(one)))];
}

/**
 * Both revisions' sources, isolators, supplies, groups and points under their tags: a feed deleted on paper is still
 * there until somebody removed it, and a device counts only when both describe it so.
 */
export function asFound(panel: Panel, asBuilt?: Panel): Panel {
  if (!asBuilt) return panel;
  return {
    ...panel,
    sources: both(panel.sources, asBuilt.sources),
    isolators: both(panel.isolators, asBuilt.isolators),
    supplies: both(panel.supplies, asBuilt.supplies),
    groups: both(panel.groups, asBuilt.groups),
    points: both(panel.points, asBuilt.points),
  };
}
