import { describe, expect, test } from 'vitest';
import { en } from '../../../shared/wording/en';
import type { LocalDeviceStore } from '../../../src/offline/deviceStore';
import type { ReadinessCheck } from '../../../src/offline/types';
import { enrolledDevice, jobId } from '../../support/offline/enrolled';

async function missing(store: LocalDeviceStore): Promise<ReadinessCheck[]> {
  const { ready, checks } = await store.readiness(jobId);
  const failed = checks.filter(({ ok }) => !ok);
  expect(ready).toBe(failed.length === 0);
  for (const { says, button } of checks)
    for (const text of [says, ...(button ? [button] : [])]) expect(Object.keys(en)).toContain(text.key);
  return failed.map(({ check }) => check);
}

async function readyDevice() {
  const made = await enrolledDevice();
  made.device.storage.persisted = true;
  await made.store.fix(jobId, 'self-test');
  expect(await missing(made.store)).toEqual([]);
  return made;
}

describe('works with no signal', () => {
  test('only when every check was computed and holds', async () => {
    const { device, store } = await enrolledDevice();
    expect(await missing(store)).toEqual(['storage', 'self-test']);
    device.storage.grants = true;
    await store.fix(jobId, 'storage');
    expect(await missing(store)).toEqual(['self-test']);
    await store.fix(jobId, 'self-test');
    expect(await missing(store)).toEqual([]);
  });

  test('not without the app’s own files, nor after they changed since the test', async () => {
    const { device, store } = await readyDevice();
    device.shell.version = null;
    expect(await missing(store)).toEqual(['shell', 'self-test']);
    await store.fix(jobId, 'shell');
    expect(device.shell.mended).toBe(1);
    device.shell.version = 'shell-2';
    expect(await missing(store)).toEqual(['self-test']);
  });

  test('not after a newer pack came', async () => {
    const { server, store } = await readyDevice();
    const { digestOf } = await import('../../../shared/panel/canonical');
    server.packs = server.packs.map(({ digest: _digest, ...pack }) => {
      const newer = { ...pack, revision: pack.revision + 1 };
      return { ...newer, digest: digestOf(newer) };
    });
    await store.sendNow();
    expect(await missing(store)).toEqual(['self-test']);
  });

  test('not with a pack that was changed on the disk', async () => {
    const { device } = await readyDevice();
    await device.disk().work.write(['packs'], async (transaction) => {
      const [pack] = await transaction.objectStore('packs').getAll();
      if (pack) await transaction.objectStore('packs').put({ ...pack, revision: 42 });
    });
    expect(await missing(device.tab())).toEqual(['pack']);
  });

  test('not when the test cannot open the app, and says why', async () => {
    const { device, store } = await readyDevice();
    device.shell.version = 'shell-2';
    device.shell.opens = false;
    await store.fix(jobId, 'self-test');
    const { checks } = await store.readiness(jobId);
    expect(checks.find(({ check }) => check === 'self-test')).toMatchObject({
      ok: false,
      says: { key: 'device.store.ready.test.shell' },
    });
  });

  test('not when nobody of the job has a PIN here', async () => {
    const { device, store } = await readyDevice();
    await device.disk().outbox.write(['people'], (transaction) => transaction.objectStore('people').clear());
    expect(await missing(store)).toEqual(['pin']);
  });

  test('asks for lasting storage first; only a person accepts the risk when the browser refuses', async () => {
    const { device, store } = await enrolledDevice();
    const asked = device.storage.asked;
    const said = async () => (await store.readiness(jobId)).checks.find(({ check }) => check === 'storage');
    expect((await said())?.says.key).toBe('device.store.ready.storage.ask');
    await store.fix(jobId, 'storage');
    expect(device.storage.asked).toBe(asked + 1);
    expect(await said()).toMatchObject({ ok: false, says: { key: 'device.store.ready.storage.warn' } });
    await store.fix(jobId, 'storage');
    expect(await said()).toMatchObject({ ok: true, says: { key: 'device.store.ready.storage.accepted' } });
  });

  test('says so of a job that is not here', async () => {
    const { store } = await enrolledDevice();
    const { ready, checks } = await store.readiness('0190a1b2-0000-7000-8000-00000000beef');
    expect(ready).toBe(false);
    expect(checks.find(({ check }) => check === 'pack')?.ok).toBe(false);
  });
});

test('storage is told in megabytes', async () => {
  const { store } = await enrolledDevice();
  expect(await store.storage()).toEqual({ persisted: false, usedMB: 2.5, freeMB: 1000 });
});
