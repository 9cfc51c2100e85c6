import { Client } from 'pg';
import request from 'supertest';
import { afterAll, beforeAll, describe, expect, it, vi } from 'vitest';
import { healthyPanel } from '../../server/commands/demo/panels/healthy';
import { chainBreaks } from '../../server/features/records/chainBreaks';
import type { Unready } from '../../server/features/records/ready';
import { sealOf } from '../../server/features/records/seal';
import type { Queries } from '../../server/features/records/verifying';
import { digestOf } from '../../shared/panel/canonical';
import { answerBody, goodValue } from '../support/jobScenario';
import { RecordsOffice, workedPoints } from '../support/recordsOffice';
import type { SignedJob } from '../support/signedJob';
import { signed } from '../support/signingDevice';

let office: RecordsOffice;
let owner: Client;

beforeAll(async () => {
  office = await RecordsOffice.open();
  owner = new Client({ connectionString: office.server.ownerUrl });
  await owner.connect();
});
afterAll(async () => {
  await owner.end();
  await office.server.close();
});

describe('sealing', () => {
  it('seals a completed, countersigned job when its last entry arrives', async () => {
    const job = await office.sealedJob();
    const record = await office.recordOf(job);
    const { document } = record;
    expect(digestOf(document)).toBe(record.digest);
    expect(record.seal).toBe(sealOf(record.previousSeal, record.digest));
    expect(document.panel).toMatchObject({ tag: healthyPanel.tag, revision: 1 });
    expect(document.scope).toEqual(workedPoints);
    expect(document.signatures.map(({ kind, name }) => `${kind} ${name}`)).toEqual([
      'signed Ada Volt',
      'countersigned Finn Foreman',
    ]);
    const answered = job.entries.filter(({ kind }) => kind === 'answer').length;
    const locks = job.entries.filter(({ kind }) => kind === 'lock-on' || kind === 'lock-off').length;
    const closed = job.entries.filter(({ kind }) => kind === 'closed').length;
    const recorded = document.points.flatMap(({ answers }) => answers).length + document.steps.length;
    expect(recorded + document.deadTests.length).toBe(answered + locks + closed);
    expect(document.lockOut.map(({ isolator }) => isolator)).toEqual(job.packed.checklist.isolators);
    expect(document.lockOut.every(({ offAt }) => offAt !== null)).toBe(true);
    const heads = Object.fromEntries(document.logs.map(({ log, seq }) => [log, seq]));
    expect(heads).toEqual(
      Object.fromEntries([...job.devices.values()].map(({ log, head }) => [log, head?.seq])),
    );
    const view = await office.agent('Finn Foreman').get(`/api/jobs/${job.id}`).expect(200);
    expect(view.body).toMatchObject({ status: 'sealed', record: record.id });
  });

  it('queues the mail with number, seal and PDF for the safety officer and the foreman', async () => {
    const record = await office.recordOf(await office.anySealed());
    const mails = await office.server.services.database.query<{ data: Record<string, unknown> }[]>(
      `SELECT data FROM mail_queue.job WHERE data->>'kind' = 'record-sealed' AND data->'params'->>'seal' = $1`,
      [record.seal],
    );
    expect(mails.map(({ data }) => data.to).sort()).toEqual([
      'finn.foreman@example.org',
      'sam.safety@example.org',
    ]);
    expect(mails[0]?.data).toMatchObject({
      params: { number: record.number, panel: healthyPanel.tag },
      attachment: { record: record.id },
    });
  });

  it('gives consecutive numbers and links each seal to the one before', async () => {
    for (let n = 0; n < 3; n += 1) await office.sealedJob();
    const chain = (await office.rows()).reverse();
    expect(chain.length).toBeGreaterThanOrEqual(3);
    expect(chain.map(({ number }) => number)).toEqual(chain.map((_, index) => index + 1));
    let previous: string | null = null;
    for (const { digest, seal } of chain) {
      expect(seal).toBe(sealOf(previous, digest));
      previous = seal;
    }
    expect(await chainBreaks(office.server.services.database)).toEqual([
      { site: 'Halden Quay', records: chain.length, broken: null },
    ]);
  });

  it('numbers two jobs that are sealed at once one after the other', async () => {
    const before = (await office.rows()).length;
    await Promise.all([office.sealedJob(), office.sealedJob()]);
    const numbers = (await office.rows()).map(({ number }) => number);
    expect(numbers.slice(0, 2).sort((a, b) => a - b)).toEqual([before + 1, before + 2]);
  });
});

describe('a job that is not ready', () => {
  const cases: [string, (job: SignedJob) => void, Unready][] = [
    ['is signed and not countersigned', (job) => job.sign(), 'not-countersigned'],
    [
      'is countersigned over a digest that is not of what was done',
      (job) => {
        job.sign();
        job.countersign({ digest: 'e'.repeat(64) });
      },
      'digest',
    ],
    [
      'has an answer that the countersigner had not heard',
      (job) => {
        job.sign();
        job.countersign();
        const step = job.checklist.steps.find(({ ask }) => ask.kind === 'reading');
        if (!step) throw new Error('no reading is asked');
        const value = goodValue(step.ask) ?? { kind: 'done' };
        job.writeDeaf(job.device(job.person('electrician')), 'answer', answerBody(step, value));
      },
      'not-countersigned',
    ],
  ];
  it.each(cases)('%s: stays unsealed and says why', async (_name, finish, reason) => {
    const job = await office.givenJob();
    job.work();
    finish(job);
    await job.deliver(office.agent('Ada Volt'));
    const outcome = await office.server.services.sealing.sealIfReady(job.id);
    expect(outcome).toEqual({ sealed: false, reasons: expect.arrayContaining([reason]) as Unready[] });
    expect((await office.rows()).some(({ jobNumber }) => jobNumber === job.packed.job.number)).toBe(false);
  });

  it('waits while an entry is set aside, until somebody decides', async () => {
    const job = await office.givenJob();
    job.work();
    job.sign();
    const [first] = job.entries;
    await job.deliver(office.agent('Ada Volt'));
    const key = office.keyOf('Ada Volt');
    if (!first) throw new Error('no entry');
    const { signature: _signature, ...rest } = first;
    const twin = signed(key, { ...rest, at: '2026-11-30T09:00:00.000Z' });
    const body = { logs: { [twin.log]: key.key }, entries: [twin] };
    await request(office.server.app).post(`/api/jobs/${job.id}/entries`).send(body).expect(200);
    job.countersign();
    await job.deliver(office.agent('Ada Volt'));
    const outcome = await office.server.services.sealing.sealIfReady(job.id);
    expect(outcome).toEqual({ sealed: false, reasons: expect.arrayContaining(['set-aside']) as Unready[] });
  });
});

describe('entries after the seal', () => {
  it('become a numbered amendment in the same chain, and the first record stays as it was', async () => {
    const job = await office.sealedJob();
    const first = await office.recordOf(job);
    job.write(job.person('electrician'), 'note', { words: 'The lid of the duct was cracked' });
    await job.deliver(office.agent('Ada Volt'));
    const [amendment] = await office.rows();
    expect(amendment).toMatchObject({
      amendment: true,
      number: first.number + 1,
      jobNumber: first.jobNumber,
    });
    const after = await office.view(first.id);
    expect(after.document).toEqual(first.document);
    expect(after.amendedBy).toEqual([first.number + 1]);
    const late = await office.view(amendment?.id ?? '');
    expect(late.document.amends).toEqual({ number: first.number, digest: first.digest });
    expect(late.document.notes.map(({ words }) => words)).toEqual(['The lid of the duct was cracked']);
    expect(await office.verify({ digest: first.digest })).toMatchObject({
      known: true,
      chainHolds: true,
      amendedBy: [late.number],
    });
    expect(await office.server.services.sealing.sealIfReady(job.id)).toEqual({ sealed: false, reasons: [] });
  });
});

describe('a server that failed between taking entries and sealing', () => {
  it('seals and amends later what it missed, each once', async () => {
    const failing = vi
      .spyOn(office.server.services.sealing, 'sealIfReady')
      .mockRejectedValue(new Error('stopped'));
    const job = await office.sealedJob();
    failing.mockRestore();
    const numbers = async () =>
      (await office.rows('limit=200')).filter(({ jobNumber }) => jobNumber === job.packed.job.number);
    expect(await numbers()).toEqual([]);
    await office.server.services.sealing.sealWaiting();
    expect(await numbers()).toHaveLength(1);

    const again = vi
      .spyOn(office.server.services.sealing, 'sealIfReady')
      .mockRejectedValue(new Error('stopped'));
    job.write(job.person('electrician'), 'note', { words: 'Left the key with the guard' });
    await job.deliver(office.agent('Ada Volt'));
    again.mockRestore();
    await Promise.all([
      office.server.services.sealing.sealWaiting(),
      office.server.services.sealing.sealWaiting(),
    ]);
    expect((await numbers()).map(({ amendment }) => amendment)).toEqual([true, false]);
  });
});

describe('what was sealed', () => {
  it('is refused any change by the database, to the application and to the owner of the tables', async () => {
    for (const table of ['record', 'record_pdf'])
      for (const sql of [
        `UPDATE ${table} SET ${table === 'record' ? 'foreman' : 'sha256'} = 'x'`,
        `DELETE FROM ${table}`,
      ]) {
        await expect(office.server.services.database.query(sql)).rejects.toThrow('permission denied');
        await office.pdfOf((await office.rows())[0]?.id ?? '');
        await expect(owner.query(sql)).rejects.toThrow('append-only');
      }
    await expect(owner.query('TRUNCATE record CASCADE')).rejects.toThrow('append-only');
    await expect(owner.query('TRUNCATE record_pdf')).rejects.toThrow('append-only');
    await expect(owner.query('DELETE FROM record_chain')).rejects.toThrow('append-only');
    await expect(owner.query('UPDATE record_chain SET last_number = last_number - 1')).rejects.toThrow(
      'only grows',
    );
  });

  it('belongs to no role that the application works as', async () => {
    const found = await owner.query<{ tableowner: string }>(
      `SELECT tableowner FROM pg_tables WHERE tablename IN ('record', 'record_pdf', 'record_chain')`,
    );
    expect(found.rows).toHaveLength(3);
    expect(found.rows.map(({ tableowner }) => tableowner)).not.toContain('coldloop_app');
  });

  const tampering: [string, string, string][] = [
    [
      'a changed answer',
      `UPDATE record SET content = replace(content, 'Ada Volt', 'Eve Volt') WHERE number = 2`,
      'content',
    ],
    ['a changed digest', `UPDATE record SET digest = repeat('0', 64) WHERE number = 2`, 'seal'],
    ['a changed seal', `UPDATE record SET seal = repeat('0', 64) WHERE number = 2`, 'seal'],
    ['a record taken out', `DELETE FROM record WHERE number = 2`, 'missing'],
    ['a tail cut off', `DELETE FROM record WHERE number = (SELECT max(number) FROM record)`, 'cut'],
    ['a changed PDF', `UPDATE record_pdf SET content = content || '\\x00'::bytea`, 'pdf'],
  ];
  it.each(tampering)('shows %s when the owner lifts the triggers', async (_name, sql, why) => {
    await owner.query('BEGIN');
    try {
      await owner.query('ALTER TABLE record DISABLE TRIGGER ALL; ALTER TABLE record_pdf DISABLE TRIGGER ALL');
      await owner.query(sql);
      // The walk reads on the same connection, so that the change is undone afterwards.
      const database: Queries = {
        query: async <T>(text: string, values?: unknown[]) => (await owner.query(text, values)).rows as T,
      };
      const [report] = await chainBreaks(database);
      expect(report?.broken?.why).toBe(why);
    } finally {
      await owner.query('ROLLBACK');
    }
    expect((await chainBreaks(office.server.services.database))[0]?.broken).toBeNull();
  });
});
