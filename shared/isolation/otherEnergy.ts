/** Sources that are not electrical, and the valves, blocks and pins that hold them back. */
import { electricalSources, type Panel, type Source } from '../panel/panelSchema';
import { countsAsIsolation } from './countsAsIsolation';
import { isolatorsByTag } from './isolatorsByTag';

const electrical: readonly Source['kind'][] = electricalSources;

export const otherEnergySources = (panel: Panel): Source[] =>
  panel.sources.filter((source) => !electrical.includes(source.kind));

/** True when the source names its isolators, every one is described and each may be relied on. */
export function heldBack(panel: Panel, source: Source): boolean {
  const described = isolatorsByTag(panel);
  const named = source.isolators ?? [];
  return named.length > 0 && named.every((tag) => described.get(tag)?.every(countsAsIsolation) ?? false);
}

/** Tags of every isolator that such a source names and that counts. */
export function otherEnergyIsolators(panel: Panel): Set<string> {
  const described = isolatorsByTag(panel);
  const named = otherEnergySources(panel).flatMap((source) => source.isolators ?? []);
  return new Set(named.filter((tag) => described.get(tag)?.every(countsAsIsolation) ?? false));
}
