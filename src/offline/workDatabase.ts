/** The work database: packs, entries the server has, cursors. All of it can be pulled again from zero. */
import type { DBSchema } from 'idb';
import type { Pack } from '../../shared/api/jobs';
import type { Entry } from '../../shared/job/entry';
import { Connection, type DatabaseSpec } from './connection';

export interface WorkJob {
  job: string;
  status: string;
  /** Digest of the pack new entries answer. */
  pack: string;
  /** Cursor of the pull. It lives with the data it counts: losing one loses the other. */
  after: number;
  pulledAt: string | null;
  /** Highest seq of each log up to which nothing is missing here. */
  vector: Record<string, number>;
}

export interface WorkEntry {
  id: string;
  job: string;
  log: string;
  seq: number;
  entry: Entry;
  /** The server keeps it aside: it is held, and folded nowhere. */
  setAside: boolean;
}

export interface WorkLog {
  log: string;
  job: string;
  key: string;
  person: string;
  publicKey: Record<string, unknown>;
}

/** That this job of this pack was opened by this set of app files with the network refused. */
export interface SelfTest {
  job: string;
  pack: string;
  shell: string;
  at: string;
}

export interface WorkSchema extends DBSchema {
  packs: { key: string; value: Pack };
  jobs: { key: string; value: WorkJob };
  entries: { key: string; value: WorkEntry; indexes: { job: string; log: [string, number] } };
  logs: { key: string; value: WorkLog; indexes: { job: string } };
  selfTests: { key: string; value: SelfTest };
  settings: { key: string; value: unknown };
}

export const workSpec: DatabaseSpec<WorkSchema> = {
  name: 'coldloop-work',
  version: 1,
  upgrade(database) {
    database.createObjectStore('packs', { keyPath: 'digest' });
    database.createObjectStore('jobs', { keyPath: 'job' });
    const entries = database.createObjectStore('entries', { keyPath: 'id' });
    entries.createIndex('job', 'job');
    entries.createIndex('log', ['log', 'seq']);
    database.createObjectStore('logs', { keyPath: 'log' }).createIndex('job', 'job');
    database.createObjectStore('selfTests', { keyPath: 'job' });
    database.createObjectStore('settings');
  },
};

export type Work = Connection<WorkSchema>;
export const openWork = (factory: IDBFactory): Work => new Connection(factory, workSpec);
