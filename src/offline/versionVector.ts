/** What this device holds of the other logs of a job, as an entry made now has seen it. */
import type { Databases } from './databases';

/**
 * log → seq of every log but `own`. Counts only what is here without a hole: claiming less than was seen can
 * only keep a gate shut, claiming more could open one.
 */
export async function versionVector(
  { outbox, work }: Databases,
  job: string,
  own: string,
): Promise<Record<string, number>> {
  const row = await work.run((database) => database.get('jobs', job));
  const seen: Record<string, number> = { ...row?.vector };
  const heads = await outbox.run((database) => database.getAllFromIndex('heads', 'job', job));
  for (const head of heads) {
    if (head.log === own) continue;
    const from = (seen[head.log] ?? 0) + 1;
    const here = await outbox.run((database) =>
      database.countFromIndex('entries', 'log', IDBKeyRange.bound([head.log, from], [head.log, head.seq])),
    );
    if (from <= head.seq && here === head.seq - from + 1) seen[head.log] = head.seq;
  }
  return Object.fromEntries(Object.entries(seen).filter(([log]) => log !== own));
}
