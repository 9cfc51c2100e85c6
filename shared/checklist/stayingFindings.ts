/** Which findings an electrician reads before this job, in an order that does not depend on the rules' own. */
import { canonicalJson } from '../panel/canonical';
import { findingsInScope } from '../rules/findingsInScope';
import type { Finding, Where } from '../rules/finding';
import type { ChecklistInput } from './facts';
import { naturalCompare } from './naturalCompare';

const places = ['point', 'group', 'module', 'supply', 'isolator', 'source', 'terminal'] as const;

/** A finding with a name that stays the same when the checklist is made again: rule, place, and a number for the second. */
export interface StayingFinding extends Finding {
  id: string;
}

/** The narrowest place a finding names, as a person would call it. */
export const placeOf = (where: Where): string => places.map((kind) => where[kind]).find(Boolean) ?? '';

/** Sorted by rule and place; the same finding twice is read once, two of one rule at one place are both read. */
export function stayingFindings(
  { panel, findings, scope }: ChecklistInput,
  isolators: readonly string[],
): StayingFinding[] {
  const byContent = new Map(
    findingsInScope(panel, findings, scope, isolators).map((finding) => [
      canonicalJson(finding),
      { finding, name: `${finding.rule}.${placeOf(finding.where)}` },
    ]),
  );
  const counts = new Map<string, number>();
  return [...byContent]
    .sort(([a, x], [b, y]) => naturalCompare(x.name, y.name) || (a < b ? -1 : 1))
    .map(([, { finding, name }]) => {
      const count = (counts.get(name) ?? 0) + 1;
      counts.set(name, count);
      return { ...finding, id: count === 1 ? name : `${name}.${count}` };
    });
}
