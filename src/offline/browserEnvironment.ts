/** The browser as the device store's outside world. */
import { browserShell } from './browserShell';
import { deviceName } from './deviceName';
import type { BrowserStorage, Channel, DeviceEnvironment } from './environment';
import { lockedRound } from './lockedRound';

type ScreenWords = Pick<DeviceEnvironment, 'language' | 'say'>;

function openChannel(name: string): Channel {
  const channel = new BroadcastChannel(name);
  return {
    post: (message) => {
      channel.postMessage(message);
    },
    listen: (listener) => {
      channel.addEventListener('message', ({ data }: MessageEvent<string>) => {
        listener(data);
      });
    },
    close: () => {
      channel.close();
    },
  };
}

function onWake(run: () => void): () => void {
  const shown = () => {
    if (document.visibilityState === 'visible') run();
  };
  window.addEventListener('online', run);
  window.addEventListener('pageshow', shown);
  document.addEventListener('visibilitychange', shown);
  return () => {
    window.removeEventListener('online', run);
    window.removeEventListener('pageshow', shown);
    document.removeEventListener('visibilitychange', shown);
  };
}

const storage: BrowserStorage = {
  persist: () => navigator.storage.persist(),
  persisted: () => navigator.storage.persisted(),
  estimate: async () => {
    const { usage = 0, quota = 0 } = await navigator.storage.estimate();
    return { usageB: usage, quotaB: quota };
  },
};

/** Only where `offlineSupport` says ok. */
export function browserEnvironment({ language, say }: ScreenWords): DeviceEnvironment {
  const monotonic = () => performance.now();
  return {
    now: () => Date.now(),
    monotonic,
    random: () => Math.random(),
    randomBytes: (length) => crypto.getRandomValues(new Uint8Array(length)),
    subtle: crypto.subtle,
    indexedDB,
    fetch: (input, init) => fetch(input, init),
    setTimer: (ms, run) => {
      const timer = setTimeout(run, ms);
      return () => {
        clearTimeout(timer);
      };
    },
    whileLocked: lockedRound(navigator.locks, monotonic),
    openChannel,
    onWake,
    isVisible: () => document.visibilityState === 'visible',
    language,
    say,
    storage,
    shell: browserShell,
    deviceName: () => deviceName(navigator.userAgent),
  };
}
