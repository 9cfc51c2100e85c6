import 'fake-indexeddb/auto';
import { IDBFactory } from 'fake-indexeddb';
import type { DBSchema } from 'idb';
import { describe, expect, test } from 'vitest';
import { Connection, DatabaseBlockedError } from '../../../src/offline/connection';
import { notSaved } from '../../../src/offline/notSaved';
import { outboxSpec } from '../../../src/offline/outboxDatabase';
import { NotSavedError } from '../../../src/offline/types';
import { workSpec } from '../../../src/offline/workDatabase';

interface Plain extends DBSchema {
  things: { key: string; value: string };
}
const spec = (version: number) => ({
  name: 'plain',
  version,
  upgrade: (database: { objectStoreNames: DOMStringList; createObjectStore(name: 'things'): unknown }) => {
    if (!database.objectStoreNames.contains('things')) database.createObjectStore('things');
  },
});
const connect = (factory: IDBFactory, version = 1) => new Connection<Plain>(factory, spec(version));
const put = (connection: Connection<Plain>, key: string) =>
  connection.write(['things'], (transaction) =>
    transaction.objectStore('things').put(`value of ${key}`, key),
  );

describe('a connection', () => {
  test('gives way when another tab brings a newer version, which then opens', async () => {
    const factory = new IDBFactory();
    const old = connect(factory);
    await put(old, 'a');
    const newer = connect(factory, 2);
    await put(newer, 'b');
    expect(await newer.run((database) => database.getAllKeys('things'))).toEqual(['a', 'b']);
    // The old tab is told; it is not left to hang or to write by the old rules.
    await expect(put(old, 'c')).rejects.toMatchObject({ name: 'VersionError' });
  });

  test('says that it is blocked by a tab that does not give way, and blocks nobody itself afterwards', async () => {
    const factory = new IDBFactory();
    const stubborn = await new Promise<IDBDatabase>((resolve) => {
      const request = factory.open('plain', 1);
      request.onsuccess = () => {
        resolve(request.result);
      };
    });
    const newer = connect(factory, 2);
    const fault = await put(newer, 'a').catch((error: unknown) => error);
    expect(fault).toBeInstanceOf(DatabaseBlockedError);
    expect(notSaved(fault)).toMatchObject({ code: 'locked' });
    stubborn.close();
    await put(newer, 'a');
    await put(connect(factory, 3), 'b');
  });

  test('opens once however many ask at the same time', async () => {
    const factory = new IDBFactory();
    let opened = 0;
    const counting = {
      open: (name: string, version?: number) => {
        opened += 1;
        return factory.open(name, version);
      },
    } as IDBFactory;
    const connection = connect(counting);
    await Promise.all(['a', 'b', 'c', 'd'].map((key) => put(connection, key)));
    expect(opened).toBe(1);
  });

  test('a fault inside a transaction undoes all of it and comes out as itself', async () => {
    const connection = connect(new IDBFactory());
    const work = connection.write(['things'], async (transaction) => {
      await transaction.objectStore('things').put('half', 'a');
      throw new RangeError('ours');
    });
    await expect(work).rejects.toBeInstanceOf(RangeError);
    expect(await connection.run((database) => database.count('things'))).toBe(0);
  });
});

test.each([
  ['QuotaExceededError', 'quota'],
  ['InvalidStateError', 'closed'],
  ['AbortError', 'closed'],
  ['UnknownError', 'closed'],
  ['DataCloneError', 'unknown'],
])('%s is told as %s', (name, code) => {
  const said = notSaved(new DOMException('from the browser', name));
  expect(said).toBeInstanceOf(NotSavedError);
  expect(said.code).toBe(code);
});

test('the outbox is of version 1 for ever, and its stores are what they were', async () => {
  expect([outboxSpec.version, workSpec.name === outboxSpec.name]).toEqual([1, false]);
  const stores = await new Connection(new IDBFactory(), outboxSpec).run((database) =>
    Promise.resolve([...database.objectStoreNames]),
  );
  expect(stores).toEqual(['attention', 'entries', 'heads', 'keys', 'people', 'photos', 'settings']);
});
