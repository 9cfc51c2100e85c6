import type { Acceptance, FindingView } from '../../../shared/api/panels';
import { oneLine } from '../field/oneLine';

type Placed = Pick<FindingView, 'rule' | 'harm'> & { place: string };

/** The reasons somebody is typing, by what they would accept. */
export type Reasons = Readonly<Record<string, string>>;

/** A doubt is accepted in groups by its rule; everything else one place at a time. */
export const acceptanceKey = (finding: Placed): string =>
  finding.harm === 'doubt' ? finding.rule : `${finding.rule}\n${finding.place}`;

/** `hurts` is never accepted, `tells` needs no acceptance. */
export const mayBeAccepted = (finding: Pick<FindingView, 'harm'>): boolean =>
  finding.harm === 'damages' || finding.harm === 'fails' || finding.harm === 'doubt';

/** One finding for each acceptance that is wanted, with how many places it stands for. */
export function acceptanceGroups<F extends Placed>(findings: readonly F[]): { first: F; count: number }[] {
  const groups = new Map<string, { first: F; count: number }>();
  for (const finding of findings) {
    const known = groups.get(acceptanceKey(finding));
    if (known) known.count += 1;
    else groups.set(acceptanceKey(finding), { first: finding, count: 1 });
  }
  return [...groups.values()];
}

/** The acceptances of the contract, for the findings that have a reason. */
export const acceptancesOf = (findings: readonly Placed[], reasons: Reasons): Acceptance[] =>
  acceptanceGroups(findings).flatMap(({ first }) => {
    const reason = oneLine(reasons[acceptanceKey(first)] ?? '');
    if (!reason) return [];
    return [
      first.harm === 'doubt'
        ? { rule: first.rule, reason }
        : { rule: first.rule, place: first.place, reason },
    ];
  });
