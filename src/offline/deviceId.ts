/** The name of this device: made once, kept with the keys, lost with them. */
import { v7 } from 'uuid';
import type { DeviceEnvironment } from './environment';
import type { Outbox } from './outboxDatabase';

const key = 'device';

/** One transaction, so two tabs that start together agree. */
export async function deviceId(env: DeviceEnvironment, outbox: Outbox): Promise<string> {
  const made = v7({ msecs: env.now(), random: env.randomBytes(16) });
  return outbox.write(['settings'], async (transaction) => {
    const settings = transaction.objectStore('settings');
    const kept = await settings.get(key);
    if (typeof kept === 'string') return kept;
    await settings.put(made, key);
    return made;
  });
}
