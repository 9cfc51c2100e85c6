import { Client } from 'pg';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import request from 'supertest';
import type { Entry } from '../../shared/job/entry';
import * as pushes from '../support/entryPushes';
import { withoutSignature } from '../support/entryPushes';
import { seedWorks, type Works } from '../support/seedWorks';
import { signIn } from '../support/seedPeople';
import { enrolDevice, signed, type SigningDevice, SignedLog } from '../support/signingDevice';
import type { TestServer } from '../support/testServices';

let works: Works;
let server: TestServer;
let device: SigningDevice;

beforeAll(async () => {
  works = await seedWorks();
  ({ server, device } = works);
});
afterAll(() => server.close());

const newLog = (by?: SigningDevice) => pushes.newLog(works, by);
const push = (log: SignedLog, entries?: readonly Entry[]) => pushes.push(works, log, entries);
const pull = (log: SignedLog, after?: number) => pushes.pull(works, log, after);
const stored = (log: SignedLog) => pushes.stored(works, log);

describe('pulling entries', () => {
  it('pages by the cursor and stays on it when nothing is new', async () => {
    const log = await newLog();
    for (let n = 0; n < 3; n += 1) log.add();
    await push(log).expect(200);
    expect((await pull(log, 2)).entries.map(({ seq }) => seq)).toEqual([3]);
    expect(await pull(log, 3)).toMatchObject({ entries: [], after: 3, more: false });
  });

  it('says when there is more than a page', async () => {
    const log = await newLog();
    for (let n = 0; n < 510; n += 1) log.add();
    await push(log, log.entries.slice(0, 500)).expect(200);
    await push(log, log.entries.slice(500)).expect(200);
    const first = await pull(log);
    expect(first).toMatchObject({ after: 500, more: true });
    expect((await pull(log, first.after)).entries).toHaveLength(10);
  });

  it('needs a session and a part in the job or an office of its site', async () => {
    const log = await newLog();
    await request(server.app).get(`/api/jobs/${log.job}/entries`).expect(401);
    await works.outsider.get(`/api/jobs/${log.job}/entries`).expect(404);
    await works.stranger.get(`/api/jobs/${log.job}/entries`).expect(404);
    await works.foreman.get(`/api/jobs/${log.job}/entries`).expect(200);
  });
});

describe('after access has ended', () => {
  it('what was signed is still taken, and marked', async () => {
    const log = await newLog();
    log.add();
    await push(log).expect(200);
    const lost = await enrolDevice(works.electrician);
    const late = new SignedLog(lost, log.job, log.pack);
    late.add({ kind: 'accepted', body: {} });
    await works.admin.post(`/api/devices/${lost.device}/revoke`).expect(200);
    await push(late).expect(200);
    expect((await stored(log)).map((each) => each.after_access)).toEqual([false, true]);
    works.electrician = await signIn(server.app, 'ada.electrician@example.org');
  });
});

describe('more pushes at once than the server works on', () => {
  it('are asked to come again, and lose nothing', async () => {
    const log = await newLog();
    log.add();
    const holder = new Client({ connectionString: server.ownerUrl });
    await holder.connect();
    await holder.query('BEGIN');
    await holder.query('SELECT 1 FROM job WHERE id = $1 FOR UPDATE', [log.job]);
    const waiting = Array.from({ length: 60 }, () => push(log).then((answer) => answer));
    await expect.poll(() => settled(waiting, 503), { timeout: 20_000 }).toBeGreaterThanOrEqual(20);
    await holder.query('COMMIT');
    await holder.end();
    const answers = await Promise.all(waiting);
    expect(new Set(answers.map(({ status }) => status))).toEqual(new Set([200, 503]));
    const refused = answers.find(({ status }) => status === 503);
    expect(refused?.headers['retry-after']).toBe('2');
    expect(refused?.body.code).toBe('busy');
    await push(log).expect(200);
    expect(await stored(log)).toHaveLength(1);
  });
});

/** How many of these have been answered with a status by now. */
async function settled(answers: Promise<{ status: number }>[], status: number): Promise<number> {
  const open = { status: 0 };
  const now = await Promise.all(answers.map((each) => Promise.race([each, Promise.resolve(open)])));
  return now.filter((each) => each.status === status).length;
}

describe('whose turn it is', () => {
  it('moves the job on when it is accepted', async () => {
    const log = await newLog();
    log.add({ kind: 'accepted', body: {} });
    await push(log).expect(200);
    const view = (await works.foreman.get(`/api/jobs/${log.job}`).expect(200)).body;
    expect(view.status).not.toBe('sent');
    expect(view.lastHeard).not.toBeNull();
  });
});

describe('what was received', () => {
  it('cannot be changed, deleted or emptied, not even by the tables’ owner', async () => {
    const log = await newLog();
    const first = log.add();
    await push(log).expect(200);
    await push(log, [signed(device, { ...withoutSignature(first), body: { words: 'Other' } })]).expect(200);
    const client = new Client({ connectionString: server.ownerUrl });
    await client.connect();
    for (const table of ['entry', 'entry_set_aside', 'pack', 'device_key'])
      for (const sql of [
        `UPDATE ${table} SET job = job`,
        `DELETE FROM ${table}`,
        `TRUNCATE ${table} CASCADE`,
      ])
        await expect(
          client.query(
            sql.replace('SET job = job', table === 'device_key' ? 'SET device = device' : 'SET job = job'),
          ),
        ).rejects.toThrow('append-only');
    await client.end();
    for (const table of ['entry', 'entry_set_aside', 'pack', 'device_key'])
      await expect(server.services.database.query(`DELETE FROM ${table}`)).rejects.toThrow(
        'permission denied',
      );
  });
});
