import { webcrypto } from 'node:crypto';
import { describe, expect, test } from 'vitest';
import { entryHash, signedBytes } from '../../../shared/job/entryBytes';
import type { Entry } from '../../../shared/job/entry';
import { NotSavedError } from '../../../src/offline/types';
import { enrolledDevice, jobId, mara, tomas } from '../../support/offline/enrolled';
import { meddledFactory, type Fault } from '../../support/offline/meddledFactory';

const note = (words: string) => ({ words });
const byLog = (entries: Entry[]) => [...entries].sort((a, b) => a.seq - b.seq);

async function codeOf(kept: Promise<unknown>): Promise<string> {
  const error: unknown = await kept.then(
    () => undefined,
    (reason: unknown) => reason,
  );
  return error instanceof NotSavedError ? error.code : `not a NotSavedError: ${String(error)}`;
}

/** Writes to the entries of the outbox meet `faults` one after the other. */
function failing(factory: IDBFactory, faults: Fault[]): IDBFactory {
  return meddledFactory(factory, (stores, mode) =>
    stores.includes('heads') && mode === 'readwrite' ? faults.shift() : undefined,
  );
}

describe('append', () => {
  test('chains what one person says and signs it with the key that was registered', async () => {
    const { server, store } = await enrolledDevice();
    const first = await store.append(mara.id, jobId, 'note', note('one'));
    const second = await store.append(mara.id, jobId, 'note', note('two'));
    expect([first.seq, first.previous]).toEqual([1, null]);
    expect([second.seq, second.previous, second.log]).toEqual([2, entryHash(first), first.log]);
    const [registered] = server.keys.values();
    const key = await webcrypto.subtle.importKey(
      'jwk',
      registered?.publicKey as JsonWebKey,
      { name: 'ECDSA', namedCurve: 'P-256' },
      false,
      ['verify'],
    );
    const verify = (entry: Entry, bytes: Uint8Array) =>
      webcrypto.subtle.verify(
        { name: 'ECDSA', hash: 'SHA-256' },
        key,
        Buffer.from(entry.signature, 'base64url'),
        bytes,
      );
    expect(await verify(second, signedBytes(second))).toBe(true);
    expect(await verify(second, signedBytes({ ...second, body: { words: 'three' } }))).toBe(false);
  });

  test('keeps one chain when two tabs write at once', async () => {
    const { device, server, store } = await enrolledDevice();
    server.meddle = () => 'cut';
    const other = device.tab();
    const words = ['a', 'b', 'c', 'd', 'e', 'f', 'g', 'h'];
    const made = await Promise.all(
      words.map((each, index) => (index % 2 ? store : other).append(mara.id, jobId, 'note', note(each))),
    );
    const chain = byLog(made);
    expect(chain.map(({ seq }) => seq)).toEqual([1, 2, 3, 4, 5, 6, 7, 8]);
    for (const [index, entry] of chain.entries()) {
      const before = chain[index - 1];
      expect(entry.previous).toBe(before ? entryHash(before) : null);
    }
    expect((await store.job(jobId))?.entries).toHaveLength(8);
  });

  test('leaves nothing behind when the page is killed before it writes', async () => {
    const { device, server, store } = await enrolledDevice();
    server.meddle = () => 'cut';
    const killed = device.tab({ indexedDB: failing(device.indexedDB, ['killed']) });
    const outcome = await Promise.race([
      killed.append(mara.id, jobId, 'note', note('never')).catch(() => 'not kept'),
      new Promise((resolve) => setTimeout(resolve, 50, 'silence')),
    ]);
    expect(['silence', 'not kept']).toContain(outcome);
    expect((await device.tab().job(jobId))?.entries).toEqual([]);
    expect((await store.append(mara.id, jobId, 'note', note('next'))).seq).toBe(1);
  });

  test('finds what it kept when the page is killed right after the write', async () => {
    const { device, server, store } = await enrolledDevice();
    server.meddle = () => 'cut';
    const entry = await store.append(mara.id, jobId, 'note', note('kept'));
    await device.kill();
    const reopened = device.tab();
    expect((await reopened.job(jobId))?.entries).toEqual([entry]);
    reopened.start();
    const next = await reopened.append(mara.id, jobId, 'note', note('next'));
    expect([next.seq, next.previous]).toEqual([2, entryHash(entry)]);
    expect(reopened.sendState().unsent).toBe(2);
  });

  const faults: [string, Fault[], string][] = [
    ['a full disk is said and nothing is kept', ['quota'], 'quota'],
    ['a lost connection is opened again, once', ['lost'], 'kept'],
    ['a connection lost twice is said', ['lost', 'lost'], 'closed'],
  ];
  test.each(faults)('%s', async (_name, meddled, expected) => {
    const { device, server } = await enrolledDevice();
    server.meddle = () => 'cut';
    const tab = device.tab({ indexedDB: failing(device.indexedDB, meddled) });
    const kept = tab.append(mara.id, jobId, 'note', note('words'));
    if (expected === 'kept') expect((await kept).seq).toBe(1);
    else expect(await codeOf(kept)).toBe(expected);
    const held = (await device.tab().job(jobId))?.entries ?? [];
    expect(held).toHaveLength(expected === 'kept' ? 1 : 0);
    // Whatever happened, the same answer can be saved again and the chain is whole.
    expect((await tab.append(mara.id, jobId, 'note', note('words'))).seq).toBe(held.length + 1);
  });

  const noKey = '0190a1b2-0000-7000-8000-00000000dead';
  const noJob = '0190a1b2-0000-7000-8000-00000000beef';
  test.each([
    ['somebody without a key here', noKey, jobId, 'note', 'no-key'],
    ['a job that is not here', mara.id, noJob, 'note', 'no-pack'],
  ] as const)('refuses %s', async (_name, person, job, kind, code) => {
    const { store } = await enrolledDevice();
    expect(await codeOf(store.append(person, job, kind, note('words')))).toBe(code);
  });

  test('refuses an entry over 64 kB and a body that is not one', async () => {
    const { store } = await enrolledDevice();
    const strokes = Array.from({ length: 400 }, () =>
      Array.from({ length: 20 }, (): [number, number, number] => [0.123456, 0.654321, 0.5]),
    );
    const signed = {
      name: mara.name,
      zone: 'Europe/Lisbon',
      meaning: 'done',
      digest: 'a'.repeat(64),
      language: 'en' as const,
      steps: ['s'],
      picture: { strokes },
    };
    expect(await codeOf(store.append(mara.id, jobId, 'signed', signed))).toBe('too-big');
    await expect(store.append(mara.id, jobId, 'note', { words: '' })).rejects.toThrow(/words/);
    expect((await store.job(jobId))?.entries).toEqual([]);
  });

  test('names what it had seen of the other logs, never its own', async () => {
    const { store, server } = await enrolledDevice(undefined, [tomas, mara]);
    server.meddle = () => 'cut';
    const his = await store.append(tomas.id, jobId, 'note', note('his'));
    const hers = await store.append(mara.id, jobId, 'note', note('hers'));
    const again = await store.append(mara.id, jobId, 'note', note('hers again'));
    expect([his.seen, hers.seen, again.seen]).toEqual([{}, { [his.log]: 1 }, { [his.log]: 1 }]);
  });

  test('keeps what one person says after all of the other on the same phone was sent', async () => {
    const { store, server } = await enrolledDevice(undefined, [tomas, mara]);
    const his = await store.append(tomas.id, jobId, 'note', note('his'));
    await store.sendNow();
    expect(server.held).toHaveLength(1);
    const hers = await store.append(mara.id, jobId, 'note', note('hers'));
    expect(hers.seen).toEqual({ [his.log]: 1 });
  });
});
