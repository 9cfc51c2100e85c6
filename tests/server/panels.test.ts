import { randomBytes } from 'node:crypto';
import { Client } from 'pg';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { v7 } from 'uuid';
import { findingsAnswer, panelCheck, panelRow, panelView, revisionView } from '../../shared/api/panels';
import { panelSchema } from '../../shared/panel/panelSchema';
import { seedPerson, seedSite, signIn, type Agent } from '../support/seedPeople';
import { acceptAll } from '../support/seedJobs';
import { smallPanel } from '../support/smallPanel';
import { testServices, type TestServer } from '../support/testServices';

let server: TestServer;
let site: string;
let otherSite: string;
let engineer: Agent;
let foreman: Agent;
let stranger: Agent;

beforeAll(async () => {
  server = await testServices();
  site = await seedSite(server.services, 'Halden Quay');
  otherSite = await seedSite(server.services, 'Elsewhere');
  await seedPerson(server.services, 'Pia Panel', [{ site, role: 'panel-engineer' }]);
  await seedPerson(server.services, 'Finn Foreman', [{ site, role: 'foreman' }]);
  await seedPerson(server.services, 'Otto Other', [
    { site: otherSite, role: 'panel-engineer' },
    { site: otherSite, role: 'foreman' },
  ]);
  engineer = await signIn(server.app, 'pia.panel@example.org');
  foreman = await signIn(server.app, 'finn.foreman@example.org');
  stranger = await signIn(server.app, 'otto.other@example.org');
});
afterAll(() => server.close());

/** Without this the client would write bytes as JSON. */
const asItIs = (bytes: unknown) => bytes as string;
let made = 0;
/** A panel under a tag of its own. */
const panelFile = (over: object = {}) => ({ ...smallPanel(), tag: `FG-${(made += 1)}`, ...over });
async function uploaded(over: object = {}) {
  const panel = panelFile(over);
  const id = v7();
  await engineer.post('/api/panels').send({ id, site, panel }).expect(201);
  return { id, panel };
}
async function issued(over: object = {}) {
  const { id, panel } = await uploaded(over);
  const acceptances = await acceptAll(engineer, id);
  await engineer.post(`/api/panels/${id}/revisions`).send({ version: 1, acceptances }).expect(201);
  return { id, panel, acceptances };
}

describe('taking a panel file in', () => {
  it('keeps it as a draft that reads back as it was sent', async () => {
    const { id, panel } = await uploaded();
    const view = panelView.parse((await engineer.get(`/api/panels/${id}`).expect(200)).body);
    expect(view.draft).toMatchObject({ version: 1, changedBy: 'Pia Panel' });
    expect(view.draft.panel).toEqual(panelSchema.parse(panel));
    expect(view).toMatchObject({ revision: null, points: 5, draftChanged: true, revisions: [] });
  });

  it('answers the same upload twice with one panel, at the same moment too', async () => {
    const body = { id: v7(), site, panel: panelFile() };
    const answers = await Promise.all([1, 2].map(() => engineer.post('/api/panels').send(body)));
    const again = await engineer.post('/api/panels').send(body).expect(201);
    expect(answers.map(({ status }) => status).sort()).toEqual([201, 201]);
    expect(panelRow.parse(again.body).tag).toBe(body.panel.tag);
    const list = await engineer.get(`/api/panels?limit=200`).expect(200);
    expect(list.body.items.filter((each: { id: string }) => each.id === body.id)).toHaveLength(1);
  });

  it.each([
    [
      'another file under a known id',
      async () => ({ ...(await uploaded()), panel: panelFile() }),
      409,
      'id-taken',
    ],
    [
      'a tag that the site has',
      async () => ({ id: v7(), panel: (await uploaded()).panel }),
      409,
      'tag-taken',
    ],
  ])('refuses %s', async (_name, make, status, code) => {
    const answer = await engineer
      .post('/api/panels')
      .send({ site, ...(await make()) })
      .expect(status);
    expect(answer.body.code).toBe(code);
  });

  it('takes the same tag on another site', async () => {
    const { panel } = await uploaded();
    await stranger.post('/api/panels').send({ id: v7(), site: otherSite, panel }).expect(201);
  });

  it.each([
    ['an unknown key', () => panelFile({ colour: 'red' }), 'panel.colour'],
    [
      'an unknown key deep inside',
      () => panelFile({ drawing: { number: '1', revision: 'A', by: 'x' } }),
      'panel.drawing.by',
    ],
    ['a wrong type', () => panelFile({ frequencyHz: '50' }), 'panel.frequencyHz'],
    ['points that are no list', () => panelFile({ points: { 0: 'DI3.01' } }), 'panel.points'],
    ['another format', () => panelFile({ format: 'coldloop-panel/2' }), 'panel.format'],
    ['a tag with a direction override', () => panelFile({ tag: 'Q1\u202e' }), 'panel.tag'],
    [
      '20,001 points',
      () => panelFile({ points: Array.from({ length: 20_001 }, () => smallPanel().points[0]) }),
      'panel.points',
    ],
  ])('refuses %s with its path', async (_name, make, path) => {
    const id = v7();
    const answer = await engineer.post('/api/panels').send({ id, site, panel: make() }).expect(422);
    expect(answer.type).toBe('application/problem+json');
    expect(answer.body.errors.map((each: { path: string }) => each.path)).toContain(path);
    await engineer.get(`/api/panels/${id}`).expect(404);
  });

  it.each([
    ['binary rubbish', 'application/json', () => randomBytes(200_000), 400],
    [
      'rubbish that says it is gzip',
      'application/json',
      () => randomBytes(10_000),
      400,
      { 'content-encoding': 'gzip' },
    ],
    ['JSON that stops in the middle', 'application/json', () => '{"id":"', 400],
    ['a bare string', 'application/json', () => '"panel"', 400],
    ['a list', 'application/json', () => '[]', 422],
    ['another kind of file', 'application/octet-stream', () => randomBytes(1_000), 422],
  ])('refuses %s', async (_name, type, body, status, headers: Record<string, string> = {}) => {
    const answer = await engineer
      .post('/api/panels')
      .set({ ...headers })
      .type(type)
      .serialize(asItIs)
      .send(body())
      .expect(status);
    expect(answer.type).toBe('application/problem+json');
  });

  it('refuses 50 MB without reading them', async () => {
    const answer = await engineer
      .post('/api/panels')
      .type('json')
      .serialize(asItIs)
      .send(Buffer.alloc(50_000_000, 0x20))
      .expect(413);
    expect(answer.body.code).toBe('too-large');
  });

  it('refuses a small gzip that becomes 50 MB', async () => {
    const { gzipSync } = await import('node:zlib');
    await engineer
      .post('/api/panels')
      .type('json')
      .serialize(asItIs)
      .set('content-encoding', 'gzip')
      .send(gzipSync(Buffer.alloc(50_000_000, 0x20)))
      .expect(413);
  });

  it('is not for foremen, nor for engineers of another site', async () => {
    await foreman.post('/api/panels').send({ id: v7(), site, panel: panelFile() }).expect(403);
    await stranger.post('/api/panels').send({ id: v7(), site, panel: panelFile() }).expect(404);
  });
});

describe('saving a draft', () => {
  it('raises its version', async () => {
    const { id, panel } = await uploaded();
    await engineer
      .put(`/api/panels/${id}/draft`)
      .send({ version: 1, panel: { ...panel, name: 'New name' } })
      .expect(200);
    const view = (await engineer.get(`/api/panels/${id}`)).body;
    expect(view).toMatchObject({ name: 'New name', draft: { version: 2 } });
  });

  it('refuses a stale version and says what stands', async () => {
    const { id, panel } = await uploaded();
    const save = (name: string) =>
      engineer.put(`/api/panels/${id}/draft`).send({ version: 1, panel: { ...panel, name } });
    await save('First').expect(200);
    const answer = await save('Second').expect(409);
    expect(answer.body).toMatchObject({ code: 'stale', stands: { version: 2, changedBy: 'Pia Panel' } });
    expect((await engineer.get(`/api/panels/${id}`)).body.name).toBe('First');
  });

  it('answers the same save twice as one', async () => {
    const { id, panel } = await uploaded();
    const body = { version: 1, panel: { ...panel, name: 'Twice' } };
    await engineer.put(`/api/panels/${id}/draft`).send(body).expect(200);
    await engineer.put(`/api/panels/${id}/draft`).send(body).expect(200);
    expect((await engineer.get(`/api/panels/${id}`)).body.draft.version).toBe(2);
  });

  it('lets one of two savers through', async () => {
    const { id, panel } = await uploaded();
    const answers = await Promise.all(
      ['A', 'B', 'C'].map((name) =>
        engineer.put(`/api/panels/${id}/draft`).send({ version: 1, panel: { ...panel, name } }),
      ),
    );
    expect(answers.map(({ status }) => status).sort()).toEqual([200, 409, 409]);
  });

  it('refuses the tag of another panel of the site', async () => {
    const { id } = await uploaded();
    const other = await uploaded();
    const answer = await engineer
      .put(`/api/panels/${id}/draft`)
      .send({ version: 1, panel: other.panel })
      .expect(409);
    expect(answer.body.code).toBe('tag-taken');
  });

  it('is not for foremen; the panel of another site does not exist', async () => {
    const { id, panel } = await uploaded();
    await foreman.put(`/api/panels/${id}/draft`).send({ version: 1, panel }).expect(403);
    await stranger.put(`/api/panels/${id}/draft`).send({ version: 1, panel }).expect(404);
    await stranger.get(`/api/panels/${id}`).expect(404);
  });
});

describe('issuing a revision', () => {
  it('keeps the panel, its findings and who accepted them', async () => {
    const { id, panel, acceptances } = await issued();
    const view = revisionView.parse((await foreman.get(`/api/panels/${id}/revisions/1`).expect(200)).body);
    expect(view.panel).toEqual(panelSchema.parse(panel));
    expect(view).toMatchObject({ number: 1, issuedBy: 'Pia Panel' });
    expect(new Set(view.standing.map(({ rule }) => rule))).toEqual(
      new Set(acceptances.map(({ rule }) => rule)),
    );
    const findings = findingsAnswer.parse((await foreman.get(`/api/panels/${id}/revisions/1/findings`)).body);
    expect(findings.problems).toEqual([]);
    expect(
      findings.findings.filter((each) => !['tells', 'hurts'].includes(each.harm) && !each.accepted),
    ).toEqual([]);
    expect((await engineer.get(`/api/panels/${id}`)).body).toMatchObject({
      revision: 1,
      draftChanged: false,
    });
  });

  it('answers the same request twice with one revision', async () => {
    const { id, acceptances } = await issued();
    await engineer.post(`/api/panels/${id}/revisions`).send({ version: 1, acceptances }).expect(201);
    expect((await engineer.get(`/api/panels/${id}`)).body.revisions).toHaveLength(1);
  });

  it('refuses broken references and what nobody has stated, place by place', async () => {
    const points = smallPanel().points.map((point, index) =>
      index === 0 ? { ...point, group: 'G99' } : index === 1 ? { ...point, otherSupply: undefined } : point,
    );
    const { id } = await uploaded({ points });
    const answer = await engineer
      .post(`/api/panels/${id}/revisions`)
      .send({ version: 1, acceptances: [] })
      .expect(422);
    expect(answer.body.code).toBe('not-issuable');
    expect(answer.body.errors.map((each: { path: string }) => each.path)).toEqual(
      expect.arrayContaining(['points.0.group', 'points.1.otherSupply']),
    );
    const findings = findingsAnswer.parse(
      (await engineer.get(`/api/panels/${id}/draft/findings`).expect(200)).body,
    );
    expect(findings.problems.map(({ path }) => path)).toContain('points.0.group');
  });

  it('refuses a stale draft version', async () => {
    const { id, panel } = await uploaded();
    await engineer
      .put(`/api/panels/${id}/draft`)
      .send({ version: 1, panel: { ...panel, name: 'Newer' } })
      .expect(200);
    const answer = await engineer
      .post(`/api/panels/${id}/revisions`)
      .send({ version: 1, acceptances: [] })
      .expect(409);
    expect(answer.body.code).toBe('stale');
  });

  it('refuses an acceptance that fits no finding', async () => {
    const { id } = await uploaded();
    const acceptances = [...(await acceptAll(engineer, id)), { rule: 'no.such-rule', reason: 'Because' }];
    const answer = await engineer
      .post(`/api/panels/${id}/revisions`)
      .send({ version: 1, acceptances })
      .expect(422);
    expect(answer.body.errors).toEqual([
      { path: `acceptances.${acceptances.length - 1}`, says: 'No finding of this rule stands there.' },
    ]);
  });

  it('cannot be changed, deleted or emptied, not even by the tables’ owner', async () => {
    const client = new Client({ connectionString: server.ownerUrl });
    await client.connect();
    await issued();
    for (const sql of [
      `UPDATE panel_revision SET rule_set = 'x'`,
      'DELETE FROM panel_revision',
      'TRUNCATE panel_revision CASCADE',
    ])
      await expect(client.query(sql)).rejects.toThrow('append-only');
    await client.end();
    await expect(server.services.database.query('DELETE FROM panel_revision')).rejects.toThrow(
      'permission denied',
    );
    await expect(server.services.database.query(`UPDATE panel_revision SET rule_set = 'x'`)).rejects.toThrow(
      'permission denied',
    );
  });

  it.each(['0', '2', '-1', '1e9', 'x', '99999999999'])('does not know revision %s', async (number) => {
    const { id } = await issued();
    await foreman.get(`/api/panels/${id}/revisions/${number}`).expect(404);
  });
});

describe('the list of panels', () => {
  it('holds the panels of one’s own sites and pages without losing one', async () => {
    await uploaded();
    await uploaded();
    const all = (await engineer.get('/api/panels?limit=200').expect(200)).body.items;
    const seen: unknown[] = [];
    let after = '';
    for (;;) {
      const page = (await engineer.get(`/api/panels?limit=2${after}`).expect(200)).body;
      seen.push(...page.items);
      if (page.next === null) break;
      after = `&after=${encodeURIComponent(page.next)}`;
    }
    expect(seen).toEqual(all);
    expect(all.every((each: { site: string }) => each.site === site)).toBe(true);
  });

  it.each(['limit=0', 'limit=201', 'site=x', 'after=%00'])('refuses ?%s', async (query) => {
    await engineer.get(`/api/panels?${query}`).expect(422);
  });
});

describe('the stateless check', () => {
  it('answers findings, plan, what stays live, waits and steps, and keeps nothing', async () => {
    const answer = await foreman
      .post('/api/panel-checks')
      .send({ panel: smallPanel(), language: 'es' })
      .expect(200);
    const check = panelCheck.parse(answer.body);
    expect(check.isolation.plan?.isolators).toContain('Q1');
    expect(check.checklist.steps).toBeGreaterThan(50);
    expect(
      (await foreman.get('/api/panels?limit=200')).body.items.map((each: { tag: string }) => each.tag),
    ).not.toContain('FG-01');
  });

  it('refuses a scope and isolators that are not in the panel', async () => {
    const body = { panel: smallPanel(), scope: ['DI3.01', 'XX'], open: ['Q9'] };
    const answer = await foreman.post('/api/panel-checks').send(body).expect(422);
    expect(answer.body.errors.map((each: { path: string }) => each.path)).toEqual(['scope.1', 'open.0']);
  });
});
