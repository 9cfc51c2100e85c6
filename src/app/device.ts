/** The device store of this page, opened once, or why this browser has none. */
import type { Text } from '../../shared/panel/says';
import { chosenLanguage } from '../components/wording/chosenLanguage';
import { renderHeld } from '../components/wording/held';
import { browserEnvironment } from '../offline/browserEnvironment';
import { LocalDeviceStore } from '../offline/deviceStore';
import { offlineSupport } from '../offline/offlineSupport';
import type { DeviceStore, OfflineSupport } from '../offline/types';

type Device = { ok: true; store: DeviceStore } | Extract<OfflineSupport, { ok: false }>;

const say = (text: Text) => renderHeld(chosenLanguage(), text);

function open(): Device {
  const support = offlineSupport(globalThis);
  return support.ok
    ? { ok: true, store: new LocalDeviceStore(browserEnvironment({ language: chosenLanguage, say })) }
    : support;
}

export const device = open();
