import { describe, expect, test } from 'vitest';
import { entryHash } from '../../../shared/job/entryBytes';
import { digestOf } from '../../../shared/panel/canonical';
import { folded } from '../../../src/features/fieldwork/job/folded';
import { enrolledDevice, jobId, mara, tomas } from '../../support/offline/enrolled';
import { samplePack } from '../../support/fieldHarness/samplePack';
import { meddledFactory } from '../../support/offline/meddledFactory';

const note = (words: string) => ({ words });
/** Messages of the other tab and the readings they start. */
const settled = () => new Promise((resolve) => setTimeout(resolve, 60));

async function offlineDevice(people = [mara]) {
  const made = await enrolledDevice(undefined, people);
  made.server.meddle = () => 'cut';
  return made;
}

describe('what an answer is built on', () => {
  test('is read for the first answer; each further one opens a single transaction', async () => {
    const { device } = await offlineDevice();
    const opened: string[] = [];
    const counted = meddledFactory(device.indexedDB, (stores, mode) => {
      opened.push(`${mode} ${stores.join(' ')}`);
      return undefined;
    });
    const tab = device.tab({ indexedDB: counted });
    await tab.append(mara.id, jobId, 'note', note('one'));
    await settled();
    opened.length = 0;
    await tab.append(mara.id, jobId, 'note', note('two'));
    await tab.append(mara.id, jobId, 'note', note('three'));
    expect(opened).toEqual(Array(2).fill('readwrite entries heads keys'));
  });

  test('follows what another tab wrote, even before its message arrives', async () => {
    const { device, store } = await offlineDevice();
    const silent = device.tab({ openChannel: () => ({ post: () => {}, listen: () => {}, close: () => {} }) });
    const first = await store.append(mara.id, jobId, 'note', note('here'));
    const second = await silent.append(mara.id, jobId, 'note', note('there'));
    const third = await store.append(mara.id, jobId, 'note', note('here again'));
    expect([second.previous, third.previous]).toEqual([entryHash(first), entryHash(second)]);
    expect([second.seq, third.seq]).toEqual([2, 3]);
  });

  test('names the pack and the entries that another tab has pulled', async () => {
    const { device, server, store } = await enrolledDevice(undefined, [tomas, mara]);
    server.meddle = () => 'cut';
    const before = await store.append(mara.id, jobId, 'note', note('before'));
    const other = device.tab();
    const his = await other.append(tomas.id, jobId, 'note', note('his'));
    const { digest: _, ...rest } = { ...samplePack, revision: samplePack.revision + 1 };
    const newer = { ...rest, digest: digestOf(rest) };
    server.packs = [newer];
    server.meddle = () => undefined;
    await other.sendNow();
    await settled();
    const after = await store.append(mara.id, jobId, 'note', note('after'));
    expect([before.pack, after.pack]).toEqual([samplePack.digest, newer.digest]);
    expect([before.seen, after.seen]).toEqual([{}, { [his.log]: 1 }]);
  });

  test('is not believed once its key is gone from the device', async () => {
    const { device, store } = await offlineDevice();
    await store.job(jobId);
    await store.append(mara.id, jobId, 'note', note('kept'));
    await device.disk().outbox.run(async (database) => {
      await database.clear('keys');
      await database.clear('heads');
    });
    await expect(store.append(mara.id, jobId, 'note', note('lost'))).rejects.toMatchObject({
      code: 'no-key',
    });
    const disk = await device.disk().outbox.run((database) => database.getAll('entries'));
    expect(disk.map(({ body }) => body)).toEqual([note('kept')]);
  });
});

describe('what the screens read after an answer', () => {
  test('has the answer at once, with everything known before untouched', async () => {
    const { store } = await offlineDevice();
    const first = await store.append(mara.id, jobId, 'note', note('one'));
    const before = await store.job(jobId);
    const second = await store.append(mara.id, jobId, 'note', note('two'));
    const after = await store.job(jobId);
    expect(after?.entries).toEqual([first, second]);
    expect(after?.entries[0]).toBe(before?.entries[0]);
    expect(before?.entries).toEqual([first]);
    expect(store.sendState()).toMatchObject({ unsent: 2, oldestUnsentAt: first.at });
  });

  test('folds again only when a reading brought something else', async () => {
    const { device, server, store } = await enrolledDevice();
    await store.append(mara.id, jobId, 'note', note('one'));
    await store.sendNow();
    const sent = await store.job(jobId);
    device.clock.pass(5_000);
    await store.sendNow();
    const again = await store.job(jobId);
    if (!sent || !again) throw new Error('the job is not held');
    expect(again.pulledAt).not.toBe(sent.pulledAt);
    expect(folded(again)).toBe(folded(sent));
    server.meddle = () => 'cut';
    await store.append(mara.id, jobId, 'note', note('two'));
    const grown = await store.job(jobId);
    if (!grown) throw new Error('the job is not held');
    expect(folded(grown).notes).toHaveLength(2);
  });
});
