/** What the field screens may ask of this device. Implemented in this folder; faked in component tests. */
import type { Pack } from '../../shared/api/jobs';
import type { BodyOf, Entry, EntryKind } from '../../shared/job/entry';
import type { JobFacts } from '../../shared/job/types';
import type { Text } from '../../shared/panel/says';

export interface LocalJob {
  pack: Pack;
  status: string;
  /** Everything held on this device: own and others', sent or not. */
  entries: Entry[];
  facts: JobFacts;
  /** When entries of others were last pulled for this job. */
  pulledAt: string | null;
}

export interface DevicePerson {
  person: string;
  name: string;
  email: string;
  enrolledAt: string;
}

export interface SendState {
  unsent: number;
  oldestUnsentAt: string | null;
  /** 'needs-sign-in': the server asked for it; nothing is lost meanwhile. */
  state: 'idle' | 'sending' | 'waiting' | 'needs-sign-in';
  lastSentAt: string | null;
  /** Why the last round did not end well; null after one that did. */
  lastError: Text | null;
  /** Entries the server set aside or refused, with what it said; kept here. */
  needsAttention: { entry: string; job: string; says: string }[];
}

export type ReadinessCheck = 'shell' | 'pack' | 'pin' | 'storage' | 'self-test';
export interface Readiness {
  ready: boolean;
  /** `button` names what `fix` would do now; absent when nothing can be done on this device. */
  checks: { check: ReadinessCheck; ok: boolean; says: Text; button?: Text }[];
}

/** Thrown by `append` when the answer could not be kept: the screen keeps the input and says why. */
export class NotSavedError extends Error {
  constructor(
    readonly code: 'quota' | 'closed' | 'locked' | 'no-key' | 'no-pack' | 'too-big' | 'unknown',
    message: string,
  ) {
    super(message);
  }
}

/** Thrown by `enrol` for a PIN that is not six digits or more. */
export class WeakPinError extends Error {}

/** Thrown by `enrol` when the session is not that person's. */
export class OtherPersonError extends Error {}

/** Whether this browser can keep work without a signal at all; `reasons` are shown, never guessed around. */
export type OfflineSupport = { ok: true } | { ok: false; reasons: Text[] };

export type PinResult = { ok: true } | { ok: false; waitMs: number };

export interface DeviceStore {
  deviceId(): Promise<string>;
  jobs(person: string): Promise<LocalJob[]>;
  job(id: string): Promise<LocalJob | undefined>;
  /** Signs, then adds to the outbox in one strict transaction; resolves when that transaction has completed. */
  append<K extends EntryKind>(person: string, job: string, kind: K, body: BodyOf<K>): Promise<Entry>;
  /** Called after any change of what `job`, `jobs` or `sendState` would answer, from any tab. */
  subscribe(listener: () => void): () => void;
  /** While held, this job is pulled every few seconds when the page is visible; call the answer to let go. */
  watch(job: string): () => void;
  /** Starts sending on its own (now, on foreground, on `online`, on a timer); call the answer to stop. */
  start(): () => void;
  sendState(): SendState;
  sendNow(): Promise<void>;
  people(): Promise<DevicePerson[]>;
  /** Online, signed in: makes the key pair, registers its public half, keeps the PIN's verifier. */
  enrol(person: { id: string; name: string; email: string }, pin: string): Promise<void>;
  checkPin(person: string, pin: string): Promise<PinResult>;
  readiness(job: string): Promise<Readiness>;
  /**
   * Does what can be done about one failing check (ask for persistence, fetch the pack, run the self-test).
   * For 'storage' a second call, after the browser refused, accepts the warning that is then shown.
   */
  fix(job: string, check: ReadinessCheck): Promise<void>;
  storage(): Promise<{ persisted: boolean; usedMB: number; freeMB: number }>;
  /** All unsent entries as a file's text (`*.coldloop-entries.json`). */
  exportUnsent(): Promise<string>;
}
