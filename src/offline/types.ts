/** What the field screens may ask of this device. Implemented in this folder; faked in component tests. */
import type { Pack } from '../../shared/api/jobs';
import type { BodyOf, Entry, EntryKind } from '../../shared/job/entry';
import type { JobFacts } from '../../shared/job/types';

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
  lastError: string | null;
  /** Entries the server set aside or refused, with what it said; kept here. */
  needsAttention: { entry: string; job: string; says: string }[];
}

export type ReadinessCheck = 'shell' | 'pack' | 'pin' | 'storage' | 'self-test';
export interface Readiness {
  ready: boolean;
  checks: { check: ReadinessCheck; ok: boolean; says: string }[];
}

/** Thrown by `append` when the answer could not be kept: the screen keeps the input and says why. */
export class NotSavedError extends Error {
  constructor(
    readonly code: 'quota' | 'closed' | 'locked' | 'no-key' | 'unknown',
    message: string,
  ) {
    super(message);
  }
}

export type PinResult = { ok: true } | { ok: false; waitMs: number };

export interface DeviceStore {
  deviceId(): Promise<string>;
  jobs(person: string): Promise<LocalJob[]>;
  job(id: string): Promise<LocalJob | undefined>;
  /** Signs, then adds to the outbox in one strict transaction; resolves when that transaction has completed. */
  append<K extends EntryKind>(person: string, job: string, kind: K, body: BodyOf<K>): Promise<Entry>;
  /** Called after any change of what `job`, `jobs` or `sendState` would answer, from any tab. */
  subscribe(listener: () => void): () => void;
  sendState(): SendState;
  sendNow(): Promise<void>;
  people(): Promise<DevicePerson[]>;
  /** Online, signed in: makes the key pair, registers its public half, keeps the PIN's verifier. */
  enrol(person: { id: string; name: string; email: string }, pin: string): Promise<void>;
  checkPin(person: string, pin: string): Promise<PinResult>;
  readiness(job: string): Promise<Readiness>;
  /** Does what can be done about one failing check (ask for persistence, fetch the pack, run the self-test). */
  fix(job: string, check: ReadinessCheck): Promise<void>;
  storage(): Promise<{ persisted: boolean; usedMB: number; freeMB: number }>;
  /** All unsent entries as a file's text (`*.coldloop-entries.json`). */
  exportUnsent(): Promise<string>;
}
