import { afterAll, beforeAll, expect, it } from 'vitest';
import { jobsPage, jobView } from '../../shared/api/jobs';
import { firstOf, packOf, sendJob } from '../support/seedJobs';
import { seedWorks, worksPoints, type Works } from '../support/seedWorks';
import { SignedJob } from '../support/signedJob';
import { enrolDevice, type SigningDevice } from '../support/signingDevice';

let works: Works;
let keys: Map<string, SigningDevice>;

beforeAll(async () => {
  works = await seedWorks();
  keys = new Map([
    [works.electricianId, works.device],
    [works.foremanId, await enrolDevice(works.foreman)],
  ]);
});
afterAll(() => works.server.close());

async function workedJob(): Promise<SignedJob> {
  const { job } = await sendJob(works.foreman, works.panel, worksPoints.slice(0, 1), works.crew);
  const walked = new SignedJob(await packOf(works.electrician, job), keys);
  walked.work();
  return walked;
}
const view = async (job: SignedJob) =>
  jobView.parse((await works.foreman.get(`/api/jobs/${job.id}`).expect(200)).body);
const mails = (kind: string, job: SignedJob) =>
  works.server.services.database.query<{ to: string; path: string }[]>(
    `SELECT data->>'to' AS to, data->>'path' AS path FROM mail_queue.job
     WHERE data->>'kind' = $1 AND data->>'path' LIKE '%' || $2 || '%'`,
    [kind, job.id],
  );
const waitingForMe = async () =>
  jobsPage.parse((await works.foreman.get('/api/jobs?waiting=me').expect(200)).body).items;

it('shows how far a job is, without a mail before it is signed', async () => {
  const job = await workedJob();
  await job.deliver(works.electrician);
  const shown = await view(job);
  expect(shown).toMatchObject({ status: 'running', locks: [], waiting: [] });
  expect(shown.stagesDone).toBeGreaterThan(8);
  expect(await mails('countersign-wanted', job)).toEqual([]);
});

it('asks the foreman once to countersign a job that is signed', async () => {
  const job = await workedJob();
  job.sign();
  await job.deliver(works.electrician);
  const once = [{ to: 'finn.foreman@example.org', path: `/my/jobs/${job.id}/review` }];
  expect(await mails('countersign-wanted', job)).toEqual(once);
  const mine = (await waitingForMe()).find(({ id }) => id === job.id);
  expect(mine).toMatchObject({ status: 'signed', waiting: [{ what: 'countersign', count: 1 }] });
  job.write(job.person('electrician'), 'note', { words: 'Swept the floor' });
  await job.deliver(works.electrician);
  expect(await mails('countersign-wanted', job)).toEqual(once);
});

it('mails the electricians when their job is returned', async () => {
  const job = await workedJob();
  job.sign();
  await job.deliver(works.electrician);
  const step = firstOf(job.checklist.steps).id;
  job.device(job.person('foreman'));
  job.write(job.person('foreman'), 'returned', { steps: [{ step, words: 'Scan it again' }] });
  await job.deliver(works.foreman);
  expect((await view(job)).status).toBe('returned');
  expect(await mails('job-returned', job)).toEqual([
    { to: 'ada.electrician@example.org', path: `/my/jobs/${job.id}` },
  ]);
});

it('seals the job when the countersignature arrives', async () => {
  const job = await workedJob();
  job.sign();
  job.countersign();
  await job.deliver(works.foreman);
  const shown = await view(job);
  expect(shown.status).toBe('sealed');
  expect(shown.record).not.toBeNull();
  expect((await waitingForMe()).map(({ id }) => id)).not.toContain(job.id);
  await works.foreman.post(`/api/jobs/${job.id}/cancel`).send({ words: 'Too late' }).expect(409);
});
