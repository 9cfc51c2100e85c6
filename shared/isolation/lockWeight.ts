/** What an isolator costs in a plan: locks that hold well, few people to tell, short walks. */
import type { Isolator } from '../panel/panelSchema';

// The figures of isolation.md §2: a device that cannot be locked is worth many that can.
const byLock: Record<Isolator['lock'], number> = { hasp: 10, 'device-needed': 12, 'cannot-lock': 1000 };
const perThingAlsoFed = 3;
const outOfSight = 2;

export const lockWeight = (isolator: Isolator): number =>
  byLock[isolator.lock] +
  perThingAlsoFed * (isolator.alsoFeeds?.length ?? 0) +
  (isolator.inSight ? 0 : outOfSight);
