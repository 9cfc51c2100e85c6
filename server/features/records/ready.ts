/** What a job must be before it is sealed, as a list of small named checks. */
import type { SignatureState } from '../../../shared/job/types';
import type { FoldedJob } from '../jobs/folding';
import type { SealableJob } from '../jobs/turns';
import { digestFits } from './signedDigest';

interface Facts {
  job: SealableJob;
  folded: FoldedJob;
}
export type Unready =
  | 'cancelled'
  | 'not-countersigned'
  | 'contradiction'
  | 'gap'
  | 'unknown-kind'
  | 'set-aside'
  | 'lock-on'
  | 'isolator-not-known'
  | 'step-open'
  | 'hold-undecided'
  | 'signer-without-access'
  | 'same-person'
  | 'danger'
  | 'temporary-left'
  | 'digest';

const settled: ReadonlySet<string> = new Set(['done', 'accepted', 'out-of-scope']);

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

const checks: readonly [Unready, (facts: Facts) => boolean][] = [
  ['cancelled', ({ job }) => job.cancelled],
  [
    'not-countersigned',
    ({ folded: { state } }) => state.status !== 'countersigned' || state.countersign?.stands !== true,
  ],
  ['contradiction', ({ folded: { state } }) => state.contradictions.length > 0],
  ['gap', ({ folded: { state } }) => state.gaps.length > 0],
  ['unknown-kind', ({ folded: { state } }) => state.unknown.length > 0],
  ['set-aside', ({ folded }) => folded.setAside.length > 0],
  ['lock-on', ({ folded: { state } }) => state.locks.some(({ offAt }) => offAt === undefined)],
  [
    'isolator-not-known',
    ({ folded: { state } }) => Object.values(state.isolators).some(({ status }) => status === 'not-known'),
  ],
  [
    'step-open',
    ({ folded: { state, pack } }) =>
      pack.checklist.steps.some(({ id }) => !settled.has(state.steps[id]?.status ?? 'open')),
  ],
  [
    'hold-undecided',
    ({ folded: { state } }) => Object.values(state.steps).some(({ hold }) => hold && !hold.decided),
  ],
  ['signer-without-access', signedWithoutAccess],
  [
    'same-person',
    ({ folded: { state } }) =>
      [
        ...state.tookPart,
        ...state.signatures.filter(({ stands }) => stands).map(({ person }) => person),
      ].includes(state.countersign?.person ?? ''),
  ],
  ['danger', ({ folded: { state } }) => state.dangers.length > 0],
  [
    'temporary-left',
    ({ folded: { state } }) =>
      state.temporaries.some(({ body, removedBy }) => body.removes === undefined && removedBy === undefined),
  ],
  // Last, for it folds the job once a signature.
  ['digest', (facts) => standing(facts).some((each) => !digestFits(facts.folded, each))],
];

/** Every reason why this job cannot be sealed; none means that it can. */
export const unready = (facts: Facts): Unready[] =>
  checks.filter(([, holds]) => holds(facts)).map(([reason]) => reason);
