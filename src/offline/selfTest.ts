/** Opens a job as a cold start without a network does, and remembers for which files and pack that was seen. */
import type { Pack } from '../../shared/api/jobs';
import { textsOf } from '../../shared/checklist/textsOf';
import { foldJob } from '../../shared/job/fold';
import { renderWith } from '../../shared/wording/renderWith';
import type { Databases } from './databases';
import type { DeviceEnvironment } from './environment';
import { localJob } from './localJobs';
import { packIntegrity } from './packIntegrity';

/** Every sentence of every step in both languages, from what the pack carries alone; throws when one cannot be said. */
function readAll({ checklist, wording }: Pack): void {
  for (const step of checklist.steps)
    for (const text of textsOf(step))
      for (const language of ['en', 'es'] as const) renderWith([wording[language]], language, text);
}

type Opened = { pack: string } | { fault: string };

/** The pack that opened with the network refused, or the wording key of why none did. */
async function open(env: DeviceEnvironment, databases: Databases, job: string): Promise<Opened> {
  if (!(await env.shell.opensOffline())) return { fault: 'device.store.ready.test.shell' };
  const local = await localJob(databases, job);
  if (!local || !packIntegrity(local.pack).ok) return { fault: 'device.store.ready.test.pack' };
  readAll(local.pack);
  foldJob(local.pack.checklist, local.entries, local.facts);
  return { pack: local.pack.digest };
}

/**
 * Nothing here asks the network: the worker answers from its cache, the job comes from the store.
 * @returns a wording key that says why it failed; null when the job opened
 */
export async function selfTest(
  env: DeviceEnvironment,
  databases: Databases,
  job: string,
): Promise<string | null> {
  const shell = await env.shell.version();
  if (shell === null) return 'device.store.ready.test.shell';
  const opened = await open(env, databases, job).catch(() => ({ fault: 'device.store.ready.test.fault' }));
  if ('fault' in opened) return opened.fault;
  await databases.work.write(['selfTests'], async (transaction) => {
    const at = new Date(env.now()).toISOString();
    await transaction.objectStore('selfTests').put({ job, pack: opened.pack, shell, at });
  });
  return null;
}
