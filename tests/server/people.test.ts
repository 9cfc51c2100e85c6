import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { v7 } from 'uuid';
import { createServer, type Server } from 'node:http';
import request from 'supertest';
import { seedPerson, seedSite, signIn, testPassword, type Agent } from '../support/seedPeople';
import { testServices, type TestServer } from '../support/testServices';

let server: TestServer;
let site: string;
let otherSite: string;
let admin: Agent;

beforeAll(async () => {
  server = await testServices();
  site = await seedSite(server.services, 'Halden Quay');
  otherSite = await seedSite(server.services, 'Elsewhere');
  await seedPerson(server.services, 'Ada Admin', [{ site, role: 'administrator' }]);
  await seedPerson(server.services, 'Other Admin', [{ site: otherSite, role: 'administrator' }]);
  admin = await signIn(server.app, 'ada.admin@example.org');
});
afterAll(() => server.close());

const invitation = (over: object = {}) => ({
  id: v7(),
  name: 'New Person',
  email: `new.${v7()}@example.org`,
  language: 'en',
  roles: [{ site, role: 'electrician' }],
  ...over,
});

async function queuedMail(to: string): Promise<{ path: string; kind: string }[]> {
  const rows = await server.services.database.query<{ data: { to: string; path: string; kind: string } }[]>(
    `SELECT data FROM mail_queue.job WHERE data->>'to' = $1 ORDER BY created_on`,
    [to],
  );
  return rows.map((row) => row.data);
}
const tokenOf = (mail: { path: string } | undefined): string => mail?.path.split('#')[1] ?? '';

describe('signing in', () => {
  it('answers who is signed in, with roles and site names', async () => {
    const answer = await admin.get('/api/session').expect(200);
    expect(answer.body).toMatchObject({
      person: { name: 'Ada Admin' },
      roles: [{ site, siteName: 'Halden Quay', role: 'administrator' }],
    });
  });

  it.each([
    [
      'wrong password',
      { email: 'ada.admin@example.org', password: 'not this one at all' },
      401,
      'wrong-sign-in',
    ],
    ['unknown address', { email: 'nobody@example.org', password: testPassword }, 401, 'wrong-sign-in'],
    ['no password', { email: 'ada.admin@example.org' }, 422, 'invalid'],
    ['password of wrong type', { email: 'ada.admin@example.org', password: 7 }, 422, 'invalid'],
    [
      'an unknown key',
      { email: 'ada.admin@example.org', password: testPassword, admin: true },
      422,
      'invalid',
    ],
  ])('refuses %s', async (_name, body, status, code) => {
    const answer = await request(server.app).post('/api/session').send(body).expect(status);
    expect(answer.type).toBe('application/problem+json');
    expect(answer.body).toMatchObject({ status, code });
  });

  it('refuses a body that is no JSON, and one that is too large, without a fault', async () => {
    await request(server.app).post('/api/session').type('json').send('{"email":').expect(400);
    await request(server.app)
      .post('/api/session')
      .type('json')
      .send(`"${'x'.repeat(300_000)}"`)
      .expect(413);
  });

  it('changes the session id at sign-in, so that one from before is worth nothing', async () => {
    const agent = request.agent(server.app).set('sec-fetch-site', 'same-origin');
    const first = await agent
      .post('/api/session')
      .send({ email: 'ada.admin@example.org', password: testPassword });
    const second = await agent
      .post('/api/session')
      .send({ email: 'ada.admin@example.org', password: testPassword });
    expect(first.headers['set-cookie']).toBeDefined();
    expect(second.headers['set-cookie']?.[0]?.split(';')[0]).not.toBe(
      first.headers['set-cookie']?.[0]?.split(';')[0],
    );
  });

  it('limits wrong tries per account and says when to try again', async () => {
    await seedPerson(server.services, 'Tried Often', [{ site, role: 'foreman' }]);
    const attempt = () =>
      request(server.app)
        .post('/api/session')
        .send({ email: 'tried.often@example.org', password: 'wrong wrong wrong' });
    for (let n = 0; n < 10; n += 1) await attempt().expect(401);
    const answer = await attempt().expect(429);
    expect(answer.body.code).toBe('too-many-tries');
    expect(Number(answer.headers['retry-after'])).toBeGreaterThan(0);
  });

  it('ends the session at sign-out', async () => {
    const agent = await signIn(server.app, 'ada.admin@example.org');
    await agent.delete('/api/session').expect(204);
    await agent.get('/api/session').expect(401);
  });
});

describe('requests from other sites', () => {
  let listening: Server;
  beforeAll(() => new Promise<void>((done) => void (listening = createServer(server.app).listen(0, done))));
  afterAll(() => void listening.close());

  it.each([
    ['another origin', { 'sec-fetch-site': 'cross-site' }],
    ['a page on another port', { 'sec-fetch-site': 'same-site' }],
    ['an origin that is not ours', { origin: 'http://evil.example' }],
    ['an opaque origin', { origin: 'null' }],
    ['a cookie and neither header', {}],
  ])('refuses an unsafe request with %s', async (_name, headers) => {
    const signedIn = await request(listening)
      .post('/api/session')
      .set('sec-fetch-site', 'same-origin')
      .send({ email: 'ada.admin@example.org', password: testPassword });
    const cookie = signedIn.headers['set-cookie']?.[0]?.split(';')[0] ?? '';
    const answer = await request(listening)
      .delete('/api/session')
      .set({ cookie, ...headers })
      .expect(403);
    expect(answer.body.code).toBe('cross-site');
  });
});

describe('inviting a person', () => {
  it('sends a link that works once, sets the password and lets them in', async () => {
    const body = invitation();
    await admin.post('/api/invitations').send(body).expect(201);
    const token = tokenOf((await queuedMail(body.email))[0]);
    await request(server.app)
      .post('/api/invitations/look')
      .send({ token })
      .expect(200, { name: 'New Person', email: body.email });
    await request(server.app)
      .post('/api/invitations/accept')
      .send({ token, password: testPassword })
      .expect(200);
    await request(server.app)
      .post('/api/invitations/accept')
      .send({ token, password: 'another password here' })
      .expect(410);
    await signIn(server.app, body.email);
  });

  it('answers the same id twice with one person and one mail', async () => {
    const body = invitation();
    await admin.post('/api/invitations').send(body).expect(201);
    await admin.post('/api/invitations').send(body).expect(201);
    expect(await queuedMail(body.email)).toHaveLength(1);
  });

  it('keeps no token in the database, only its hash', async () => {
    const body = invitation();
    await admin.post('/api/invitations').send(body).expect(201);
    const token = tokenOf((await queuedMail(body.email))[0]);
    const rows = await server.services.database.query<unknown[]>('SELECT * FROM mail_token WHERE hash = $1', [
      token,
    ]);
    expect(rows).toHaveLength(0);
  });

  it.each([
    [
      'a role on a site that is not theirs',
      () => invitation({ roles: [{ site: otherSite, role: 'foreman' }] }),
      403,
      'forbidden',
    ],
    ['an address in use', () => invitation({ email: 'ada.admin@example.org' }), 409, 'email-taken'],
    ['no role', () => invitation({ roles: [] }), 422, 'invalid'],
    ['a role nobody knows', () => invitation({ roles: [{ site, role: 'owner' }] }), 422, 'invalid'],
    ['a name with a direction override', () => invitation({ name: 'Ada\u202eevil' }), 422, 'invalid'],
    ['no id', () => invitation({ id: undefined }), 422, 'invalid'],
  ])('refuses %s and stores nothing', async (_name, make, status, code) => {
    const body = make();
    const answer = await admin.post('/api/invitations').send(body).expect(status);
    expect(answer.body.code).toBe(code);
    if (body.email !== 'ada.admin@example.org') expect(await queuedMail(body.email)).toHaveLength(0);
  });

  it('refuses a password under 15 characters and keeps the link usable', async () => {
    const body = invitation();
    await admin.post('/api/invitations').send(body).expect(201);
    const token = tokenOf((await queuedMail(body.email))[0]);
    await request(server.app)
      .post('/api/invitations/accept')
      .send({ token, password: 'too short' })
      .expect(422);
    await request(server.app)
      .post('/api/invitations/accept')
      .send({ token, password: testPassword })
      .expect(200);
  });
});

describe('changing a person', () => {
  it('ends their sessions when roles change', async () => {
    const person = await seedPerson(server.services, 'Role Changed', [{ site, role: 'electrician' }]);
    const agent = await signIn(server.app, person.email);
    await admin
      .patch(`/api/people/${person.id}`)
      .send({ version: 1, roles: [{ site, role: 'foreman' }] })
      .expect(200);
    await agent.get('/api/session').expect(401);
  });

  it('refuses a stale version', async () => {
    const person = await seedPerson(server.services, 'Stale Person', [{ site, role: 'electrician' }]);
    await admin.patch(`/api/people/${person.id}`).send({ version: 1, name: 'First' }).expect(200);
    const answer = await admin
      .patch(`/api/people/${person.id}`)
      .send({ version: 1, name: 'Second' })
      .expect(409);
    expect(answer.body.code).toBe('stale');
  });

  it('does not know people of another site', async () => {
    const person = await seedPerson(server.services, 'Far Away', [{ site: otherSite, role: 'electrician' }]);
    await admin.patch(`/api/people/${person.id}`).send({ version: 1, active: false }).expect(404);
    const list = await admin.get('/api/people?limit=200').expect(200);
    expect(list.body.items.map((each: { name: string }) => each.name)).not.toContain('Far Away');
  });

  it('does not let an administrator lock themselves out', async () => {
    const me = (await admin.get('/api/session')).body.person.id as string;
    const answer = await admin.patch(`/api/people/${me}`).send({ version: 1, active: false }).expect(409);
    expect(answer.body.code).toBe('not-yourself');
  });

  it('pages through people by name without losing one', async () => {
    const first = await admin.get('/api/people?limit=2').expect(200);
    const second = await admin
      .get(`/api/people?limit=200&after=${encodeURIComponent(first.body.next)}`)
      .expect(200);
    const all = await admin.get('/api/people?limit=200').expect(200);
    expect([...first.body.items, ...second.body.items]).toEqual(all.body.items);
  });
});

describe('a forgotten password', () => {
  it('is answered the same for known and unknown addresses, and mails only the known one', async () => {
    await request(server.app)
      .post('/api/password-resets')
      .send({ email: 'nobody@example.org' })
      .expect(202, {});
    await request(server.app)
      .post('/api/password-resets')
      .send({ email: 'other.admin@example.org' })
      .expect(202, {});
    expect(await queuedMail('nobody@example.org')).toHaveLength(0);
    const mails = await queuedMail('other.admin@example.org');
    expect(mails.map((mail) => mail.kind)).toEqual(['password-reset']);
    await request(server.app)
      .post('/api/password-resets/use')
      .send({ token: tokenOf(mails[0]), password: 'another long password' })
      .expect(200);
  });
});

describe('sites', () => {
  it('are seen only by people with a role there, and changed only by their administrator', async () => {
    const list = await admin.get('/api/sites').expect(200);
    expect(list.body.items.map((each: { name: string }) => each.name)).toEqual(['Halden Quay']);
    const { settings } = list.body.items[0];
    await admin
      .patch(`/api/sites/${site}`)
      .send({ version: 1, name: 'Halden Quay', settings: { ...settings, musterPoint: 'Gate 3' } })
      .expect(200);
    await admin.patch(`/api/sites/${site}`).send({ version: 1, name: 'Halden Quay', settings }).expect(409);
    await admin.patch(`/api/sites/${otherSite}`).send({ version: 1, name: 'Mine now', settings }).expect(404);
  });

  it('never let a dead limit be raised above 1.0 V', async () => {
    const { settings, version } = (await admin.get('/api/sites')).body.items[0];
    const answer = await admin
      .patch(`/api/sites/${site}`)
      .send({ version, name: 'Halden Quay', settings: { ...settings, deadLimitV: 1.1 } })
      .expect(422);
    expect(answer.body.errors[0].path).toBe('settings.deadLimitV');
  });

  it('made by an administrator is theirs', async () => {
    const { settings } = (await admin.get('/api/sites')).body.items[0];
    const id = v7();
    await admin.post('/api/sites').send({ id, name: 'New site', settings }).expect(201);
    await admin.post('/api/sites').send({ id, name: 'New site', settings }).expect(201);
    expect((await admin.get('/api/sites')).body.items.map((each: { id: string }) => each.id)).toContain(id);
    await admin.post('/api/sites').send({ id: v7(), name: 'new SITE', settings }).expect(409);
  });
});

describe('the audit', () => {
  it('cannot be changed, deleted or emptied, not even by the tables’ owner', async () => {
    const { Client } = await import('pg');
    const client = new Client({ connectionString: server.ownerUrl });
    await client.connect();
    for (const sql of [`UPDATE audit SET act = 'x'`, 'DELETE FROM audit', 'TRUNCATE audit'])
      await expect(client.query(sql)).rejects.toThrow('append-only');
    await client.end();
    await expect(server.services.database.query(`DELETE FROM audit`)).rejects.toThrow('permission denied');
  });
});
