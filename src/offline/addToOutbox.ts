/** Writes a signed entry and its log's new head in one strict transaction, unless the log has moved on meanwhile. */
import type { Entry } from '../../shared/job/entry';
import type { LogHead, Outbox } from './outboxDatabase';
import { NotSavedError } from './types';

/** Ends the transaction with nothing written by it. */
class LeftAsItWas extends Error {
  constructor(readonly isKept: boolean) {
    super('nothing was written');
  }
}

/** Throws unless the entry may follow `base`, seen from inside the transaction that writes it. */
function compare(current: LogHead | undefined, base: LogHead | undefined, head: LogHead, key?: string): void {
  // The same hash already there: the first try was kept and only its connection was lost.
  if (current?.hash === head.hash) throw new LeftAsItWas(true);
  if (key === undefined) throw new NotSavedError('no-key', 'the key is no longer on this device');
  if (current?.hash !== base?.hash) throw new LeftAsItWas(false);
}

/** False when the log has moved on since `base` was read: nothing was written then. */
export async function addToOutbox(
  outbox: Outbox,
  entry: Entry,
  base: LogHead | undefined,
  head: LogHead,
): Promise<boolean> {
  try {
    await outbox.write(['entries', 'heads', 'keys'], async (transaction) => {
      const heads = transaction.objectStore('heads');
      // All are asked for at once, in this order: one way to the disk and back instead of three.
      const held = Promise.all([heads.get(entry.log), transaction.objectStore('keys').getKey(head.key)]);
      const written = Promise.all([transaction.objectStore('entries').add(entry), heads.put(head)]);
      written.catch(() => undefined);
      const [current, key] = await held;
      compare(current, base, head, key);
      await written;
    });
    return true;
  } catch (error) {
    if (error instanceof LeftAsItWas) return error.isKept;
    throw error;
  }
}
