/** Whether this browser can keep work without a signal; what is missing is said, never guessed around. */
import { say, type Text } from '../../shared/panel/says';
import type { OfflineSupport } from './types';

/** What is looked at; given apart so that tests can take things away. */
interface Browser {
  isSecureContext: boolean;
  crypto?: { subtle?: unknown };
  indexedDB?: unknown;
  BroadcastChannel?: unknown;
  navigator: { serviceWorker?: unknown; storage?: { persisted?: unknown } };
}

/** In an insecure context the rest is missing because of it: then only that is said. */
export function offlineSupport(browser: Browser): OfflineSupport {
  if (!browser.isSecureContext) return { ok: false, reasons: [say('device.store.support.insecure')] };
  const wanted: [unknown, string][] = [
    [browser.crypto?.subtle, 'device.store.support.keys'],
    [browser.indexedDB, 'device.store.support.database'],
    [browser.navigator.serviceWorker, 'device.store.support.worker'],
    [browser.BroadcastChannel && browser.navigator.storage?.persisted, 'device.store.support.old'],
  ];
  const reasons = wanted.filter(([part]) => !part).map(([, key]): Text => say(key));
  return reasons.length === 0 ? { ok: true } : { ok: false, reasons };
}
