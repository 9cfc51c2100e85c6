/** Which findings an electrician reads before this job, in an order that does not depend on the rules' own. */
import type { Finding, Where } from '../rules/finding';
import type { ChecklistInput, PointFacts } from './facts';
import { naturalCompare } from './naturalCompare';

const places = ['point', 'group', 'module', 'supply', 'isolator', 'source', 'terminal'] as const;

/** The narrowest place a finding names, as a person would call it. */
export const placeOf = (where: Where): string => places.map((kind) => where[kind]).find(Boolean) ?? '';

/** A key that names rule and place, stable over regeneration. */
export const findingKey = ({ rule, where }: Finding): string => `${rule}.${placeOf(where)}`;

/** A finding that names only a supply, isolator, source or terminal may reach any point: it is always read. */
export function findingsInScope({ findings }: ChecklistInput, points: PointFacts[]): Finding[] {
  const addresses = new Set(points.map(({ point }) => point.address));
  const groups = new Set(points.map(({ group }) => group.tag));
  const modules = new Set(points.map(({ module }) => module.tag));
  const touches = ({ point, group, module }: Where) =>
    point !== undefined
      ? addresses.has(point)
      : group !== undefined
        ? groups.has(group)
        : module === undefined || modules.has(module);
  const seen = new Set<string>();
  return [...findings]
    .sort((a, b) => naturalCompare(findingKey(a), findingKey(b)))
    .filter((finding) => {
      const key = findingKey(finding);
      const first = touches(finding.where) && !seen.has(key);
      if (first) seen.add(key);
      return first;
    });
}
