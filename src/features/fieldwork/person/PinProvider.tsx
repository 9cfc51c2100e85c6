import { useCallback, useEffect, useMemo, useRef, useState, type ReactNode } from 'react';
import type { Here } from '../../../components/field/here';
import { PinForm } from '../../../components/field/PinForm';
import { Sheet } from '../../../components/field/Sheet';
import { useWords } from '../../../components/words';
import { useDeviceStore } from '../../../offline/useDevice';
import { presenceProven, touch, wasIdle } from './idle';
import { PinContext } from './usePin';

/** Notes every touch, and asks the person here for their PIN when an act or a long pause wants it. */
export function PinProvider({ here, children }: { here: Here; children: ReactNode }) {
  const { t } = useWords();
  const store = useDeviceStore();
  const [why, setWhy] = useState<string>();
  const answer = useRef<(ok: boolean) => void>(undefined);
  useEffect(() => {
    const events = ['pointerdown', 'keydown'] as const;
    events.forEach((name) => {
      window.addEventListener(name, touch, { capture: true });
    });
    return () => {
      events.forEach((name) => {
        window.removeEventListener(name, touch, { capture: true });
      });
    };
  }, []);
  const ask = useCallback((reason: string) => {
    setWhy(reason);
    return new Promise<boolean>((resolve) => {
      answer.current = resolve;
    });
  }, []);
  const settle = (ok: boolean) => {
    if (ok) presenceProven();
    setWhy(undefined);
    answer.current?.(ok);
  };
  const value = useMemo(
    () => ({ ask, askIfIdle: () => (wasIdle() ? ask(t('field.pin.idle')) : Promise.resolve(true)) }),
    [ask, t],
  );
  return (
    <PinContext.Provider value={value}>
      {children}
      {why !== undefined && (
        <Sheet
          title={here.name}
          onClose={() => {
            settle(false);
          }}
          closeWords={t('field.cancel')}
        >
          <p className="m-0">{why}</p>
          <PinForm
            label={t('field.pin.yours')}
            submit={t('field.pin.go')}
            check={async (pin) => {
              const result = await store.checkPin(here.person, pin);
              if (!result.ok) return result.waitMs;
              settle(true);
              return undefined;
            }}
          />
        </Sheet>
      )}
    </PinContext.Provider>
  );
}
