import { useEffect } from 'react';

/** Keeps the screen on while a step needs both hands and both eyes. A phone that refuses just dims as usual. */
export function useWakeLock(wanted: boolean): void {
  useEffect(() => {
    if (!wanted || !('wakeLock' in navigator)) return;
    let held: WakeLockSentinel | undefined;
    let left = false;
    const hold = () => {
      if (document.visibilityState !== 'visible') return;
      navigator.wakeLock.request('screen').then(
        (sentinel) => {
          held = sentinel;
          if (left) void sentinel.release();
        },
        // Low battery or no permission: the step works all the same.
        () => undefined,
      );
    };
    hold();
    document.addEventListener('visibilitychange', hold);
    return () => {
      left = true;
      document.removeEventListener('visibilitychange', hold);
      void held?.release();
    };
  }, [wanted]);
}
