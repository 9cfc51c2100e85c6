import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { jobsPage, jobStateView, jobView } from '../../shared/api/jobs';
import { healthyPanel } from '../../server/commands/demo/panels/healthy';
import { issueDraft, jobRequestFor, packOf, sendJob } from '../support/seedJobs';
import type { Agent } from '../support/seedPeople';
import { seedWorks, worksPoints, type Works } from '../support/seedWorks';
import { SignedLog } from '../support/signingDevice';
import type { TestServer } from '../support/testServices';

let works: Works;
let server: TestServer;
let engineer: Agent;
let foreman: Agent;
let electrician: Agent;
let outsider: Agent;
let safety: Agent;
let stranger: Agent;
let panel: string;

beforeAll(async () => {
  works = await seedWorks();
  ({ server, engineer, foreman, electrician, outsider, safety, stranger, panel } = works);
});
afterAll(() => server.close());

const points = worksPoints;
const requestBody = (over: object = {}) =>
  jobRequestFor(foreman, panel, points, works.crew).then((body) => ({ ...body, ...over }));
const view = async (job: string) => jobView.parse((await foreman.get(`/api/jobs/${job}`).expect(200)).body);
async function sendJobOf(ofPanel: string, revision: number) {
  const body = await jobRequestFor(foreman, ofPanel, points, works.crew, revision);
  await foreman.post('/api/jobs').send(body).expect(201);
  await foreman.post(`/api/jobs/${body.id}/send`).expect(200);
  return { job: body.id, pack: await packOf(electrician, body.id) };
}

describe('the packs of a person', () => {
  it('leave out what the device has, and what is not theirs', async () => {
    const { job, pack } = await sendJobOf(panel, 1);
    const answer = (await electrician.get(`/api/my/packs?have=${pack.digest}`).expect(200)).body;
    expect(answer.packs.map((each: { digest: string }) => each.digest)).not.toContain(pack.digest);
    expect(answer.current).toContainEqual({ job, digest: pack.digest, status: 'sent' });
    const theirs = (await outsider.get('/api/my/packs').expect(200)).body;
    expect(theirs).toEqual({ packs: [], current: [] });
    expect(await packOf(foreman, job)).toEqual(pack);
  });

  it('refuse a list of what is no digest', async () => {
    await electrician.get('/api/my/packs?have=abc').expect(422);
  });
});

describe('the board', () => {
  it('shows foremen all of the site, electricians their own, strangers nothing', async () => {
    const { job } = await sendJob(foreman, panel, points, works.crew);
    const ids = async (agent: Agent) =>
      jobsPage.parse((await agent.get('/api/jobs?limit=200').expect(200)).body).items.map(({ id }) => id);
    expect(await ids(foreman)).toContain(job);
    expect(await ids(safety)).toContain(job);
    expect(await ids(electrician)).toContain(job);
    expect(await ids(outsider)).toEqual([]);
    expect(await ids(stranger)).toEqual([]);
  });

  it('pages without losing or doubling one', async () => {
    for (let n = 0; n < 5; n += 1) await sendJob(foreman, panel, points, works.crew);
    const all = (await foreman.get('/api/jobs?limit=200').expect(200)).body.items;
    const seen: unknown[] = [];
    let after = '';
    for (;;) {
      const page = (await foreman.get(`/api/jobs?limit=3${after}`).expect(200)).body;
      seen.push(...page.items);
      if (page.next === null) break;
      after = `&after=${encodeURIComponent(page.next)}`;
    }
    expect(seen).toEqual(all);
    expect(all.length).toBeGreaterThan(3);
  });

  it('says when a job is late and lists it under what waits', async () => {
    const body = await requestBody({ due: '2020-01-01' });
    await foreman.post('/api/jobs').send(body).expect(201);
    const page = jobsPage.parse((await foreman.get('/api/jobs?waiting=me&limit=200').expect(200)).body);
    const mine = page.items.find(({ id }) => id === body.id);
    expect(mine?.waiting).toEqual([{ what: 'late', count: 1, since: '2020-01-02T00:00:00.000Z' }]);
    expect(page.items.every(({ waiting }) => waiting.length > 0)).toBe(true);
  });

  it('knows when a newer revision was issued', async () => {
    const own = await works.anotherPanel();
    const { job } = await sendJob(foreman, own, points, works.crew);
    expect((await view(job)).newerRevision).toBe(false);
    const { draft } = (await engineer.get(`/api/panels/${own}`)).body;
    await engineer
      .put(`/api/panels/${own}/draft`)
      .send({ version: 1, panel: { ...draft.panel, name: 'Newer' } })
      .expect(200);
    await issueDraft(engineer, own, 2);
    expect(await view(job)).toMatchObject({ newerRevision: true, revision: 1, panelName: healthyPanel.name });
  });
});

describe('the folded state', () => {
  it('says each step in the language of the screen, and what was answered', async () => {
    const { job, pack } = await sendJob(foreman, panel, points, works.crew);
    const log = new SignedLog(works.device, job, pack);
    log.add({ kind: 'accepted', body: {} });
    await foreman.post(`/api/jobs/${job}/entries`).send(log.push()).expect(200);
    const state = (language: string) =>
      foreman.get(`/api/jobs/${job}/state`).set('accept-language', language).expect(200);
    const english = jobStateView.parse((await state('en')).body);
    const spanish = jobStateView.parse((await state('es')).body);
    expect(english.steps.map(({ id }) => id)).toEqual(spanish.steps.map(({ id }) => id));
    expect(english.steps[0]?.title).not.toBe(spanish.steps[0]?.title);
    expect(english.stages.map(({ stage }) => stage)[0]).toBe('get-ready');
    await outsider.get(`/api/jobs/${job}/state`).expect(404);
    await stranger.get(`/api/jobs/${job}/state`).expect(404);
  });

  it('is not there while the job is only planned', async () => {
    const body = await requestBody();
    await foreman.post('/api/jobs').send(body).expect(201);
    await foreman.get(`/api/jobs/${body.id}/state`).expect(404);
  });
});
