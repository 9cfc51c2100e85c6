/** Moves acknowledged entries from the outbox to the work database; a cut at any moment leaves them in one or both. */
import type { Databases } from './databases';
import { keepEntries, type HeldEntry } from './keepEntries';

async function copyToWork({ work }: Databases, job: string, held: HeldEntry[]): Promise<void> {
  await work.write(['jobs', 'entries', 'logs'], async (transaction) => {
    // Without the job's row the vector has nowhere to live; the pull that brings the row counts again.
    const row = (await transaction.objectStore('jobs').get(job)) ?? {
      job,
      status: '',
      pack: '',
      after: 0,
      pulledAt: null,
      vector: {},
    };
    const moved = await keepEntries(transaction, row, held);
    if (row.pack !== '') await transaction.objectStore('jobs').put(moved);
  });
}

async function dropFromOutbox({ outbox }: Databases, ids: string[]): Promise<void> {
  await outbox.write(['entries', 'attention'], async (transaction) => {
    for (const id of ids) {
      await transaction.objectStore('entries').delete(id);
      await transaction.objectStore('attention').delete(id);
    }
  });
}

/** First the copy, wholly on disk; only then the removal. Both may be repeated. */
export async function acknowledge(databases: Databases, job: string, held: HeldEntry[]): Promise<void> {
  if (held.length === 0) return;
  await copyToWork(databases, job, held);
  await dropFromOutbox(
    databases,
    held.map(({ entry }) => entry.id),
  );
}
