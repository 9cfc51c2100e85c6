/** Which findings stand when a revision is issued, each accepted by name. */
import type { Acceptance } from '../../../shared/api/panels';
import { say } from '../../../shared/panel/says';
import { blocking, isAccepted } from '../../../shared/rules/blocking';
import type { Finding } from '../../../shared/rules/finding';
import { placeKey } from '../../../shared/rules/placeKey';
import { Refused, type PathError } from '../../http/refused';
import type { Standing } from './entity';
import { acceptanceOf } from './findingView';

const mostErrors = 200;

/** Acceptances that fit no finding: made on a stale page, or by hand. */
function useless(findings: readonly Finding[], acceptances: readonly Acceptance[]): PathError[] {
  return acceptances.flatMap((acceptance, index) =>
    findings.some((finding) => isAccepted(finding, [acceptance]))
      ? []
      : [{ path: `acceptances.${index}`, says: say('reason.nothing-to-accept') }],
  );
}

/**
 * Every accepted finding with who accepted it and why.
 * What hurts may stand (it stops every job that it touches); everything else that blocks must be accepted.
 * @throws Refused 422 naming each finding without an acceptance, and each acceptance without a finding.
 */
export function standingOf(
  findings: readonly Finding[],
  acceptances: readonly Acceptance[],
  by: string,
): Standing[] {
  const given = acceptances.map((each) => ({ ...each, by }));
  const asks = findings.filter((finding) => ['by-name', 'by-rule'].includes(blocking(finding)));
  const open = asks.filter((finding) => !acceptanceOf(finding, given));
  const errors = [
    ...open.map(({ rule, where }) => ({
      path: `${rule} ${placeKey(where)}`,
      says: say('reason.not-accepted'),
    })),
    ...useless(asks, acceptances),
  ];
  if (errors.length > 0) throw new Refused(422, 'findings-stand', {}, errors.slice(0, mostErrors));
  return asks.flatMap((finding) => {
    const acceptance = acceptanceOf(finding, given);
    if (!acceptance) return [];
    return [{ rule: finding.rule, place: placeKey(finding.where), reason: acceptance.reason, by }];
  });
}
