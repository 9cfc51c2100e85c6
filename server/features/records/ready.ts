/** What a job must be before it is sealed, as a list of small named checks. */
import { sealRefusals, type SealCode } from '../../../shared/job/seal/sealChecks';
import type { SignatureState } from '../../../shared/job/types';
import type { FoldedJob } from '../jobs/folding';
import type { SealableJob } from '../jobs/turns';
import { digestFits } from './signedDigest';

interface Facts {
  job: SealableJob;
  folded: FoldedJob;
}
export type Unready = SealCode | 'set-aside' | 'signer-without-access' | 'digest';

const standing = ({ folded }: Facts): SignatureState[] => {
  const { signatures, countersign } = folded.state;
  return [...signatures.filter(({ stands }) => stands), ...(countersign ? [countersign] : [])];
};

/** Signed with a key whose owner had lost access by the time the entry arrived: history, not consent. */
function signedWithoutAccess(facts: Facts): boolean {
  const late = new Set(
    facts.folded.entries.filter(({ afterAccess }) => afterAccess).map(({ entry }) => entry.id),
  );
  return standing(facts).some(({ entry }) => late.has(entry));
}

/** What only the server knows; everything the entries say is checked in `sealChecks`. */
const checks: readonly [Unready, (facts: Facts) => boolean][] = [
  ['cancelled', ({ job }) => job.cancelled],
  ['set-aside', ({ folded }) => folded.setAside.length > 0],
  ['signer-without-access', signedWithoutAccess],
  // Last, for it folds the job once a signature.
  ['digest', (facts) => standing(facts).some((each) => !digestFits(facts.folded, each))],
];

/** Every reason why this job cannot be sealed; none means that it can. */
export function unready(facts: Facts): Unready[] {
  const { pack, state } = facts.folded;
  const said = sealRefusals({ checklist: pack.checklist, state }).map(({ code }) => code);
  const own = checks.filter(([, holds]) => holds(facts)).map(([reason]) => reason);
  return [...new Set([...said, ...own])];
}
