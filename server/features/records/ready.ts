/** What a job must be before it is sealed, as a list of small named checks. */
import type { FoldedJob } from '../jobs/folding';
import type { SealableJob } from '../jobs/turns';

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
  | 'temporary-left';

const settled: ReadonlySet<string> = new Set(['done', 'accepted', 'out-of-scope']);

/** Signed with a key whose owner had lost access by the time the entry arrived: history, not consent. */
function signedWithoutAccess({ folded }: Facts): boolean {
  const { signatures, countersign } = folded.state;
  const standing = [...signatures.filter(({ stands }) => stands), ...(countersign ? [countersign] : [])];
  const late = new Set(folded.entries.filter(({ afterAccess }) => afterAccess).map(({ entry }) => entry.id));
  return standing.some(({ entry }) => late.has(entry));
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
      state.signatures.some(({ person, stands }) => stands && person === state.countersign?.person),
  ],
  [
    'temporary-left',
    ({ folded: { state } }) =>
      state.temporaries.some(({ body, removedBy }) => body.removes === undefined && removedBy === undefined),
  ],
];

/** Every reason why this job cannot be sealed; none means that it can. */
export const unready = (facts: Facts): Unready[] =>
  checks.filter(([, holds]) => holds(facts)).map(([reason]) => reason);
