/** Whether a finding stops a job, and what lifts it. */
import type { Finding } from './finding';
import { placeKey } from './placeKey';

/**
 * `never-accepted`: mend it, no acceptance lifts it. `by-name`: mended, or accepted at its place with a reason.
 * `by-rule`: may be accepted for the whole rule at once. `no`: it only adds steps.
 */
export type Blocking = 'never-accepted' | 'by-name' | 'by-rule' | 'no';

const blockingOf: Record<Finding['harm'], Blocking> = {
  hurts: 'never-accepted',
  damages: 'by-name',
  fails: 'by-name',
  doubt: 'by-rule',
  tells: 'no',
};

export const blocking = (finding: Pick<Finding, 'harm'>): Blocking => blockingOf[finding.harm];

export interface Accepted {
  rule: string;
  /** `placeKey` of the finding; absent accepts every place of the rule, which only a doubt allows. */
  place?: string | undefined;
}

/** True when these acceptances lift this finding. */
export function isAccepted(finding: Finding, accepted: readonly Accepted[]): boolean {
  const how = blocking(finding);
  if (how === 'never-accepted') return false;
  return accepted.some(
    ({ rule, place }) =>
      rule === finding.rule && (place === undefined ? how === 'by-rule' : place === placeKey(finding.where)),
  );
}
