import { describe, expect, test } from 'vitest';
import { beatMs } from '../../../src/offline/sender';
import { FakeServer } from '../../support/offline/fakeServer';
import { enrolledDevice, jobId, mara, tomas } from '../../support/offline/enrolled';
import { meddledFactory } from '../../support/offline/meddledFactory';

const note = (words: string) => ({ words });
/** Long enough for whatever a timer or a wake has started: every step of the fakes is a microtask or an immediate. */
const settled = () => new Promise((resolve) => setTimeout(resolve, 60));

/** A device whose server is cut off, with answers kept meanwhile. */
async function cutOff(count: number, people = [mara]) {
  const made = await enrolledDevice(undefined, people);
  const { server, store } = made;
  server.meddle = () => 'cut';
  const entries = [];
  for (let n = 1; n <= count; n += 1)
    for (const { id } of people) entries.push(await store.append(id, jobId, 'note', note(`n${n}`)));
  await store.sendNow();
  server.meddle = () => undefined;
  return { ...made, entries };
}
const idsOnServer = (server: FakeServer) => server.held.map(({ entry }) => entry.id);

describe('sending', () => {
  test('brings every answer over in its order and then holds none back', async () => {
    const { server, store, entries } = await cutOff(4);
    expect(store.sendState()).toMatchObject({ unsent: 4, state: 'waiting', oldestUnsentAt: entries[0]?.at });
    await store.sendNow();
    expect(idsOnServer(server)).toEqual(entries.map(({ id }) => id));
    expect(store.sendState()).toMatchObject({
      unsent: 0,
      state: 'idle',
      oldestUnsentAt: null,
      lastError: null,
    });
    expect(store.sendState().lastSentAt).not.toBeNull();
    expect((await store.job(jobId))?.entries).toHaveLength(4);
  });

  test('sends again what it heard no answer about; the server holds it once', async () => {
    const { server, store, entries } = await cutOff(2);
    server.loseReplies = 1;
    await store.sendNow();
    expect(idsOnServer(server)).toHaveLength(2);
    expect(store.sendState()).toMatchObject({ unsent: 2, state: 'waiting' });
    await store.sendNow();
    expect(idsOnServer(server)).toEqual(entries.map(({ id }) => id));
    expect(store.sendState().unsent).toBe(0);
  });

  test('goes on from the head the server names', async () => {
    const { server, store } = await cutOff(3);
    await store.sendNow();
    // The server was restored from yesterday's backup: it has only the first.
    server.held.splice(1);
    const fourth = await store.append(mara.id, jobId, 'note', note('after'));
    await store.sendNow();
    expect(server.ofLog(fourth.log).map(({ seq }) => seq)).toEqual([1, 2, 3, 4]);
    expect(store.sendState()).toMatchObject({ unsent: 0, needsAttention: [] });
  });

  test('keeps everything when nobody is signed in, says so, and delivers all the same', async () => {
    const { server, store } = await cutOff(2);
    server.session = null;
    await store.sendNow();
    expect(idsOnServer(server)).toHaveLength(2);
    expect(store.sendState()).toMatchObject({ unsent: 0, state: 'needs-sign-in' });
    // A server that wants a session even for delivery gets nothing, and nothing is lost.
    server.meddle = (method) =>
      method === 'POST'
        ? { status: 401, body: { type: 'x', title: 'sign in', status: 401, code: 'unauthenticated' } }
        : undefined;
    await store.append(mara.id, jobId, 'note', note('third'));
    await store.sendNow();
    expect(store.sendState()).toMatchObject({ unsent: 1, state: 'needs-sign-in' });
    server.meddle = () => undefined;
    server.session = mara.id;
    await store.sendNow();
    expect(store.sendState()).toMatchObject({ unsent: 0, state: 'idle' });
    expect(idsOnServer(server)).toHaveLength(3);
  });

  test('a refused entry is kept and shown, those before it and other logs go through', async () => {
    const { server, store, entries } = await cutOff(3, [tomas, mara]);
    const [, , hisSecond] = entries;
    server.refused.add(hisSecond?.id ?? '');
    await store.sendNow();
    expect(server.ofLog(hisSecond?.log ?? '').map(({ seq }) => seq)).toEqual([1]);
    expect(server.held).toHaveLength(4);
    expect(store.sendState()).toMatchObject({ unsent: 2, state: 'waiting' });
    expect(store.sendState().needsAttention).toEqual([
      { entry: hisSecond?.id, job: jobId, says: `no: ${hisSecond?.id}` },
    ]);
    // Asked again it stands alone: one request, not a search for it.
    const before = server.requests.length;
    await store.sendNow();
    expect(server.requests.slice(before).filter(({ method }) => method === 'POST')).toHaveLength(1);
    server.refused.clear();
    await store.sendNow();
    expect(store.sendState()).toMatchObject({ unsent: 0, needsAttention: [], lastError: null });
    expect(server.held).toHaveLength(6);
  });

  test('what is set aside leaves the outbox, is folded nowhere, and comes back when it is taken', async () => {
    const { server, store, entries } = await cutOff(2);
    const [first] = entries;
    server.aside.add(first?.id ?? '');
    await store.sendNow();
    expect(store.sendState().unsent).toBe(0);
    expect(store.sendState().needsAttention).toMatchObject([{ entry: first?.id }]);
    expect((await store.job(jobId))?.entries.map(({ seq }) => seq)).toEqual([2]);
    server.aside.clear();
    if (first) server.held.push({ entry: first, order: server.held.length + 1 });
    await store.sendNow();
    expect(store.sendState().needsAttention).toEqual([]);
    expect((await store.job(jobId))?.entries.map(({ seq }) => seq).sort()).toEqual([1, 2]);
  });

  test('an answer that acknowledges nothing removes nothing', async () => {
    const { server, store } = await cutOff(1);
    server.meddle = (method) => (method === 'POST' ? { status: 200, body: { acknowledged: [] } } : undefined);
    await store.sendNow();
    expect(store.sendState()).toMatchObject({ unsent: 1, state: 'waiting' });
    expect(store.sendState().lastError?.key).toBe('device.store.error.not-acknowledged');
  });

  test.each([
    ['a captive portal', { status: 200, body: '<html>', headers: { 'content-type': 'text/html' } }],
    [
      'a proxy without our server',
      { status: 502, body: 'bad gateway', headers: { 'content-type': 'text/html' } },
    ],
    ['a busy server', { status: 503, body: { type: 'x', title: 'busy', status: 503, code: 'busy' } }],
  ])('%s takes nothing away', async (_name, reply) => {
    const { server, store } = await cutOff(2);
    server.meddle = () => reply;
    await store.sendNow();
    expect(store.sendState()).toMatchObject({ unsent: 2, state: 'waiting', needsAttention: [] });
  });

  test('killed between the copy and the removal it has the answer in both and loses it in none', async () => {
    const { device, server } = await cutOff(2);
    // The removal is the one transaction over entries and attention.
    const factory = meddledFactory(device.indexedDB, (stores, mode) =>
      stores.join() === 'entries,attention' && mode === 'readwrite' ? 'killed' : undefined,
    );
    const killed = device.tab({ indexedDB: factory });
    await Promise.race([killed.sendNow().catch(() => undefined), settled()]);
    await device.kill();
    const disk = device.disk();
    const counts = async () => [
      await disk.outbox.run((database) => database.count('entries')),
      await disk.work.run((database) => database.count('entries')),
    ];
    expect(await counts()).toEqual([2, 2]);
    const reopened = device.tab();
    expect((await reopened.job(jobId))?.entries).toHaveLength(2);
    await reopened.sendNow();
    expect(await counts()).toEqual([0, 2]);
    expect(server.held).toHaveLength(2);
  });

  test('a wiped work database is pulled again from zero; what was unsent stays', async () => {
    const { device, server, store } = await cutOff(5);
    await store.sendNow();
    server.meddle = () => 'cut';
    const unsent = await store.append(mara.id, jobId, 'note', note('only here'));
    await device.kill();
    await new Promise((resolve, reject) => {
      const request = device.indexedDB.deleteDatabase('coldloop-work');
      request.onsuccess = resolve;
      request.onerror = reject;
    });
    const reopened = device.tab();
    expect(await reopened.job(jobId)).toBeUndefined();
    server.meddle = () => undefined;
    await reopened.sendNow();
    const entries = (await reopened.job(jobId))?.entries ?? [];
    expect(entries.map(({ seq }) => seq).sort()).toEqual([1, 2, 3, 4, 5, 6]);
    expect(idsOnServer(server)).toContain(unsent.id);
    const next = await reopened.append(mara.id, jobId, 'note', note('next'));
    expect(next.seq).toBe(7);
  });

  test('never takes a pack that is not what its digest says', async () => {
    const server = new FakeServer();
    const made = await enrolledDevice(server);
    const [pack] = server.packs;
    if (!pack) throw new Error('no pack');
    await made.device.kill();
    const fresh = await enrolledDevice(new FakeServer());
    const forged = { ...pack, revision: 99 };
    fresh.server.packs = [{ ...forged, digest: 'b'.repeat(64) }];
    await fresh.store.sendNow();
    expect((await fresh.store.job(jobId))?.pack.revision).toBe(pack.revision);
    expect(fresh.store.sendState().lastError?.key).toBe('device.store.error.bad-pack');
  });
});

describe('when it sends', () => {
  test('waits with full jitter, longer after each failure, and as long as the server asks', async () => {
    const { device, server, store } = await enrolledDevice();
    const stop = store.start();
    await settled();
    server.meddle = () => 'cut';
    device.jitter = 0.999;
    const waits: number[] = [];
    for (let n = 0; n < 4; n += 1) {
      await store.sendNow();
      waits.push(Math.round((device.clock.nextIn() ?? 0) / 1000));
    }
    expect(waits).toEqual([2, 4, 8, 16]);
    server.meddle = () => ({
      status: 429,
      body: { type: 'x', title: 'slow', status: 429, code: 'too-many' },
      headers: { 'retry-after': '120' },
    });
    await store.sendNow();
    expect(device.clock.nextIn()).toBeGreaterThanOrEqual(120_000);
    const before = server.requests.length;
    await store.sendNow();
    expect(server.requests).toHaveLength(before);
    stop();
    expect(device.clock.nextIn()).toBeUndefined();
  });

  test('goes a moment after a new entry and at once on a wake, every 5 s while a job is watched', async () => {
    const { device, server, store } = await enrolledDevice();
    const stop = store.start();
    await settled();
    await store.append(mara.id, jobId, 'note', note('now'));
    await store.append(mara.id, jobId, 'note', note('and more'));
    const pushes = () => server.requests.filter(({ method }) => method === 'POST').length;
    const pushed = pushes();
    device.clock.pass(beatMs);
    await settled();
    expect(server.held).toHaveLength(2);
    expect(pushes()).toBe(pushed + 1);
    const before = server.requests.length;
    device.wake();
    await settled();
    expect(server.requests.length).toBeGreaterThan(before);
    expect(device.clock.nextIn()).toBe(60_000);
    const letGo = store.watch(jobId);
    expect(device.clock.nextIn()).toBe(5_000);
    letGo();
    expect(device.clock.nextIn()).toBe(60_000);
    stop();
  });

  test('two tabs take turns and both see what one of them sent', async () => {
    const { device, server, store } = await cutOff(3);
    const other = device.tab();
    other.start()();
    await settled();
    expect(other.sendState().unsent).toBe(server.held.length === 3 ? 0 : 3);
    let heard = 0;
    other.subscribe(() => {
      heard += 1;
    });
    await Promise.all([store.sendNow(), other.sendNow()]);
    await settled();
    expect(server.held).toHaveLength(3);
    expect(other.sendState().unsent).toBe(0);
    expect(heard).toBeGreaterThan(0);
  });

  test('does nothing before somebody is enrolled', async () => {
    const { server } = await enrolledDevice();
    const { FakeDevice } = await import('../../support/offline/fakeDevice');
    const before = server.requests.length;
    await new FakeDevice(server).tab().sendNow();
    expect(server.requests).toHaveLength(before);
  });
});

describe('what a sealed job leaves', () => {
  const rowsOf = async (device: Awaited<ReturnType<typeof cutOff>>['device']) => {
    const { work } = device.disk();
    return work.run(async (database) => [
      await database.count('jobs'),
      await database.count('packs'),
      await database.count('entries'),
    ]);
  };

  test.each([
    ['stays while the server still names it', 'sealed', true, [1, 1, 2]],
    ['goes when the server names it no more', 'sealed', false, [0, 0, 0]],
    ['stays when it is only gone from the list', 'signed', false, [1, 1, 2]],
  ])('%s', async (_name, status, named, rows) => {
    const { device, server, store } = await cutOff(2);
    server.status = status;
    await store.sendNow();
    if (!named) server.packs = [];
    await store.sendNow();
    expect(await rowsOf(device)).toEqual(rows);
  });

  test('never goes while an answer of it is unsent', async () => {
    const { device, server, store } = await cutOff(2);
    server.status = 'sealed';
    await store.sendNow();
    server.packs = [];
    const late = await store.append(mara.id, jobId, 'note', note('late'));
    server.refused.add(late.id);
    await store.sendNow();
    expect(store.sendState()).toMatchObject({ unsent: 1 });
    expect((await rowsOf(device))[0]).toBe(1);
    server.refused.clear();
    await store.sendNow();
    expect(store.sendState()).toMatchObject({ unsent: 0 });
  });
});
