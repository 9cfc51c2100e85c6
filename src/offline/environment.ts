/** The outside world as the device store meets it, so that tests and the simulation can bring their own. */
import type { Language } from '../../shared/api/common';
import type { Text } from '../../shared/panel/says';

export interface Channel {
  post(message: string): void;
  listen(listener: (message: string) => void): void;
  close(): void;
}

export interface BrowserStorage {
  persist(): Promise<boolean>;
  persisted(): Promise<boolean>;
  estimate(): Promise<{ usageB: number; quotaB: number }>;
}

/** The app's own files as its service worker holds them. */
export interface Shell {
  /** `version` names the set of files; null when no worker controls the page or its set is not whole. */
  version(): Promise<string | null>;
  /** Opens the app with the network refused: the page and every script, style and font it names. */
  opensOffline(): Promise<boolean>;
  /** Fetches what is missing of the set; needs the network. */
  mend(): Promise<void>;
}

export interface DeviceEnvironment {
  /** Wall clock, milliseconds. */
  now(): number;
  /** A clock nobody can set, milliseconds from any start. */
  monotonic(): number;
  /** 0 ≤ value < 1. */
  random(): number;
  randomBytes(length: number): Uint8Array<ArrayBuffer>;
  subtle: SubtleCrypto;
  indexedDB: IDBFactory;
  fetch: typeof fetch;
  /** Runs once after `ms`; the answer cancels it. */
  setTimer(ms: number, run: () => void): () => void;
  /** Runs while holding the named lock of all tabs; false, without running, when another tab holds it. */
  whileLocked(name: string, run: () => Promise<void>): Promise<boolean>;
  openChannel(name: string): Channel;
  /** Calls back when a round is worth trying: network back, page shown. The answer stops it. */
  onWake(run: () => void): () => void;
  isVisible(): boolean;
  /** Language of the screen, for what the server says. */
  language(): Language;
  /** A sentence in that language. */
  say(text: Text): string;
  storage: BrowserStorage;
  shell: Shell;
  /** What the person reads in the list of their devices, e.g. "Chrome on Android". */
  deviceName(): string;
}
