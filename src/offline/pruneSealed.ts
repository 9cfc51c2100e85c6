/** Frees what a sealed job held on this device, once nobody here works on it and nothing of it is unsent. */
import type { Databases } from './databases';

async function hasUnsent({ outbox }: Databases, job: string): Promise<boolean> {
  return outbox.run(async (database) => {
    const [entries, photos] = await Promise.all([
      database.countFromIndex('entries', 'job', job),
      database.countFromIndex('photos', 'job', job),
    ]);
    return entries + photos > 0;
  });
}

async function prune({ work }: Databases, job: string): Promise<void> {
  await work.write(['jobs', 'packs', 'entries', 'logs', 'selfTests'], async (transaction) => {
    const row = await transaction.objectStore('jobs').get(job);
    // Only the server knows that a job is sealed, and it may have learnt better meanwhile.
    if (row?.status !== 'sealed') return;
    for (const store of ['entries', 'logs'] as const) {
      const keys = await transaction.objectStore(store).index('job').getAllKeys(job);
      for (const key of keys) await transaction.objectStore(store).delete(key);
    }
    await transaction.objectStore('packs').delete(row.pack);
    await transaction.objectStore('selfTests').delete(job);
    await transaction.objectStore('jobs').delete(job);
  });
}

/** @param current the jobs that the server still names as the signed-in person's: they stay, whatever their state */
export async function pruneSealed(databases: Databases, current: readonly string[]): Promise<void> {
  const rows = await databases.work.run((database) => database.getAll('jobs'));
  for (const { job, status } of rows)
    if (status === 'sealed' && !current.includes(job) && !(await hasUnsent(databases, job)))
      await prune(databases, job);
}
