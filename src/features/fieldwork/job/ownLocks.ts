import type { JobState, LockState } from '../../../../shared/job/types';

/** This person's locks known to be on. */
export const ownLocks = (state: JobState, person: string): LockState[] =>
  state.locks.filter((lock) => lock.person === person && !lock.offAt && !lock.removedBy);

/** Everybody's locks known to be on. */
export const locksOn = (state: JobState): LockState[] =>
  state.locks.filter((lock) => !lock.offAt && !lock.removedBy);
