import { useCallback, useEffect, useState } from 'react';

// The worker of this app takes over only when told so; see src/offline.
const takeOver = { type: 'SKIP_WAITING' };

/** Absent outside a secure context, where there is no worker at all. */
const registrationOf = async () =>
  'serviceWorker' in navigator ? navigator.serviceWorker.getRegistration() : undefined;

/** Is a newer version of the app waiting on this device? It is offered here, never forced. */
export function useUpdate(): { waiting: boolean; look: () => Promise<void>; apply: () => void } {
  const [worker, setWorker] = useState<ServiceWorker | null>(null);
  const keep = useCallback((registration: ServiceWorkerRegistration | undefined) => {
    setWorker(registration?.waiting ?? null);
  }, []);
  useEffect(() => {
    void registrationOf().then(keep);
  }, [keep]);
  const look = async () => {
    const registration = await registrationOf();
    // Without a network the look finds nothing new: that is not a fault.
    await registration?.update().catch(() => undefined);
    keep(registration);
  };
  const apply = () => {
    navigator.serviceWorker.addEventListener('controllerchange', () => {
      window.location.reload();
    });
    worker?.postMessage(takeOver);
  };
  return { waiting: worker !== null, look, apply };
}
