import { gzipSync } from 'node:zlib';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import request from 'supertest';
import { v7 } from 'uuid';
import { entriesAnswer, headsProblem } from '../../shared/api/jobs';
import type { Entry } from '../../shared/job/entry';
import { entryHash } from '../../shared/job/entryBytes';
import * as pushes from '../support/entryPushes';
import { changed, withoutSignature } from '../support/entryPushes';
import { seedWorks, type Works } from '../support/seedWorks';
import { enrolDevice, newDevice, signed, type SigningDevice, SignedLog } from '../support/signingDevice';
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

describe('pushing entries', () => {
  it('keeps them in commit order with the hash of what was received, and needs no session', async () => {
    const log = await newLog();
    for (let n = 0; n < 3; n += 1) log.add();
    const answer = entriesAnswer.parse((await push(log).expect(200)).body);
    expect(answer.acknowledged).toEqual(
      log.entries.map(({ id }, index) => ({ id, order: index + 1, setAside: false })),
    );
    expect((await stored(log)).map(({ hash }) => hash)).toEqual(log.entries.map(entryHash));
    const page = await pull(log);
    expect(page.entries.map(({ order: _order, receivedAt: _at, ...entry }) => entry)).toEqual(log.entries);
    expect(page).toMatchObject({ after: 3, more: false });
    expect(page.logs).toEqual([
      { log: log.log, key: device.key, person: works.electricianId, publicKey: device.publicKey },
    ]);
  });

  it('answers a repeated push with the first orders and stores nothing more', async () => {
    const log = await newLog();
    log.add();
    log.add();
    const first = (await push(log).expect(200)).body;
    log.add();
    const again = (await push(log).expect(200)).body;
    expect(again.acknowledged.slice(0, 2)).toEqual(first.acknowledged);
    expect((await stored(log)).map(({ order }) => order)).toEqual([1, 2, 3]);
  });

  it('keeps each entry once when the same push arrives many times at the same moment', async () => {
    const log = await newLog();
    for (let n = 0; n < 20; n += 1) log.add();
    const answers = await Promise.all([1, 2, 3, 4, 5].map(() => push(log)));
    expect(new Set(answers.map(({ text }) => text)).size).toBe(1);
    expect((await stored(log)).map(({ order }) => order)).toEqual(
      Array.from({ length: 20 }, (_, n) => n + 1),
    );
  });

  it('gives two logs orders without a gap or a double', async () => {
    const log = await newLog();
    const own = new SignedLog(await enrolDevice(works.electrician), log.job, log.pack);
    for (let n = 0; n < 30; n += 1) {
      log.add();
      own.add();
    }
    const parts = [0, 10, 20].flatMap((at) => [
      [log, log.entries.slice(at, at + 10)] as const,
      [own, own.entries.slice(at, at + 10)] as const,
    ]);
    for (let at = 0; at < parts.length; at += 2)
      await Promise.all(parts.slice(at, at + 2).map(([each, entries]) => push(each, entries).expect(200)));
    expect((await stored(log)).map(({ order }) => order)).toEqual(
      Array.from({ length: 60 }, (_, n) => n + 1),
    );
  });

  it('takes a gzipped body', async () => {
    const log = await newLog();
    log.add();
    await request(server.app)
      .post(`/api/jobs/${log.job}/entries`)
      .type('json')
      .set('content-encoding', 'gzip')
      // Without this the client would write the bytes as JSON.
      .serialize((bytes: unknown) => bytes as string)
      .send(gzipSync(JSON.stringify(log.push())))
      .expect(200);
    expect(await stored(log)).toHaveLength(1);
  });

  it('takes entries of one push in any order', async () => {
    const log = await newLog();
    log.add();
    log.add();
    log.add();
    await push(log, [...log.entries].reverse()).expect(200);
    expect((await pull(log)).entries.map(({ seq }) => seq)).toEqual([1, 2, 3]);
  });

  it('keeps a kind that this version does not know, as it came', async () => {
    const log = await newLog();
    log.add({ kind: 'measured-by-drone', body: { height: 3.5, deep: { list: [1, null, 'x'] } } });
    await push(log).expect(200);
    expect((await pull(log)).entries[0]).toMatchObject({ kind: 'measured-by-drone', body: { height: 3.5 } });
  });
});

describe('a log that does not join', () => {
  it('is answered with the heads the server holds', async () => {
    const log = await newLog();
    for (let n = 0; n < 4; n += 1) log.add();
    await push(log, log.entries.slice(0, 1)).expect(200);
    const answer = await push(log, log.entries.slice(2)).expect(409);
    expect(headsProblem.parse(answer.body).heads).toEqual({ [log.log]: 1 });
    expect(await stored(log)).toHaveLength(1);
    await push(log, log.entries.slice(1)).expect(200);
    expect(await stored(log)).toHaveLength(4);
  });

  it('names 0 for a log the server has never heard of', async () => {
    const log = await newLog();
    log.add();
    log.add();
    const answer = await push(log, log.entries.slice(1)).expect(409);
    expect(answer.body.heads).toEqual({ [log.log]: 0 });
  });

  it('may be a fork: both branches are kept', async () => {
    const log = await newLog();
    const first = log.add();
    log.add();
    const branch = log.add({ body: { words: 'After a restored backup' } }, first);
    await push(log, log.entries.slice(0, 2)).expect(200);
    await push(log, [branch]).expect(200);
    expect((await pull(log)).entries.map(({ seq }) => seq)).toEqual([1, 2, 2]);
  });

  it('may fork at its first entry, and within one push', async () => {
    const log = await newLog();
    const first = log.add();
    log.add({ body: { words: 'Another first' } }, undefined);
    log.entries.pop();
    const other = signed(device, { ...withoutSignature(first), id: v7(), body: { words: 'Another first' } });
    const second = log.add({}, other);
    await push(log, [first, other, second]).expect(200);
    expect((await pull(log)).entries).toHaveLength(3);
  });

  it.each([
    ['a seq that jumps', (log: SignedLog) => jump(log)],
    ['a first entry that names one before', (log: SignedLog) => changed(log, { previous: 'a'.repeat(64) })],
  ])('is refused for %s', async (_name, make) => {
    const log = await newLog();
    log.add();
    const answer = await push(log, make(log)).expect(422);
    expect(answer.body.code).toBe('broken-log');
    expect(await stored(log)).toHaveLength(0);
  });
});

function jump(log: SignedLog): Entry[] {
  const [first] = log.entries;
  if (!first) throw new Error('the log is empty');
  return [
    first,
    signed(log.by, { ...withoutSignature(first), id: v7(), seq: 3, previous: entryHash(first) }),
  ];
}

describe('the same id with other content', () => {
  it('is set aside, and set aside again when it is sent again', async () => {
    const log = await newLog();
    const first = log.add();
    await push(log).expect(200);
    const other = signed(device, { ...withoutSignature(first), body: { words: 'Other words' } });
    const answer = (await push(log, [other]).expect(200)).body;
    expect(answer.acknowledged).toEqual([{ id: first.id, order: null, setAside: true }]);
    expect((await push(log, [other]).expect(200)).body).toEqual(answer);
    expect((await pull(log)).entries.map(({ body }) => body)).toEqual([first.body]);
    const aside = await server.services.database.query<unknown[]>(
      'SELECT 1 FROM entry_set_aside WHERE id = $1',
      [first.id],
    );
    expect(aside).toHaveLength(1);
  });

  it('keeps its place: what follows it is taken', async () => {
    const log = await newLog();
    const first = log.add();
    await push(log).expect(200);
    const other = signed(device, { ...withoutSignature(first), body: { words: 'Other words' } });
    const next = log.add({}, other);
    const answer = (await push(log, [other, next]).expect(200)).body;
    expect(answer.acknowledged.map((each: { setAside: boolean }) => each.setAside)).toEqual([true, false]);
  });

  it('is set aside when the id belongs to an entry of another job', async () => {
    const one = await newLog();
    const first = one.add();
    await push(one).expect(200);
    const two = await newLog();
    const stolen = signed(device, { ...withoutSignature(two.add()), id: first.id });
    const answer = (await push(two, [stolen]).expect(200)).body;
    expect(answer.acknowledged[0]).toEqual({ id: first.id, order: null, setAside: true });
  });
});

describe('signatures', () => {
  it('let the newest one speak for the entries before it', async () => {
    const log = await newLog();
    for (let n = 0; n < 3; n += 1) log.add();
    await push(log).expect(200);
  });

  it.each([
    ['changed content', (entry: Entry): Entry => ({ ...entry, body: { words: 'Not what was signed' } })],
    ['another key', (entry: Entry): Entry => signed(newDevice(), withoutSignature(entry))],
    ['an empty signature', (entry: Entry): Entry => ({ ...entry, signature: 'A'.repeat(86) })],
  ])('are refused for %s', async (_name, forge) => {
    const log = await newLog();
    const answer = await push(log, [forge(log.add())]).expect(422);
    expect(answer.body.code).toBe('bad-signature');
    expect(answer.body.errors[0].path).toBe('entries.0.signature');
    expect(await stored(log)).toHaveLength(0);
  });

  it('are refused when an entry within the chain was changed: the next one names another hash', async () => {
    const log = await newLog();
    const [first, second] = [log.add(), log.add()];
    const answer = await push(log, [{ ...first, body: { words: 'Changed' } }, second]);
    expect([409, 422]).toContain(answer.status);
    expect(await stored(log)).toHaveLength(0);
  });

  it('are checked for each branch of a fork', async () => {
    const log = await newLog();
    const first = log.add();
    const good = log.add();
    const bad = { ...log.add({}, first), body: { words: 'Forged' } };
    await push(log, [first, good, bad]).expect(422);
    expect(await stored(log)).toHaveLength(0);
  });
});

describe('refused pushes', () => {
  it('an unregistered key, another job’s log, a pack never issued', async () => {
    const log = await newLog();
    const unknown = new SignedLog(newDevice(), log.job, log.pack);
    unknown.add();
    expect((await push(unknown).expect(422)).body.code).toBe('unknown-key');
    const elsewhere = new SignedLog(device, (await newLog()).job, log.pack);
    elsewhere.add();
    const wrongJob = await request(server.app).post(`/api/jobs/${log.job}/entries`).send(elsewhere.push());
    expect(wrongJob.status).toBe(422);
    const noPack = new SignedLog(device, log.job, 'b'.repeat(64));
    noPack.add();
    expect((await push(noPack).expect(422)).body.code).toBe('unknown-pack');
    const otherPack = new SignedLog(device, log.job, (await newLog()).pack);
    otherPack.add();
    expect((await push(otherPack).expect(422)).body.code).toBe('unknown-pack');
    expect(await stored(log)).toHaveLength(0);
  });

  it('a job that does not exist', async () => {
    const log = new SignedLog(device, v7(), 'a'.repeat(64));
    log.add();
    await push(log).expect(404);
    await request(server.app).post('/api/jobs/not-an-id/entries').send(log.push()).expect(404);
  });

  it.each([
    ['501 entries', (log: SignedLog) => ({ ...log.push(), entries: Array(501).fill(log.entries[0]) }), 422],
    ['no entry', (log: SignedLog) => log.push([]), 422],
    ['an unknown key', (log: SignedLog) => ({ ...log.push(), more: 1 }), 422],
    [
      'an entry with an unknown key',
      (log: SignedLog) => log.push([{ ...log.entries[0], extra: 1 } as Entry]),
      422,
    ],
    ['a seq of 0', (log: SignedLog) => log.push(changed(log, { seq: 0 })), 422],
    [
      'a signature of wrong length',
      (log: SignedLog) => log.push([{ ...log.entries[0], signature: 'AA' } as Entry]),
      422,
    ],
    ['more than 1 MB', (log: SignedLog) => ({ ...log.push(), padding: 'x'.repeat(1_100_000) }), 413],
    [
      'an entry of more than 64 kB',
      (log: SignedLog) => log.push(changed(log, { body: { words: 'x'.repeat(70_000) } })),
      422,
    ],
    [
      'a lone surrogate',
      (log: SignedLog) => log.push([{ ...log.entries[0], body: { words: '\ud800' } } as Entry]),
      422,
    ],
    [
      'a seq past what is stored',
      (log: SignedLog) => log.push(changed(log, { seq: 3_000_000_000, previous: 'a'.repeat(64) })),
      409,
    ],
  ])('%s', async (_name, make, status) => {
    const log = await newLog();
    log.add();
    const answer = await request(server.app)
      .post(`/api/jobs/${log.job}/entries`)
      .send(make(log))
      .expect(status);
    expect(answer.type).toBe('application/problem+json');
    expect(await stored(log)).toHaveLength(0);
  });
});
