import { expect, test } from 'vitest';
import { z } from 'zod';
import { entryEnvelope } from '../../../shared/job/entry';
import { logId } from '../../../shared/job/logId';
import { enrolledDevice, jobId, mara, tomas } from '../../support/offline/enrolled';

const file = z.strictObject({
  format: z.literal('coldloop-entries/1'),
  device: z.uuid(),
  exportedAt: z.iso.datetime(),
  logs: z.record(z.uuid(), z.uuid()),
  entries: z.array(entryEnvelope),
});

test('the file holds what is only on this device, of everybody, and the keys that signed it', async () => {
  const { server, store } = await enrolledDevice(undefined, [tomas, mara]);
  await store.append(mara.id, jobId, 'note', { words: 'sent' });
  await store.sendNow();
  server.meddle = () => 'cut';
  const unsent = [
    await store.append(mara.id, jobId, 'note', { words: 'hers' }),
    await store.append(tomas.id, jobId, 'note', { words: 'his' }),
  ];
  const exported = file.parse(JSON.parse(await store.exportUnsent()));
  expect(exported.entries.map(({ id }) => id).sort()).toEqual(unsent.map(({ id }) => id).sort());
  expect(exported.device).toBe(await store.deviceId());
  for (const [log, key] of Object.entries(exported.logs)) expect(logId(jobId, key)).toBe(log);
  expect(Object.keys(exported.logs).sort()).toEqual(unsent.map(({ log }) => log).sort());
  // Written, not taken away: it stays until the server has it.
  expect(store.sendState().unsent).toBe(2);
});
