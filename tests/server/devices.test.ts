import request from 'supertest';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { v7 } from 'uuid';
import { z } from 'zod';
import { deviceView } from '../../shared/api/jobs';
import { seedPerson, seedSite, signIn, type Agent } from '../support/seedPeople';
import { enrolDevice, newDevice } from '../support/signingDevice';
import { testServices, type TestServer } from '../support/testServices';

let server: TestServer;
let site: string;
let electrician: Agent;
let colleague: Agent;
let admin: Agent;
let otherAdmin: Agent;

beforeAll(async () => {
  server = await testServices();
  site = await seedSite(server.services, 'Halden Quay');
  const otherSite = await seedSite(server.services, 'Elsewhere');
  await seedPerson(server.services, 'Ada Electrician', [{ site, role: 'electrician' }]);
  await seedPerson(server.services, 'Bo Electrician', [{ site, role: 'electrician' }]);
  await seedPerson(server.services, 'Ann Admin', [{ site, role: 'administrator' }]);
  await seedPerson(server.services, 'Otto Admin', [{ site: otherSite, role: 'administrator' }]);
  electrician = await signIn(server.app, 'ada.electrician@example.org');
  colleague = await signIn(server.app, 'bo.electrician@example.org');
  admin = await signIn(server.app, 'ann.admin@example.org');
  otherAdmin = await signIn(server.app, 'otto.admin@example.org');
});
afterAll(() => server.close());

const keyOf = ({ key: id, device, publicKey }: ReturnType<typeof newDevice>) => ({ id, device, publicKey });
const mailsTo = (email: string) =>
  server.services.database.query<{ kind: string }[]>(
    `SELECT data->>'kind' AS kind FROM mail_queue.job WHERE data->>'to' = $1 ORDER BY created_on`,
    [email],
  );
const list = async (agent: Agent) =>
  z.object({ items: z.array(deviceView) }).parse((await agent.get('/api/devices').expect(200)).body).items;

describe('a key on a device', () => {
  it('is registered once, however often it is sent, and its owner hears of it once', async () => {
    const before = (await mailsTo('ada.electrician@example.org')).length;
    const device = await enrolDevice(electrician);
    await enrolDevice(electrician, device);
    await Promise.all(
      [1, 2, 3].map(() => electrician.post('/api/devices/keys').send(keyOf(device)).expect(201)),
    );
    const kinds = (await mailsTo('ada.electrician@example.org')).slice(before).map(({ kind }) => kind);
    expect(kinds).toEqual(['key-registered']);
  });

  it('is that of whoever is signed in; a device is shared by people', async () => {
    const device = await enrolDevice(electrician);
    const hers = { ...newDevice(device.device) };
    await enrolDevice(colleague, hers);
    const shown = (await list(admin)).find(({ id }) => id === device.device);
    expect(shown?.people.map(({ name }) => name).sort()).toEqual(['Ada Electrician', 'Bo Electrician']);
  });

  it.each([
    [
      'the id of somebody else’s key',
      (mine: ReturnType<typeof newDevice>) => ({ ...keyOf(newDevice(mine.device)), id: mine.key }),
      409,
      'id-taken',
    ],
    [
      'somebody else’s key pair',
      (mine: ReturnType<typeof newDevice>) => ({ ...keyOf(mine), id: v7() }),
      409,
      'id-taken',
    ],
    ['a device nobody registered', () => keyOf(newDevice()), 404, 'not-found'],
    [
      'a point off the curve',
      (mine: ReturnType<typeof newDevice>) => ({
        ...keyOf(newDevice(mine.device)),
        publicKey: { ...mine.publicKey, y: mine.publicKey.x },
      }),
      422,
      'invalid',
    ],
    [
      'a private key',
      (mine: ReturnType<typeof newDevice>) => ({
        ...keyOf(mine),
        publicKey: { ...mine.publicKey, d: 'AAAA' },
      }),
      422,
      'invalid',
    ],
    [
      'another curve',
      (mine: ReturnType<typeof newDevice>) => ({
        ...keyOf(mine),
        publicKey: { ...mine.publicKey, crv: 'P-384' },
      }),
      422,
      'invalid',
    ],
    [
      'a key that is a list',
      (mine: ReturnType<typeof newDevice>) => ({ ...keyOf(mine), publicKey: [] }),
      422,
      'invalid',
    ],
  ])('is refused with %s', async (_name, make, status, code) => {
    const device = await enrolDevice(electrician);
    const answer = await colleague.post('/api/devices/keys').send(make(device)).expect(status);
    expect(answer.body.code).toBe(code);
  });

  it('needs a session', async () => {
    await request(server.app).post('/api/devices').send({ id: v7(), name: 'Phone' }).expect(401);
    await request(server.app).post('/api/devices/keys').send(keyOf(newDevice())).expect(401);
  });
});

describe('the list of devices', () => {
  it('shows an administrator those of their own people only', async () => {
    const device = await enrolDevice(electrician);
    expect((await list(admin)).map(({ id }) => id)).toContain(device.device);
    expect(await list(otherAdmin)).toEqual([]);
    await electrician.get('/api/devices').expect(403);
  });
});

describe('a lost device', () => {
  it('takes no key any more, and the sessions of its people end', async () => {
    const device = await enrolDevice(electrician);
    const answer = await admin.post(`/api/devices/${device.device}/revoke`).expect(200);
    expect(deviceView.parse(answer.body).revokedAt).not.toBeNull();
    await electrician.get('/api/session').expect(401);
    electrician = await signIn(server.app, 'ada.electrician@example.org');
    const answerToKey = await electrician
      .post('/api/devices/keys')
      .send(keyOf(newDevice(device.device)))
      .expect(409);
    expect(answerToKey.body.code).toBe('device-revoked');
    await admin.post(`/api/devices/${device.device}/revoke`).expect(200);
  });

  it('is not known to an administrator of another site', async () => {
    const device = await enrolDevice(electrician);
    await otherAdmin.post(`/api/devices/${device.device}/revoke`).expect(404);
    await admin.post(`/api/devices/${v7()}/revoke`).expect(404);
  });
});
