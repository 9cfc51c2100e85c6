import { describe, expect, test } from 'vitest';
import { isStrongPin, pinDelayMs } from '../../../src/offline/pin';
import { OtherPersonError, WeakPinError } from '../../../src/offline/types';
import { enrolledDevice, mara, pinOf } from '../../support/offline/enrolled';

const wrong = '000000';

describe('PIN', () => {
  test.each([
    ['six digits', '481516', true],
    ['ten digits', '4815162342', true],
    ['five digits', '48151', false],
    ['letters', 'abcdef', false],
    ['a blank inside', '481 516', false],
  ])('%s', (_name, pin, strong) => {
    expect(isStrongPin(pin)).toBe(strong);
  });

  test.each([
    [0, 0],
    [1, 1_000],
    [2, 2_000],
    [5, 16_000],
    [9, 256_000],
    [10, 300_000],
    [10_000, 300_000],
  ])('%i wrong ones wait %i ms', (count, ms) => {
    expect(pinDelayMs(count)).toBe(ms);
  });

  test('opens with the right one, and is kept only as 600,000 rounds of it', async () => {
    const { device, store } = await enrolledDevice();
    expect(await store.checkPin(mara.id, pinOf)).toEqual({ ok: true });
    const row = await device.disk().outbox.run((database) => database.get('people', mara.id));
    expect(row?.verifier).toMatchObject({ rounds: 600_000 });
    expect(row?.verifier.hash).toHaveLength(32);
    expect(JSON.stringify(row)).not.toContain(pinOf);
  });

  test('a weak one enrols nobody', async () => {
    const { device, store } = await enrolledDevice();
    await expect(store.enrol({ ...mara, id: crypto.randomUUID() }, '12345')).rejects.toThrow(WeakPinError);
    expect(await device.disk().outbox.run((database) => database.count('keys'))).toBe(1);
  });

  test('wrong ones wait longer and longer, the right one waits too, then opens and forgets them', async () => {
    const { device, store } = await enrolledDevice();
    expect(await store.checkPin(mara.id, wrong)).toEqual({ ok: false, waitMs: 1_000 });
    // Before the wait is over not even the right one is looked at.
    expect(await store.checkPin(mara.id, pinOf)).toEqual({ ok: false, waitMs: 1_000 });
    device.clock.pass(1_000);
    expect(await store.checkPin(mara.id, wrong)).toEqual({ ok: false, waitMs: 2_000 });
    device.clock.pass(2_000);
    expect(await store.checkPin(mara.id, pinOf)).toEqual({ ok: true });
    expect(await store.checkPin(mara.id, wrong)).toEqual({ ok: false, waitMs: 1_000 });
  });

  test('neither a reload, nor another tab, nor the clock set on gives a free try', async () => {
    const { device, store } = await enrolledDevice();
    await store.checkPin(mara.id, wrong);
    device.clock.pass(1_000);
    await store.checkPin(mara.id, wrong);
    const other = device.tab();
    expect(await other.checkPin(mara.id, pinOf)).toEqual({ ok: false, waitMs: 2_000 });
    device.clock.setWall(24 * 3_600_000);
    expect(await store.checkPin(mara.id, pinOf)).toEqual({ ok: false, waitMs: 2_000 });
    // Set back a day, the wait is still no longer than it was.
    device.clock.setWall(-48 * 3_600_000);
    expect(await other.checkPin(mara.id, pinOf)).toEqual({ ok: false, waitMs: 2_000 });
    device.clock.pass(2_000);
    device.clock.setWall(48 * 3_600_000);
    expect(await store.checkPin(mara.id, pinOf)).toEqual({ ok: true });
  });

  test('enrolling again sets a new PIN and keeps the key and its log', async () => {
    const { device, server, store } = await enrolledDevice();
    await store.enrol(mara, '999999');
    expect(server.keys.size).toBe(1);
    expect(await store.checkPin(mara.id, '999999')).toEqual({ ok: true });
    expect(await store.people()).toHaveLength(1);
    expect(await device.disk().outbox.run((database) => database.count('keys'))).toBe(1);
  });

  test('a server that does not answer enrols nobody; the next try uses the same key', async () => {
    const { server, store } = await enrolledDevice();
    const other = { ...mara, id: '0190a1b2-0000-7000-8000-0000000000e1' };
    // Signed in as somebody else: the server would give the key to her.
    await expect(store.enrol(other, pinOf)).rejects.toThrow(OtherPersonError);
    expect(server.keys.size).toBe(1);
    server.session = other.id;
    server.loseReplies = 2;
    await expect(store.enrol(other, pinOf)).rejects.toThrow();
    expect(await store.people()).toHaveLength(1);
    server.loseReplies = 0;
    await store.enrol(other, pinOf);
    expect(server.keys.size).toBe(2);
  });
});
