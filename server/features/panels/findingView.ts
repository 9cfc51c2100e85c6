/** Findings as people read them, in their language. */
import type { Language } from '../../../shared/api/common';
import type { FindingsAnswer } from '../../../shared/api/panels';
import type { Finding } from '../../../shared/rules/finding';
import { isAccepted } from '../../../shared/rules/blocking';
import { placeKey } from '../../../shared/rules/placeKey';
import { findingView } from './panelCheckMapper';

/** An acceptance with who gave it. */
export interface GivenAcceptance {
  rule: string;
  place?: string | undefined;
  reason: string;
  by: string;
}
type Placed = FindingsAnswer['findings'][number];

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
