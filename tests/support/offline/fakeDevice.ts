/** A device with a database, clock and network of its own; several tabs may be opened on it. */
import 'fake-indexeddb/auto';
import { IDBFactory } from 'fake-indexeddb';
import { webcrypto } from 'node:crypto';
import { openDatabases } from '../../../src/offline/databases';
import { LocalDeviceStore } from '../../../src/offline/deviceStore';
import type { Channel, DeviceEnvironment } from '../../../src/offline/environment';
import type { FakeServer } from './fakeServer';
import { VirtualClock } from './virtualClock';

export class FakeDevice {
  indexedDB = new IDBFactory();
  readonly clock = new VirtualClock();
  readonly shell = { version: 'shell-1' as string | null, opens: true, mended: 0 };
  readonly storage = { persisted: false, grants: false, asked: 0 };
  visible = true;
  /** 0 ≤ jitter < 1 for every draw. */
  jitter = 0.5;
  private readonly locked = new Set<string>();
  private readonly channels = new Set<(message: string) => void>();
  private readonly wakers = new Set<() => void>();
  private readonly tabs: LocalDeviceStore[] = [];

  constructor(readonly server: FakeServer) {}

  /** Another tab of the app on this device. */
  tab(change: Partial<DeviceEnvironment> = {}): LocalDeviceStore {
    const store = new LocalDeviceStore({ ...this.environment(), ...change });
    this.tabs.push(store);
    return store;
  }

  /** What stands on disk, read past the store. */
  disk() {
    return openDatabases(this.indexedDB);
  }

  /** Every tab is gone, at once; the disk stays. */
  async kill(): Promise<void> {
    await Promise.all(this.tabs.splice(0).map((tab) => tab.close()));
    this.locked.clear();
  }

  wake(): void {
    for (const run of this.wakers) run();
  }

  environment(): DeviceEnvironment {
    return {
      now: this.clock.now,
      monotonic: this.clock.monotonic,
      random: () => this.jitter,
      randomBytes: (length) => webcrypto.getRandomValues(new Uint8Array(length)),
      subtle: webcrypto.subtle as SubtleCrypto,
      indexedDB: this.indexedDB,
      fetch: this.server.fetch,
      setTimer: this.clock.setTimer,
      whileLocked: (name, run) => this.whileLocked(name, run),
      openChannel: () => this.openChannel(),
      onWake: (run) => {
        this.wakers.add(run);
        return () => this.wakers.delete(run);
      },
      isVisible: () => this.visible,
      language: () => 'en',
      say: ({ key }) => key,
      storage: {
        persist: () => {
          this.storage.asked += 1;
          this.storage.persisted = this.storage.grants;
          return Promise.resolve(this.storage.persisted);
        },
        persisted: () => Promise.resolve(this.storage.persisted),
        estimate: () => Promise.resolve({ usageB: 2_500_000, quotaB: 1_002_500_000 }),
      },
      shell: {
        version: () => Promise.resolve(this.shell.version),
        opensOffline: () => Promise.resolve(this.shell.opens),
        mend: () => {
          this.shell.mended += 1;
          return Promise.resolve();
        },
      },
      deviceName: () => 'Test on Node',
    };
  }

  private async whileLocked(name: string, run: () => Promise<void>): Promise<boolean> {
    if (this.locked.has(name)) return false;
    this.locked.add(name);
    await run().finally(() => this.locked.delete(name));
    return true;
  }

  private openChannel(): Channel {
    let own: ((message: string) => void) | undefined;
    return {
      post: (message) => {
        for (const listen of this.channels) if (listen !== own) queueMicrotask(() => listen(message));
      },
      listen: (listener) => {
        own = listener;
        this.channels.add(listener);
      },
      close: () => {
        if (own) this.channels.delete(own);
      },
    };
  }
}
