/** Which findings concern a job: those in the supplies, groups, modules or lock plan of its points. */
import { electricalSources, type Panel, type Source } from '../panel/panelSchema';
import { isAccepted, blocking, type Accepted } from './blocking';
import type { Finding } from './finding';

interface Scope {
  points: Set<string>;
  groups: Set<string>;
  modules: Set<string>;
  supplies: Set<string>;
  sources: Set<string>;
}

/** Supplies and sources upstream of the given supplies, themselves included. */
function upstream(panel: Panel, from: Iterable<string>): Set<string> {
  const reached = new Set(from);
  const feeds = new Map(panel.supplies.map((supply) => [supply.tag, supply.feeds.map((feed) => feed.from)]));
  for (const tag of reached) for (const feeder of feeds.get(tag) ?? []) reached.add(feeder);
  return reached;
}

/** Air, oil, weights, springs and heat concern every job on the panel: the file does not say what they move. */
const otherEnergy = ({ sources }: Panel): string[] => {
  const electrical: readonly Source['kind'][] = electricalSources;
  return sources.filter(({ kind }) => !electrical.includes(kind)).map(({ tag }) => tag);
};

/** The worked points, and whatever shares a group or a module with them. */
function scopeOf(panel: Panel, addresses: readonly string[]): Scope {
  const asked = new Set(addresses);
  const worked = panel.points.filter((point) => asked.has(point.address));
  const workedGroups = new Set(worked.map((point) => point.group));
  const modules = new Set(
    panel.groups.filter(({ tag }) => workedGroups.has(tag)).map(({ module }) => module),
  );
  const groups = new Set([
    ...workedGroups,
    ...panel.groups.filter(({ module }) => modules.has(module)).map(({ tag }) => tag),
  ]);
  const neighbours = panel.points.filter((point) => groups.has(point.group));
  const supplies = upstream(panel, [
    ...panel.groups.flatMap(({ tag, supply }) => (groups.has(tag) && supply !== undefined ? [supply] : [])),
    ...neighbours.flatMap(({ otherSupply, device }) => [
      ...(otherSupply !== undefined && otherSupply !== 'none' ? [otherSupply] : []),
      ...(device.kind === 'ssr-control' ? [device.load.supply] : []),
    ]),
  ]);
  const points = new Set([...asked, ...neighbours.map(({ address }) => address)]);
  return { points, groups, modules, supplies, sources: new Set([...supplies, ...otherEnergy(panel)]) };
}

/**
 * The findings that lie in a job's scope. Without a lock plan every finding at an isolator counts;
 * a finding that names no place counts always.
 */
export function findingsInScope(
  panel: Panel,
  findings: readonly Finding[],
  scope: readonly string[],
  planIsolators?: readonly string[],
): Finding[] {
  const { points, groups, modules, supplies, sources } = scopeOf(panel, scope);
  const isolators = planIsolators && new Set(planIsolators);
  const touches = ({ where }: Finding): boolean =>
    Object.values(where).every((tag) => tag === undefined) ||
    (where.point !== undefined && points.has(where.point)) ||
    (where.group !== undefined && groups.has(where.group)) ||
    (where.module !== undefined && modules.has(where.module)) ||
    (where.supply !== undefined && supplies.has(where.supply)) ||
    (where.source !== undefined && sources.has(where.source)) ||
    (where.isolator !== undefined && (isolators?.has(where.isolator) ?? true)) ||
    // A terminal with no owner named could be anybody's.
    (where.terminal !== undefined && Object.keys(where).length === 1);
  return findings.filter(touches);
}

/** The findings that still forbid a job on this scope, after what was accepted. */
export function blocksScope(
  panel: Panel,
  findings: readonly Finding[],
  scope: readonly string[],
  accepted: readonly Accepted[] = [],
  planIsolators?: readonly string[],
): Finding[] {
  return findingsInScope(panel, findings, scope, planIsolators).filter(
    (finding) => blocking(finding) !== 'no' && !isAccepted(finding, accepted),
  );
}
