import { useEffect } from 'react';
import { Outlet } from 'react-router-dom';
import type { Text } from '../../shared/panel/says';
import { SheetFrame } from '../components/sheet/SheetFrame';
import { SheetPage } from '../components/sheet/SheetPage';
import { useWords } from '../components/words';
import type { DeviceStore } from '../offline/types';
import { DeviceProvider } from '../offline/useDevice';
import { device } from './device';

function NotHere({ reasons }: { reasons: Text[] }) {
  const { t, say } = useWords();
  return (
    <SheetFrame>
      <SheetPage title={t('device.store.support.title')}>
        <p className="max-w-[66ch]">{t('device.store.support.what')}</p>
        <ul>
          {reasons.map((reason) => (
            <li key={reason.key}>{say(reason)}</li>
          ))}
        </ul>
      </SheetPage>
    </SheetFrame>
  );
}

function Field({ store }: { store: DeviceStore }) {
  useEffect(() => {
    // Whoever comes from the sign-in page has just made sending possible.
    void store.sendNow();
  }, [store]);
  return (
    <DeviceProvider store={store}>
      <Outlet />
    </DeviceProvider>
  );
}

/** Field work only where this browser can keep it; elsewhere the reasons, and no way past them. */
export function FieldGate() {
  return device.ok ? <Field store={device.store} /> : <NotHere reasons={device.reasons} />;
}
