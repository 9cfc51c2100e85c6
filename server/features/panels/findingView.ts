/** Findings as people read them, in their language. */
import type { Language } from '../../../shared/api/common';
import type { FindingsAnswer, FindingView } from '../../../shared/api/panels';
import type { CouldNotRun, Finding, Where } from '../../../shared/rules/finding';
import { isAccepted } from '../../../shared/rules/blocking';
import { placeKey } from '../../../shared/rules/placeKey';
import { render } from '../../../shared/wording/render';

/** An acceptance with who gave it. */
export interface GivenAcceptance {
  rule: string;
  place?: string | undefined;
  reason: string;
  by: string;
}
type Placed = FindingsAnswer['findings'][number];

const withoutAbsent = (where: Where): Where =>
  Object.fromEntries(Object.entries(where).filter(([, tag]) => tag !== undefined));

export const findingView = (finding: Finding, language: Language): FindingView => ({
  rule: finding.rule,
  harm: finding.harm,
  where: withoutAbsent(finding.where),
  says: render(language, finding.says),
  because: finding.because.map(({ name, value, unit, basis }) => ({
    name: render(language, { key: name }),
    value,
    unit,
    basis,
  })),
  remedy: finding.remedy
    ? {
        says: render(language, finding.remedy.says),
        ...(finding.remedy.values ? { values: finding.remedy.values } : {}),
      }
    : null,
});

/** The acceptance that lifts this finding, if one of these does. */
export const acceptanceOf = (
  finding: Finding,
  given: readonly GivenAcceptance[],
): GivenAcceptance | undefined => given.find((each) => isAccepted(finding, [each]));

export function placedFinding(
  finding: Finding,
  language: Language,
  given: readonly GivenAcceptance[],
): Placed {
  const acceptance = acceptanceOf(finding, given);
  return {
    ...findingView(finding, language),
    place: placeKey(finding.where),
    accepted: acceptance ? { reason: acceptance.reason, by: acceptance.by } : null,
  };
}

export const couldNotRunView = ({ rule, where, missing }: CouldNotRun) => ({
  rule,
  where: withoutAbsent(where),
  missing,
});
