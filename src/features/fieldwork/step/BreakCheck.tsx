import { useEffect, useState } from 'react';
import type { Stage } from '../../../../shared/checklist/types';
import { ownLocks } from '../job/ownLocks';
import { useFieldJob } from '../job/useFieldJob';
import { BreakSheet } from './BreakSheet';
import { breakMs, longBreakMs, newestOwn } from './breakSince';

// Before the first lock and after the last there is no lock to look at.
const underLock: ReadonlySet<Stage> = new Set([
  'isolate',
  'prove-dead',
  'wire',
  'check-cold',
  'close-up',
  'locks-off',
]);

/** Back after more than ten minutes: shows the last answered step first and has the own locks looked at. */
export function BreakCheck({ stage }: { stage: Stage }) {
  const { local, state, me } = useFieldJob();
  const [away, setAway] = useState(0);
  const newest = newestOwn(local.entries, local.facts, me.person);
  useEffect(() => {
    const look = () => {
      if (document.visibilityState === 'visible') setAway(breakMs(newest, Date.now()));
    };
    look();
    document.addEventListener('visibilitychange', look);
    return () => {
      document.removeEventListener('visibilitychange', look);
    };
  }, [newest]);
  const locks = ownLocks(state, me.person);
  if (away < longBreakMs || locks.length === 0 || !underLock.has(stage)) return null;
  return <BreakSheet awayMs={away} locks={locks} />;
}
