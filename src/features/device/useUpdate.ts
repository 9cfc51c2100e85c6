import { useSyncExternalStore } from 'react';
import { appUpdates } from '../../offline/appUpdate';

/** Is a newer version of the app waiting on this device? It is offered here, never forced. */
export function useUpdate(): { waiting: boolean; look: () => Promise<void>; apply: () => void } {
  const waiting = useSyncExternalStore(appUpdates.subscribe, appUpdates.waiting);
  return { waiting, look: appUpdates.look, apply: appUpdates.apply };
}
