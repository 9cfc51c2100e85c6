/** What is unsent and since when, kept in memory so that a screen can ask without waiting. */
import type { Databases } from './databases';
import type { SendState } from './types';

export const nothingUnsent: SendState = {
  unsent: 0,
  oldestUnsentAt: null,
  state: 'idle',
  lastSentAt: null,
  lastError: null,
  needsAttention: [],
};

const lastSentKey = 'last-sent';

/** The stored half of the send state, read afresh. */
export async function readSendStatus({ outbox, work }: Databases) {
  const stored = await outbox.run(async (database) => {
    const transaction = database.transaction(['entries', 'attention']);
    const unsent = await transaction.objectStore('entries').count();
    // Ids are UUIDs of version 7, which sort by their time of making.
    const oldest = await transaction.objectStore('entries').openCursor();
    const attention = await transaction.objectStore('attention').getAll();
    return {
      unsent,
      oldestUnsentAt: oldest?.value.at ?? null,
      needsAttention: attention.map(({ entry, job, says }) => ({ entry, job, says })),
    };
  });
  const lastSentAt = await work.run((database) => database.get('settings', lastSentKey));
  return { ...stored, lastSentAt: typeof lastSentAt === 'string' ? lastSentAt : null };
}

export async function rememberSent({ work }: Databases, at: string): Promise<void> {
  await work.run((database) => database.put('settings', at, lastSentKey));
}
