import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { v7 } from 'uuid';
import { jobPreview, jobView } from '../../shared/api/jobs';
import { healthyPanel } from '../../server/commands/demo/panels/healthy';
import { firstOf, issueDraft, jobRequestFor, packOf, sendJob } from '../support/seedJobs';
import type { Agent } from '../support/seedPeople';
import { seedWorks, worksPoints, type Works } from '../support/seedWorks';
import { SignedLog } from '../support/signingDevice';
import type { TestServer } from '../support/testServices';

let works: Works;
let server: TestServer;
let engineer: Agent;
let foreman: Agent;
let electrician: Agent;
let safety: Agent;
let stranger: Agent;
let panel: string;

beforeAll(async () => {
  works = await seedWorks();
  ({ server, engineer, foreman, electrician, safety, stranger, panel } = works);
});
afterAll(() => server.close());

const points = worksPoints;
const requestBody = (over: object = {}) =>
  jobRequestFor(foreman, panel, points, works.crew).then((body) => ({ ...body, ...over }));
const view = async (job: string) => jobView.parse((await foreman.get(`/api/jobs/${job}`).expect(200)).body);
const mails = (kind: string, panelTag = healthyPanel.tag) =>
  server.services.database.query<{ to: string; path: string; number: string }[]>(
    `SELECT data->>'to' AS to, data->>'path' AS path, data->'params'->>'number' AS number FROM mail_queue.job
     WHERE data->>'kind' = $1 AND data->'params'->>'panel' = $2`,
    [kind, panelTag],
  );
async function sendJobOf(ofPanel: string, revision: number) {
  const body = await jobRequestFor(foreman, ofPanel, points, works.crew, revision);
  await foreman.post('/api/jobs').send(body).expect(201);
  await foreman.post(`/api/jobs/${body.id}/send`).expect(200);
  return { job: body.id, pack: await packOf(electrician, body.id) };
}

describe('the preview', () => {
  it('answers plan, findings, checks and the size of the checklist', async () => {
    const answer = await foreman.post('/api/jobs/preview').send({ panel, revision: 1, points }).expect(200);
    const preview = jobPreview.parse(answer.body);
    expect(preview).toMatchObject({ blocked: [], points: 3, of: healthyPanel.points.length });
    expect(preview.plan?.isolators.length).toBeGreaterThan(0);
    expect(preview.checks).toBeGreaterThan(0);
    expect(preview.checklist.steps).toBe(preview.checklist.stages.reduce((sum, { steps }) => sum + steps, 0));
    expect(preview.checklist.steps).toBeGreaterThan(20);
  });

  it('says in the language of the screen why a job may not start', async () => {
    const answer = await foreman
      .post('/api/jobs/preview')
      .set('accept-language', 'es')
      .send({ panel, revision: 1, points: ['NO.01'] })
      .expect(200);
    expect(answer.body).toMatchObject({
      canStart: false,
      blocked: [{ code: 'unknown-point', says: 'El punto NO.01 no está en esta revisión.' }],
      plan: null,
    });
  });

  it('blocks points without a plan', async () => {
    const unfed = await works.anotherPanel((one) => ({
      ...one,
      isolators: one.isolators.map((isolator) => ({ ...isolator, suitableForIsolation: false })),
    }));
    const answer = await foreman
      .post('/api/jobs/preview')
      .send({ panel: unfed, revision: 1, points })
      .expect(200);
    expect(answer.body.blocked.map((each: { code: string }) => each.code)).toContain('no-plan');
    const body = { ...(await requestBody()), panel: unfed };
    const refused = await foreman.post('/api/jobs').send(body).expect(409);
    expect(refused.body.code).toBe('job-blocked');
    expect(refused.body.errors[0].says).not.toBe('');
  });

  it('locks what the last revision still had: a feed deleted on paper stays in the cabinet', async () => {
    const twoFeeds = await works.anotherPanel((one) => ({
      ...one,
      sources: [
        ...one.sources,
        { tag: 'OLD-FEED', kind: 'feeder', description: 'Old feed', location: 'MCC-9', V: 400, phases: 3 },
      ],
      isolators: [...one.isolators, { ...firstOf(one.isolators), tag: 'Q99', inPanel: false, alsoFeeds: [] }],
      supplies: one.supplies.map((supply, index) =>
        index === 0
          ? { ...supply, feeds: [...supply.feeds, { from: 'OLD-FEED', through: ['Q99'] }] }
          : supply,
      ),
    }));
    const tag = (await engineer.get(`/api/panels/${twoFeeds}`)).body.tag as string;
    await engineer
      .put(`/api/panels/${twoFeeds}/draft`)
      .send({ version: 1, panel: { ...healthyPanel, tag } })
      .expect(200);
    await issueDraft(engineer, twoFeeds, 2);
    const answer = await foreman
      .post('/api/jobs/preview')
      .send({ panel: twoFeeds, revision: 2, points })
      .expect(200);
    expect(answer.body.plan.isolators.map((each: { tag: string }) => each.tag)).toContain('Q99');
    const { pack } = await sendJobOf(twoFeeds, 2);
    expect(pack.checklist.isolators).toContain('Q99');
  });

  it.each([
    ['another site', () => stranger, 404],
    ['an electrician', () => electrician, 403],
    ['a safety officer', () => safety, 403],
  ])('is not for %s', async (_name, who, status) => {
    await who().post('/api/jobs/preview').send({ panel, revision: 1, points }).expect(status);
  });

  it('does not know a revision that was never issued', async () => {
    await foreman.post('/api/jobs/preview').send({ panel, revision: 9, points }).expect(404);
    await foreman.post('/api/jobs/preview').send({ panel: v7(), revision: 1, points }).expect(404);
  });
});

describe('planning a job', () => {
  it('numbers it in its site and shows it as planned', async () => {
    const body = await requestBody({ words: 'Key is at the gate' });
    const first = jobView.parse((await foreman.post('/api/jobs').send(body).expect(201)).body);
    expect(first).toMatchObject({
      status: 'planned',
      panelTag: healthyPanel.tag,
      scope: points,
      words: 'Key is at the gate',
      due: '2099-12-04',
      pack: null,
      electricians: [{ id: works.electricianId, name: 'Ada Electrician' }],
      foreman: { id: works.foremanId, name: 'Finn Foreman' },
    });
    const second = (
      await foreman
        .post('/api/jobs')
        .send(await requestBody())
        .expect(201)
    ).body;
    expect(Number(second.number)).toBe(Number(first.number) + 1);
  });

  it('makes one job of the same request sent many times at once', async () => {
    const body = await requestBody();
    const answers = await Promise.all([1, 2, 3, 4].map(() => foreman.post('/api/jobs').send(body)));
    expect(answers.map(({ status }) => status)).toEqual([201, 201, 201, 201]);
    expect(new Set(answers.map((each) => each.body.number)).size).toBe(1);
    const rows = await server.services.database.query<unknown[]>('SELECT 1 FROM job WHERE id = $1', [
      body.id,
    ]);
    expect(rows).toHaveLength(1);
  });

  it('refuses another request under the same id', async () => {
    const body = await requestBody();
    await foreman.post('/api/jobs').send(body).expect(201);
    const answer = await foreman
      .post('/api/jobs')
      .send({ ...body, due: '2099-12-05' })
      .expect(409);
    expect(answer.body.code).toBe('id-taken');
  });

  it.each([
    [
      'somebody who is no electrician of the site',
      () => ({ electricians: [works.strangerId] }),
      'not-fit',
      'electricians.0',
    ],
    ['somebody unknown', () => ({ electricians: [v7()] }), 'not-fit', 'electricians.0'],
    ['a foreman of another site', () => ({ foreman: works.strangerId }), 'not-fit', 'foreman'],
    ['a foreman who works', () => ({ electricians: [works.foremanId] }), 'not-fit', 'foreman'],
    ['no point', () => ({ points: [] }), 'invalid', 'points'],
    ['a date that is none', () => ({ due: '2099-02-30' }), 'invalid', 'due'],
    ['an unknown key', () => ({ urgent: true }), 'invalid', 'urgent'],
    ['points of a wrong type', () => ({ points: 'DI1.01' }), 'invalid', 'points'],
    [
      'an acceptance of nothing',
      () => ({ acceptances: [{ rule: 'x.y\u0000', reason: 'So' }] }),
      'findings-stand',
      'acceptances.0',
    ],
  ])('refuses %s', async (_name, over, code, path) => {
    const body = await requestBody(over());
    const answer = await foreman.post('/api/jobs').send(body).expect(422);
    expect(answer.body.code).toBe(code);
    expect(answer.body.errors.map((each: { path: string }) => each.path)).toContain(path);
    await foreman.get(`/api/jobs/${body.id}`).expect(404);
  });

  it('is for foremen of the panel’s site', async () => {
    const body = await requestBody();
    await electrician.post('/api/jobs').send(body).expect(403);
    await engineer.post('/api/jobs').send(body).expect(403);
    await stranger.post('/api/jobs').send(body).expect(404);
  });
});

describe('sending a job', () => {
  it('makes a pack that a phone takes, and mails its electricians once', async () => {
    const before = (await mails('job-given')).length;
    const body = await requestBody();
    await foreman.post('/api/jobs').send(body).expect(201);
    const [sent, again] = await Promise.all(
      [1, 2].map(() => foreman.post(`/api/jobs/${body.id}/send`).expect(200)),
    );
    expect(again?.body.pack).toBe(sent?.body.pack);
    const shown = await view(body.id);
    expect(shown.status).toBe('sent');
    const pack = await packOf(electrician, body.id);
    expect(pack.digest).toBe(shown.pack);
    expect(pack.checklist.scope.toSorted()).toEqual(points.toSorted());
    expect(pack.people.find(({ id }) => id === works.electricianId)?.keys.map(({ key }) => key)).toContain(
      works.device.key,
    );
    const given = (await mails('job-given')).slice(before);
    expect(given).toEqual([
      { to: 'ada.electrician@example.org', path: `/my/jobs/${body.id}`, number: shown.number },
    ]);
  });

  it('carries every message that its texts name, in both languages', async () => {
    const { pack } = await sendJobOf(panel, 1);
    for (const language of ['en', 'es'] as const)
      for (const { title } of pack.checklist.steps)
        expect(pack.wording[language]).toHaveProperty([title.key]);
  });

  it('does not know jobs of other sites', async () => {
    const body = await requestBody();
    await foreman.post('/api/jobs').send(body).expect(201);
    await stranger.post(`/api/jobs/${body.id}/send`).expect(404);
    await electrician.post(`/api/jobs/${body.id}/send`).expect(403);
    await foreman.post(`/api/jobs/${v7()}/send`).expect(404);
  });
});

describe('cancelling a job', () => {
  it('ends it with words, once', async () => {
    const { job } = await sendJob(foreman, panel, points, works.crew);
    await foreman.post(`/api/jobs/${job}/cancel`).send({ words: 'Pump stays in use' }).expect(200);
    await foreman.post(`/api/jobs/${job}/cancel`).send({ words: 'Pump stays in use' }).expect(200);
    expect(await view(job)).toMatchObject({
      status: 'cancelled',
      cancelled: { by: 'Finn Foreman', words: 'Pump stays in use' },
    });
    const { current } = (await electrician.get('/api/my/packs')).body;
    expect(current.find((each: { job: string }) => each.job === job).status).toBe('cancelled');
    await foreman.post(`/api/jobs/${job}/send`).expect(409);
  });

  it('is refused while a lock is on', async () => {
    const { job, pack } = await sendJob(foreman, panel, points, works.crew);
    const { checklist } = await packOf(electrician, job);
    const log = new SignedLog(works.device, job, pack);
    log.add({ kind: 'accepted', body: {} });
    log.add({ kind: 'lock-on', body: { isolator: firstOf(checklist.isolators), lock: '17' } });
    await foreman.post(`/api/jobs/${job}/entries`).send(log.push()).expect(200);
    const answer = await foreman.post(`/api/jobs/${job}/cancel`).send({ words: 'No' }).expect(409);
    expect(answer.body.code).toBe('locks-on');
    expect((await view(job)).status).not.toBe('cancelled');
  });

  it.each([
    ['no words', {}],
    ['empty words', { words: '  ' }],
    ['an unknown key', { words: 'So', force: true }],
  ])('is refused with %s', async (_name, body) => {
    const { job } = await sendJob(foreman, panel, points, works.crew);
    await foreman.post(`/api/jobs/${job}/cancel`).send(body).expect(422);
  });

  it('is for foremen of the site', async () => {
    const { job } = await sendJob(foreman, panel, points, works.crew);
    await electrician.post(`/api/jobs/${job}/cancel`).send({ words: 'No' }).expect(403);
    await stranger.post(`/api/jobs/${job}/cancel`).send({ words: 'No' }).expect(404);
  });
});
