/** The device store of this page, opened once, or why this browser has none. */
import { browserEnvironment } from '../offline/browserEnvironment';
import { LocalDeviceStore } from '../offline/deviceStore';
import { offlineSupport } from '../offline/offlineSupport';
import type { DeviceStore, OfflineSupport } from '../offline/types';

type Device = { ok: true; store: DeviceStore } | Extract<OfflineSupport, { ok: false }>;

function open(): Device {
  const support = offlineSupport(globalThis);
  return support.ok ? { ok: true, store: new LocalDeviceStore(browserEnvironment()) } : support;
}

export const device = open();
