/** What this device holds of the other logs of a job, as an entry made now has seen it. */
import type { Databases } from './databases';
import type { WorkJob } from './workDatabase';

/**
 * log → seq of every log but `own`. Counts only what is here without a hole: claiming less than was seen can
 * only keep a gate shut, claiming more could open one.
 */
export async function versionVector(
  { outbox }: Pick<Databases, 'outbox'>,
  { job, vector }: Pick<WorkJob, 'job' | 'vector'>,
  own: string,
): Promise<Record<string, number>> {
  const seen: Record<string, number> = { ...vector };
  const heads = await outbox.run((database) => database.getAllFromIndex('heads', 'job', job));
  for (const head of heads) {
    const from = (seen[head.log] ?? 0) + 1;
    // All of it acknowledged and counted above: there is nothing to count, and no key range for nothing.
    if (head.log === own || from > head.seq) continue;
    const here = await outbox.run((database) =>
      database.countFromIndex('entries', 'log', IDBKeyRange.bound([head.log, from], [head.log, head.seq])),
    );
    if (here === head.seq - from + 1) seen[head.log] = head.seq;
  }
  return Object.fromEntries(Object.entries(seen).filter(([log]) => log !== own));
}
