import { useEffect, useState } from 'react';
import { useWords } from '../../components/words';
import type { DeviceStore } from '../../offline/types';
import { useDeviceStore } from '../../offline/useDevice';
import { Section } from './Section';

type Storage = Awaited<ReturnType<DeviceStore['storage']>>;

/** What this device holds, what is free, and whether the browser promised to keep it. */
export function StorageSection() {
  const { t } = useWords();
  const store = useDeviceStore();
  const [storage, setStorage] = useState<Storage>();
  useEffect(() => {
    void store.storage().then(setStorage);
  }, [store]);
  if (!storage) return null;
  return (
    <Section title={t('device.storage.title')}>
      <p className="m-0">
        {t('device.storage.room', {
          used: Math.round(storage.usedMB * 10) / 10,
          free: Math.round(storage.freeMB),
        })}
      </p>
      <p className="m-0 font-bold">
        {t(storage.persisted ? 'device.storage.kept' : 'device.storage.notKept')}
      </p>
      <p className="m-0">{t('device.storage.lost')}</p>
    </Section>
  );
}
