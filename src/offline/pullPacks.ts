/** Pulls the packs of the signed-in person's jobs that this device does not have yet. */
import { packList } from '../../shared/api/deviceWire';
import type { Databases } from './databases';
import type { DeviceEnvironment } from './environment';
import { packIntegrity, type PackVerdict } from './packIntegrity';
import { done, outcomeOf, type RoundOutcome } from './roundOutcome';
import { serverCall } from './serverCall';

const errorKeys = {
  'not-a-pack': 'device.store.error.bad-pack',
  digest: 'device.store.error.bad-pack',
  newer: 'device.store.error.update-app',
} as const;

/** A job's row moves to a pack only when that pack is here; until then its old one stays in use. */
async function store(
  { work }: Databases,
  packs: PackVerdict[],
  current: { job: string; digest: string; status: string }[],
): Promise<void> {
  await work.write(['packs', 'jobs'], async (transaction) => {
    const rows = transaction.objectStore('jobs');
    for (const verdict of packs) if (verdict.ok) await transaction.objectStore('packs').put(verdict.pack);
    for (const { job, digest, status } of current) {
      const row = await rows.get(job);
      const here = (await transaction.objectStore('packs').getKey(digest)) !== undefined;
      if (here && row) await rows.put({ ...row, status, pack: digest });
      else if (here) await rows.put({ job, status, pack: digest, after: 0, pulledAt: null, vector: {} });
      else if (row) await rows.put({ ...row, status });
    }
  });
}

/** Answers how it ended and which jobs are the person's now; null when the server did not say. */
export async function pullPacks(
  env: DeviceEnvironment,
  databases: Databases,
): Promise<{ outcome: RoundOutcome; jobs: string[] | null }> {
  const have = await databases.work.run((database) => database.getAllKeys('packs'));
  const answer = await serverCall(env, packList, `/api/my/packs?have=${have.join(',')}`);
  if (answer.kind !== 'ok') return { outcome: outcomeOf(answer), jobs: null };
  const verdicts = answer.value.packs.map(packIntegrity);
  await store(databases, verdicts, answer.value.current);
  const [bad] = verdicts.filter((verdict) => !verdict.ok);
  const outcome: RoundOutcome = bad ? { end: 'refused', says: { key: errorKeys[bad.why] } } : done;
  return { outcome, jobs: answer.value.current.map(({ job }) => job) };
}
