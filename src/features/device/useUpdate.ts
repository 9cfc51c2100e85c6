import { useCallback, useEffect, useState } from 'react';

// The worker of this app takes over only when told so; see src/offline.
const takeOver = { type: 'SKIP_WAITING' };

/** Is a newer version of the app waiting on this device? It is offered here, never forced. */
export function useUpdate(): { waiting: boolean; look: () => Promise<void>; apply: () => void } {
  const [worker, setWorker] = useState<ServiceWorker | null>(null);
  const read = useCallback(async () => {
    const registration = await navigator.serviceWorker?.getRegistration();
    setWorker(registration?.waiting ?? null);
    return registration;
  }, []);
  useEffect(() => {
    void read();
  }, [read]);
  const look = async () => {
    const registration = await read();
    // Without a network the look finds nothing new: that is not a fault.
    await registration?.update().catch(() => undefined);
    await read();
  };
  const apply = () => {
    navigator.serviceWorker.addEventListener('controllerchange', () => {
      window.location.reload();
    });
    worker?.postMessage(takeOver);
  };
  return { waiting: worker !== null, look, apply };
}
