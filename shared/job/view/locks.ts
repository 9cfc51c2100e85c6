/** Locks as facts: on until their owner, or a foreman by the supervised exception, takes them off. */
import { before, concurrent } from '../order/placed';
import { isInRound } from './rounds';
import type { Closing, Lock, View } from './view';

export const isOn = (lock: Lock): boolean => lock.offs.length === 0;

export const locksOn = (view: View): Lock[] => view.locks.filter(isOn);

/** This person's locks that count for their proof, by isolator. */
export function ownLock(view: View, isolator: string, person: string): Lock | undefined {
  const { unsureUpTo } = view.setting;
  return view.locks.find(
    (lock) =>
      lock.isolator === isolator &&
      lock.person === person &&
      lock.counts &&
      isOn(lock) &&
      lock.on.seq > (unsureUpTo[lock.on.log] ?? 0),
  );
}

/** Was a lock on while its isolator was closed, or may it have been? */
export function isClosedUnder(lock: Lock, { placed, isolator }: Closing): boolean {
  if (lock.isolator !== isolator) return false;
  const mayHaveHung = before(lock.on, placed) || concurrent(lock.on, placed);
  return mayHaveHung && lock.offs.every((off) => before(placed, off.placed));
}

/** Locks of this round that were taken off. */
export const isOffInRound = (view: View, lock: Lock): boolean =>
  !isOn(lock) && lock.offs.some(({ placed }) => isInRound(view, placed));
