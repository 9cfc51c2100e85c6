/** The state of a job on this phone, folded once for each set of entries. */
import { foldJob } from '../../../../shared/job/fold';
import type { JobState } from '../../../../shared/job/types';
import type { LocalJob } from '../../../offline/types';

const kept = new WeakMap<LocalJob, JobState>();

export function folded(local: LocalJob): JobState {
  const known = kept.get(local);
  if (known) return known;
  const state = foldJob(local.pack.checklist, local.entries, local.facts);
  kept.set(local, state);
  return state;
}
