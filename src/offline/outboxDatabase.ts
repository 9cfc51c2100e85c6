/** The outbox: what exists only on this phone. Version 1 for ever: it is never migrated, so no update can lose it. */
import type { DBSchema } from 'idb';
import type { Entry } from '../../shared/job/entry';
import { Connection, type DatabaseSpec } from './connection';

export interface DeviceKey {
  key: string;
  person: string;
  /** The private half cannot be exported, not even by this app. */
  pair: CryptoKeyPair;
  registered: boolean;
  madeAt: string;
}

export interface PinVerifier {
  salt: Uint8Array<ArrayBuffer>;
  rounds: number;
  hash: Uint8Array<ArrayBuffer>;
}

export interface EnrolledPerson {
  person: string;
  name: string;
  email: string;
  enrolledAt: string;
  key: string;
  verifier: PinVerifier;
  /** Wrong PINs since the last right one, and the wall time before which none is looked at. */
  wrong: number;
  waitUntil: number;
}

export interface LogHead {
  log: string;
  job: string;
  key: string;
  person: string;
  seq: number;
  hash: string;
}

export interface Attention {
  entry: string;
  job: string;
  says: string;
  at: string;
}

export interface OutboxSchema extends DBSchema {
  entries: { key: string; value: Entry; indexes: { job: string; log: [string, number] } };
  heads: { key: string; value: LogHead; indexes: { job: string } };
  keys: { key: string; value: DeviceKey; indexes: { person: string } };
  people: { key: string; value: EnrolledPerson };
  attention: { key: string; value: Attention };
  photos: {
    key: [string, string];
    value: { job: string; sha256: string; type: string; bytes: ArrayBuffer };
    indexes: { job: string };
  };
  /** Small single facts of this device, e.g. its id; new ones need no new version. */
  settings: { key: string; value: unknown };
}

export const outboxSpec: DatabaseSpec<OutboxSchema> = {
  name: 'coldloop-outbox',
  version: 1,
  upgrade(database) {
    const entries = database.createObjectStore('entries', { keyPath: 'id' });
    entries.createIndex('job', 'job');
    entries.createIndex('log', ['log', 'seq']);
    database.createObjectStore('heads', { keyPath: 'log' }).createIndex('job', 'job');
    database.createObjectStore('keys', { keyPath: 'key' }).createIndex('person', 'person');
    database.createObjectStore('people', { keyPath: 'person' });
    database.createObjectStore('attention', { keyPath: 'entry' });
    database.createObjectStore('photos', { keyPath: ['job', 'sha256'] }).createIndex('job', 'job');
    database.createObjectStore('settings');
  },
};

export type Outbox = Connection<OutboxSchema>;
export const openOutbox = (factory: IDBFactory): Outbox => new Connection(factory, outboxSpec);
