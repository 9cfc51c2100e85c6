/** Did the browser promise to keep what is stored, or did a person accept that it does not? */
import { say } from '../../shared/panel/says';
import type { DeviceEnvironment } from './environment';
import type { Outbox } from './outboxDatabase';
import type { Readiness } from './types';

const key = 'storage-warning';
type Warning = 'shown' | 'accepted';

const warningOf = async (outbox: Outbox): Promise<Warning | undefined> =>
  (await outbox.run((database) => database.get('settings', key))) as Warning | undefined;

/** Persisted, or the warning accepted; else asks for persistence, then, once that was refused, for the acceptance. */
export async function storageCheck(
  { storage }: DeviceEnvironment,
  outbox: Outbox,
): Promise<Readiness['checks'][number]> {
  if (await storage.persisted())
    return { check: 'storage', ok: true, says: say('device.store.ready.storage.kept') };
  const warning = await warningOf(outbox);
  if (warning === 'accepted')
    return { check: 'storage', ok: true, says: say('device.store.ready.storage.accepted') };
  const step = warning === 'shown' ? 'warn' : 'ask';
  return {
    check: 'storage',
    ok: false,
    says: say(`device.store.ready.storage.${step}`),
    button: say(`device.store.ready.storage.${step}.button`),
  };
}

/** First asks the browser; where that was refused before, this call is the person's acceptance of the warning. */
export async function fixStorage({ storage }: DeviceEnvironment, outbox: Outbox): Promise<void> {
  if (await storage.persisted()) return;
  const next: Warning = (await warningOf(outbox)) === 'shown' ? 'accepted' : 'shown';
  if (next === 'shown' && (await storage.persist())) return;
  await outbox.write(['settings'], async (transaction) => {
    await transaction.objectStore('settings').put(next, key);
  });
}
