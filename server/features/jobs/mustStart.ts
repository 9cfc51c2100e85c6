/** Refuses a job that may not start, with every reason. */
import type { Acceptance } from '../../../shared/api/panels';
import { say } from '../../../shared/panel/says';
import { blocking, isAccepted } from '../../../shared/rules/blocking';
import { placeKey } from '../../../shared/rules/placeKey';
import { Refused, type PathError } from '../../http/refused';
import type { PreparedJob } from './prepare';

const mostErrors = 200;

/** @throws Refused 409 `job-blocked` for what no acceptance lifts, 422 `findings-stand` for what still wants one. */
export function mustStart(prepared: PreparedJob, acceptances: readonly Acceptance[]): void {
  if (prepared.blocked.length > 0) {
    const errors = prepared.blocked.map(({ code, says }) => ({ path: code, says }));
    throw new Refused(409, 'job-blocked', {}, errors.slice(0, mostErrors));
  }
  const open: PathError[] = prepared.findings
    .filter(({ needsAcceptance }) => needsAcceptance)
    .map(({ finding: { rule, where } }) => ({
      path: `${rule} ${placeKey(where)}`.trim(),
      says: say('reason.not-accepted'),
    }));
  const mayBe = prepared.findings.map(({ finding }) => finding).filter((each) => blocking(each) !== 'no');
  const useless: PathError[] = acceptances.flatMap((acceptance, index) =>
    mayBe.some((finding) => isAccepted(finding, [acceptance]))
      ? []
      : [{ path: `acceptances.${index}`, says: say('reason.nothing-to-accept') }],
  );
  const errors = [...open, ...useless];
  if (errors.length > 0) throw new Refused(422, 'findings-stand', {}, errors.slice(0, mostErrors));
}
