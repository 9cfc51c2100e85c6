import type { LockState } from '../../../../shared/job/types';
import { useLocalJobs } from '../../../offline/useDevice';
import { folded } from '../job/folded';
import { locksOn } from '../job/ownLocks';
import { useFieldJob } from '../job/useFieldJob';

/** Where a padlock of this number is known to hang already, on this job or another one on this phone: it cannot hang twice. */
export function useLockElsewhere(lock: string): LockState | undefined {
  const { pack, state, me } = useFieldJob();
  const jobs = useLocalJobs(me.person) ?? [];
  const others = jobs.filter((local) => local.pack.job.id !== pack.job.id);
  const known = [...locksOn(state), ...others.flatMap((local) => locksOn(folded(local)))];
  return known.find((each) => each.lock === lock);
}
