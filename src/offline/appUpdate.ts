/** Newer versions of the app: looked for, offered, and used only when the person says so. */
import { Workbox } from 'workbox-window';

// failures.md row 12: look on start, on foreground and each hour.
const lookEveryMs = 3_600_000;

export interface AppUpdates {
  /** Is a newer version on this device, ready to be used? */
  waiting: () => boolean;
  subscribe: (listener: () => void) => () => void;
  /** Asks the server for a newer version; without a network nothing is found, which is no fault. */
  look: () => Promise<void>;
  /** Hands over to the newer version and loads the page anew. */
  apply: () => void;
}

/** Until a worker that is being fetched is whole, or was given up. */
const settled = (worker: ServiceWorker): Promise<void> =>
  new Promise((resolve) => {
    worker.addEventListener('statechange', () => {
      resolve();
    });
  });

class WorkerUpdates implements AppUpdates {
  private readonly worker = new Workbox('/sw.js');
  private readonly listeners = new Set<() => void>();
  private isWaiting = false;

  constructor() {
    this.worker.addEventListener('waiting', () => {
      this.isWaiting = true;
      for (const listener of this.listeners) listener();
    });
    document.addEventListener('visibilitychange', () => {
      if (document.visibilityState === 'visible') void this.look();
    });
    setInterval(() => void this.look(), lookEveryMs);
    // Without a network the registration of before stays in force.
    void this.worker.register({ immediate: true }).catch(() => undefined);
  }

  waiting = () => this.isWaiting;

  subscribe = (listener: () => void) => {
    this.listeners.add(listener);
    return () => this.listeners.delete(listener);
  };

  look = async () => {
    await this.worker.update().catch(() => undefined);
    const registration = await navigator.serviceWorker.getRegistration();
    if (registration?.installing) await settled(registration.installing);
  };

  apply = () => {
    this.worker.addEventListener('controlling', () => {
      window.location.reload();
    });
    this.worker.messageSkipWaiting();
  };
}

const none: AppUpdates = {
  waiting: () => false,
  subscribe: () => () => undefined,
  look: () => Promise.resolve(),
  apply: () => undefined,
};

/** Only the built app has a worker; the development server always gives the newest. */
export const appUpdates: AppUpdates =
  import.meta.env.PROD && 'serviceWorker' in navigator ? new WorkerUpdates() : none;
