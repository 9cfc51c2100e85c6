/** Jobs in every state, worked through the way people do: with keys, locks, readings, a fault, a return, signatures. */
import { v7 } from 'uuid';
import type { Services } from '../../services';
import { demoActor, idOf, type DemoIds } from './demoActor';
import { demoPeople } from './people';
import { demoStories, type DemoStory } from './stories';
import type { DemoPanel } from './seedPanels';
import { DemoJob } from './played/demoJob';
import { newKey, type SigningKey } from './played/signingKey';

const hourMs = 60 * 60 * 1000;
const dayMs = 24 * hourMs;
const atDate = (days: number): string => new Date(Date.now() + days * dayMs).toISOString().slice(0, 10);

/** A key for each who works or countersigns, by person id. */
async function enrolAll(services: Services, ids: DemoIds): Promise<Map<string, SigningKey>> {
  const keys = new Map<string, SigningKey>();
  for (const { key, name } of demoPeople.filter(({ roles }) =>
    roles.some(({ role }) => /electrician|foreman/.test(role)),
  )) {
    const actor = await demoActor(services, ids, key);
    const made = newKey();
    await services.devices.register(actor, { id: made.device, name: `Demo phone of ${name}` });
    const { key: id, device, publicKey } = made;
    await services.devices.registerKey(actor, { id, device, publicKey });
    keys.set(actor.person, made);
  }
  return keys;
}

interface Setting {
  services: Services;
  ids: DemoIds;
  panels: Record<DemoPanel, string>;
  keys: Map<string, SigningKey>;
}

async function makeJob({ services, ids, panels }: Setting, story: DemoStory): Promise<string> {
  const foreman = await demoActor(services, ids, story.foreman);
  const id = v7();
  await services.jobs.create(foreman, {
    id,
    panel: panels[story.panel],
    revision: 1,
    points: [...story.points],
    electricians: story.electricians.map((key) => idOf(ids, key)),
    foreman: foreman.person,
    due: atDate(story.dueInDays),
    acceptances: [],
    ...(story.words ? { words: story.words } : {}),
  });
  if (story.state !== 'planned') await services.jobs.send(foreman, id);
  return id;
}

async function workedThrough({ services, ids, keys }: Setting, story: DemoStory, job: string): Promise<void> {
  const worker = story.electricians[0] ?? '';
  const { packs } = await services.boards.myPacks(await demoActor(services, ids, worker), new Set());
  const pack = packs.find((each) => each.job.id === job);
  if (!pack) return;
  const startedAt = new Date(Date.now() - story.daysAgo * dayMs);
  // Sent before it was begun, as the story goes; the server only knows now.
  const sentAt = new Date(startedAt.getTime() - hourMs);
  await services.database.query('UPDATE job SET sent_at = $2 WHERE id = $1', [job, sentAt]);
  const work = new DemoJob(pack, keys, startedAt, story.language);
  story.work(work, { worker: idOf(ids, worker), foreman: idOf(ids, story.foreman) });
  for (let sent = 0; sent < work.entries.length; sent += 400)
    await services.entries.push(job, { logs: work.logs(), entries: work.entries.slice(sent, sent + 400) });
}

export async function seedJobs(
  services: Services,
  ids: DemoIds,
  panels: Record<DemoPanel, string>,
): Promise<void> {
  const setting = { services, ids, panels, keys: await enrolAll(services, ids) };
  for (const story of demoStories) {
    const job = await makeJob(setting, story);
    await workedThrough(setting, story, job);
    if (story.state === 'cancelled')
      await services.jobs.cancel(await demoActor(services, ids, story.foreman), job, {
        words: 'Tank not emptied yet; planned anew for next week',
      });
  }
}
