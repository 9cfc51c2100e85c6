/** The device store as React reads it. */
import {
  createContext,
  useCallback,
  useContext,
  useEffect,
  useState,
  useSyncExternalStore,
  type ReactNode,
} from 'react';
import type { DeviceStore, LocalJob, SendState } from './types';

const DeviceContext = createContext<DeviceStore | null>(null);

export function DeviceProvider({ store, children }: { store: DeviceStore; children: ReactNode }) {
  return <DeviceContext.Provider value={store}>{children}</DeviceContext.Provider>;
}

export function useDeviceStore(): DeviceStore {
  const store = useContext(DeviceContext);
  if (!store) throw new Error('useDeviceStore outside DeviceProvider');
  return store;
}

/** What `read` answers now and after each change of the store; undefined while it was never answered. */
function useStored<T>(read: (store: DeviceStore) => Promise<T>): T | undefined {
  const store = useDeviceStore();
  const [held, setHeld] = useState<{ read: typeof read; value: T }>();
  useEffect(() => {
    let asked = 0;
    let shown = 0;
    let isOver = false;
    const reread = () => {
      asked += 1;
      const turn = asked;
      read(store).then(
        (value) => {
          // An older reading that arrives late must not hide a newer one.
          if (isOver || turn < shown) return;
          shown = turn;
          setHeld({ read, value });
        },
        (fault: unknown) => {
          // To the error boundary: a screen that shows old data in silence would be worse.
          if (!isOver)
            setHeld(() => {
              throw fault;
            });
        },
      );
    };
    reread();
    const stop = store.subscribe(reread);
    return () => {
      isOver = true;
      stop();
    };
  }, [store, read]);
  return held?.read === read ? held.value : undefined;
}

/** Undefined while loading, null when this device does not hold it. */
export function useLocalJob(id: string): LocalJob | null | undefined {
  return useStored(useCallback(async (store: DeviceStore) => (await store.job(id)) ?? null, [id]));
}

/** Undefined while loading. */
export function useLocalJobs(person: string): LocalJob[] | undefined {
  return useStored(useCallback((store: DeviceStore) => store.jobs(person), [person]));
}

export function useSendState(): SendState {
  const store = useDeviceStore();
  return useSyncExternalStore(
    useCallback((listener: () => void) => store.subscribe(listener), [store]),
    () => store.sendState(),
  );
}
