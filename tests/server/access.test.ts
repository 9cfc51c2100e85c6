import request from 'supertest';
import { afterAll, describe, expect, it } from 'vitest';
import { v7 } from 'uuid';
import { roles, type Role } from '../../shared/api/common';
import { healthyPanel } from '../../server/commands/demo/panels/healthy';
import { issuePanel, jobRequestFor, sendJob } from '../support/seedJobs';
import { seedRecord } from '../support/seedRecord';
import { seedPerson, seedSite, signIn, type Agent } from '../support/seedPeople';
import { enrolDevice } from '../support/signingDevice';
import { routesOf, type DeclaredRoute } from '../support/routes';
import { testServices } from '../support/testServices';

const server = await testServices();
afterAll(() => server.close());

const site = await seedSite(server.services, 'Halden Quay');
const otherSite = await seedSite(server.services, 'Elsewhere');
const everyRole = (of: string) => roles.map((role) => ({ site: of, role }));
const insider = await seedPerson(server.services, 'Ina Inside', everyRole(site));
await seedPerson(server.services, 'Otto Outside', everyRole(otherSite));
const worker = await seedPerson(server.services, 'Wim Worker', [{ site, role: 'electrician' }]);
for (const role of roles) await seedPerson(server.services, `Only ${role}`, [{ site, role }]);
const inside = await signIn(server.app, insider.email);
const outside = await signIn(server.app, 'otto.outside@example.org');
const only = new Map<Role, Agent>();
for (const role of roles) only.set(role, await signIn(server.app, `only.${role}@example.org`));

const panel = await issuePanel(inside, site, healthyPanel);
const points = healthyPanel.points.slice(0, 1).map(({ address }) => address);
const crew = { electricians: [worker.id], foreman: insider.id };
const { job, pack } = await sendJob(inside, panel, points, crew);
const { device } = await enrolDevice(await signIn(server.app, worker.email));
const record = await seedRecord(server.services, { site, job, pack, people: [worker.id, insider.id] });

/** A row of the own site for each kind of thing that a URL names. A new kind of URL needs a row here. */
const rows: Record<string, string> = {
  panels: panel,
  jobs: job,
  sites: site,
  people: worker.id,
  devices: device,
  records: record,
};

const settings = (await inside.get('/api/sites')).body.items[0].settings as object;
/** A body that would be taken from somebody of the own site, for every write that a row or a site bounds. */
const bodies: Record<string, () => object | Promise<object>> = {
  'patch /api/people/:id': () => ({ version: 1, name: 'Taken over' }),
  'patch /api/sites/:id': () => ({ version: 1, name: 'Taken over', settings }),
  'put /api/panels/:id/draft': () => ({ version: 1, panel: healthyPanel }),
  'post /api/panels/:id/revisions': () => ({ version: 1, acceptances: [] }),
  'post /api/jobs/:id/cancel': () => ({ words: 'Taken over' }),
  'post /api/jobs/:id/send': () => ({}),
  'post /api/devices/:id/revoke': () => ({}),
  'post /api/panels': () => ({ id: v7(), site, panel: { ...healthyPanel, tag: 'TAKEN' } }),
  'post /api/jobs/preview': () => ({ panel, revision: 1, points }),
  'post /api/jobs': () => jobRequestFor(inside, panel, points, crew),
  'post /api/invitations': () => ({
    id: v7(),
    name: 'Taken over',
    email: 'taken@example.org',
    language: 'en',
    roles: [{ site, role: 'foreman' }],
  }),
};
/** Writes that name nothing of a site: what they make belongs to who asks. */
const ownWrites = [
  'post /api/sites',
  'post /api/devices',
  'post /api/devices/keys',
  'post /api/panel-checks',
  'delete /api/session',
];

const nameOf = ({ method, path }: DeclaredRoute) => `${method} ${path}`;
const namesRow = ({ path }: DeclaredRoute) => path.includes(':id');

function urlOf(route: DeclaredRoute): string {
  const kind = /^\/api\/([^/]+)\/:id/.exec(route.path)?.[1];
  const row = kind === undefined ? undefined : rows[kind];
  if (namesRow(route) && row === undefined) throw new Error(`name a row of the site for ${nameOf(route)}`);
  return route.path
    .replace(':id', row ?? '')
    .replace(':number', '1')
    .replace(':sha256', 'a'.repeat(64));
}

const send = (agent: Agent, { method, path }: DeclaredRoute, url: string, body?: object) => {
  const verb = (['get', 'post', 'put', 'patch', 'delete'] as const).find((each) => each === method);
  if (!verb) throw new Error(`${method} ${path} is no method that this test knows`);
  return verb === 'get' ? agent.get(url) : agent[verb](url).send(body ?? {});
};

// Signing out ends the session that the others need.
const routes = routesOf(server.app)
  .filter(({ path }) => path.startsWith('/api/'))
  .sort((a, b) => Number(a.method === 'delete') - Number(b.method === 'delete'));
const byName = routes.map((route) => [nameOf(route), route] as const);
const guarded = byName.filter(([, { policy }]) => !(policy && 'who' in policy && policy.who === 'anyone'));
const admits = ({ policy }: DeclaredRoute, role: Role): boolean =>
  policy !== null && (!('roles' in policy) || policy.roles.includes(role));

it('finds the routes in the router itself', () => {
  const names = routes.map(nameOf);
  expect(names).toEqual(
    expect.arrayContaining([
      'post /api/session',
      'get /api/jobs/:id',
      'post /api/jobs/:id/entries',
      'get /api/records/:id.pdf',
    ]),
  );
  expect(new Set(names).size).toBe(names.length);
});

it('finds no route that does not say, first of all, who may call it', () => {
  expect(
    routesOf(server.app)
      .filter(({ policy }) => policy === null)
      .map(nameOf),
  ).toEqual([]);
});

it('opens to anybody only what must be open', () => {
  const open = byName.filter(([, { policy }]) => policy && 'who' in policy && policy.who === 'anyone');
  expect(open.map(([name]) => name).sort()).toEqual([
    'get /api/health/live',
    'get /api/health/ready',
    'get /api/openapi.json',
    'get /api/schema/panel.json',
    'post /api/invitations/accept',
    'post /api/invitations/look',
    'post /api/jobs/:id/entries',
    'post /api/password-resets',
    'post /api/password-resets/use',
    'post /api/session',
    'post /api/verify',
  ]);
});

describe('nobody signed in', () => {
  it.each(guarded)('%s asks for sign-in', async (_name, route) => {
    const answer = await send(request(server.app), route, urlOf(route)).expect(401);
    expect(answer.body.code).toBe('sign-in-needed');
  });
});

describe('each role on its own site', () => {
  it.each(guarded)('%s', async (_name, route) => {
    for (const [role, agent] of only) {
      const { status } = await send(agent, route, urlOf(route));
      if (admits(route, role)) expect([401, 403, 500], `${role} may`).not.toContain(status);
      else expect(status, `${role} may not`).toBe(403);
    }
  });
});

describe('all roles, on another site', () => {
  const reads = guarded.filter(([, { method }]) => method === 'get');
  const rowReads = reads.filter(([, route]) => namesRow(route));
  const lists = reads.filter(([, route]) => !namesRow(route));
  const writes = guarded.filter(([name, { method }]) => method !== 'get' && !ownWrites.includes(name));

  it.each(rowReads)('%s does not exist for them, and does for the own site', async (_name, route) => {
    await send(inside, route, urlOf(route)).expect(200);
    await send(outside, route, urlOf(route)).expect(404);
  });

  it.each(lists)('%s shows nothing of the other site', async (_name, route) => {
    const { text } = await send(outside, route, urlOf(route)).expect(200);
    for (const row of [...Object.values(rows), insider.id]) expect(text).not.toContain(row);
  });

  it.each(writes)('%s changes nothing there', async (name, route) => {
    const body = bodies[name];
    if (!body) throw new Error(`name a body that the own site may send for ${name}`);
    const before = await everything();
    const { status } = await send(outside, route, urlOf(route), await body());
    expect([403, 404]).toContain(status);
    expect(await everything()).toEqual(before);
  });
});

/** How often each table of the own database was written, rolled-back writes aside. */
async function everything(): Promise<unknown> {
  return server.services.database.query(
    `SELECT (SELECT json_agg(p ORDER BY p.id) FROM panel p) AS panels, (SELECT json_agg(j ORDER BY j.id) FROM job j) AS jobs,
       (SELECT json_agg(p ORDER BY p.id) FROM person p) AS people, (SELECT json_agg(s ORDER BY s.id) FROM site s) AS sites,
       (SELECT json_agg(d ORDER BY d.id) FROM device d) AS devices, (SELECT count(*) FROM audit) AS audit,
       (SELECT json_agg(r ORDER BY r.person, r.site, r.role) FROM person_role r) AS roles`,
  );
}
