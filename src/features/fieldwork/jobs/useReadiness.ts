import { useCallback, useEffect, useState } from 'react';
import type { Readiness, ReadinessCheck } from '../../../offline/types';
import { useDeviceStore } from '../../../offline/useDevice';

/** Whether a job works with no signal on this phone, looked at anew after each change; and a way to mend what is missing. */
export function useReadiness(job: string): {
  readiness: Readiness | undefined;
  mending: ReadinessCheck | undefined;
  mend: (check: ReadinessCheck) => Promise<void>;
} {
  const store = useDeviceStore();
  const [readiness, setReadiness] = useState<Readiness>();
  const [mending, setMending] = useState<ReadinessCheck>();
  const look = useCallback(() => store.readiness(job).then(setReadiness), [store, job]);
  useEffect(() => {
    void look();
    return store.subscribe(() => void look());
  }, [store, look]);
  const mend = async (check: ReadinessCheck) => {
    setMending(check);
    try {
      await store.fix(job, check);
    } finally {
      setMending(undefined);
      await look();
    }
  };
  return { readiness, mending, mend };
}
