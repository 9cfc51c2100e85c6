/** The state of a job on this phone, folded once for each set of entries. */
import type { Checklist } from '../../../../shared/checklist/types';
import type { Entry } from '../../../../shared/job/entry';
import { foldJob } from '../../../../shared/job/fold';
import type { JobFacts, JobState } from '../../../../shared/job/types';
import type { LocalJob } from '../../../offline/types';

interface Kept {
  pack: string;
  checklist: Checklist;
  facts: JobFacts;
  state: JobState;
}
// The store answers the same array for as long as no entry of the job has come or changed.
const kept = new WeakMap<Entry[], Kept>();

const isSame = (a: JobFacts, b: JobFacts): boolean => a === b || JSON.stringify(a) === JSON.stringify(b);

/** The pack's digest covers its checklist: what was read again under the same digest is the same. */
const isOf = (known: Kept, { pack, facts }: LocalJob): boolean =>
  (known.checklist === pack.checklist || known.pack === pack.digest) && isSame(known.facts, facts);

export function folded(local: LocalJob): JobState {
  const known = kept.get(local.entries);
  if (known && isOf(known, local)) return known.state;
  const { pack, entries, facts } = local;
  const state = foldJob(pack.checklist, entries, facts);
  kept.set(entries, { pack: pack.digest, checklist: pack.checklist, facts, state });
  return state;
}
