/** Writes what is only on this phone as a file that the server takes from anybody: the signatures are the proof. */
import type { Databases } from './databases';
import type { DeviceEnvironment } from './environment';
import { deviceId } from './deviceId';

/** JSON text of `*.coldloop-entries.json`. */
export async function exportUnsent(env: DeviceEnvironment, databases: Databases): Promise<string> {
  const { outbox } = databases;
  const entries = await outbox.run((database) => database.getAll('entries'));
  const heads = await outbox.run((database) => database.getAll('heads'));
  const used = new Set(entries.map(({ log }) => log));
  const file = {
    format: 'coldloop-entries/1',
    device: await deviceId(env, outbox),
    exportedAt: new Date(env.now()).toISOString(),
    logs: Object.fromEntries(heads.filter(({ log }) => used.has(log)).map(({ log, key }) => [log, key])),
    entries,
  };
  return JSON.stringify(file, null, 1);
}
