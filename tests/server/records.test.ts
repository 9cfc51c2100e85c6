import { execFileSync } from 'node:child_process';
import { mkdtempSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { Client } from 'pg';
import request from 'supertest';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import type { Pack } from '../../shared/api/jobs';
import { recordView, type RecordView } from '../../shared/api/recordDocument';
import { recordRow, verifyAnswer, type RecordRow } from '../../shared/api/records';
import { page } from '../../shared/api/common';
import { digestOf } from '../../shared/panel/canonical';
import { formatNumber } from '../../shared/wording/render';
import { healthyPanel } from '../../server/commands/demo/panels/healthy';
import { chainBreaks } from '../../server/features/records/chainBreaks';
import type { Queries } from '../../server/features/records/verifying';
import { recordPdf } from '../../server/features/records/pdf/recordPdf';
import { sealOf, sha256Of } from '../../server/features/records/seal';
import type { Unready } from '../../server/features/records/ready';
import { goodValue, answerBody } from '../support/jobScenario';
import { issuePanel, sendJob } from '../support/seedJobs';
import { seedPerson, seedSite, signIn, type Agent } from '../support/seedPeople';
import { sampleRecord, widePanel } from '../support/recordSample';
import { SignedJob } from '../support/signedJob';
import { enrolDevice, signed, type SigningDevice } from '../support/signingDevice';
import { testServices, type TestServer } from '../support/testServices';

let server: TestServer;
let owner: Client;
let site: string;
let panel: string;
const agents: Record<string, Agent> = {};
const ids: Record<string, string> = {};
const keys = new Map<string, SigningDevice>();

const crew = [
  ['Pia Panel', 'panel-engineer'],
  ['Finn Foreman', 'foreman'],
  ['Ada Volt', 'electrician'],
  ['Bo Ampere', 'electrician'],
  ['Sam Safety', 'safety-officer'],
] as const;
const agent = (name: string): Agent => {
  const found = agents[name];
  if (!found) throw new Error(`nobody is called ${name}`);
  return found;
};

beforeAll(async () => {
  server = await testServices();
  owner = new Client({ connectionString: server.ownerUrl });
  await owner.connect();
  site = await seedSite(server.services, 'Halden Quay');
  const elsewhere = await seedSite(server.services, 'Elsewhere');
  for (const [name, role] of crew) ids[name] = (await seedPerson(server.services, name, [{ site, role }])).id;
  await seedPerson(server.services, 'Otto Other', [{ site: elsewhere, role: 'safety-officer' }]);
  for (const name of [...crew.map(([each]) => each), 'Otto Other'])
    agents[name] = await signIn(server.app, `${name.toLowerCase().replace(' ', '.')}@example.org`);
  for (const name of ['Ada Volt', 'Finn Foreman']) keys.set(ids[name] ?? '', await enrolDevice(agent(name)));
  panel = await issuePanel(agent('Pia Panel'), site, healthyPanel);
});
afterAll(async () => {
  await owner.end();
  await server.close();
});

const points = healthyPanel.points.slice(0, 2).map(({ address }) => address);

async function givenJob(): Promise<SignedJob> {
  const people = { electricians: [ids['Ada Volt'] ?? ''], foreman: ids['Finn Foreman'] ?? '' };
  const { job } = await sendJob(agent('Finn Foreman'), panel, points, people);
  const answer = await agent('Ada Volt').get('/api/my/packs').expect(200);
  const pack = (answer.body as { packs: Pack[] }).packs.find((each) => each.job.id === job);
  if (!pack) throw new Error('the pack did not arrive');
  return new SignedJob(pack, keys);
}
async function sealedJob(): Promise<SignedJob> {
  const job = await givenJob();
  job.work();
  job.sign();
  job.countersign();
  await job.deliver(agent('Ada Volt'));
  return job;
}
let shared: Promise<SignedJob> | undefined;
/** One sealed job that tests only read. */
const anySealed = (): Promise<SignedJob> => (shared ??= sealedJob());
const rows = async (query = '', who = 'Sam Safety'): Promise<RecordRow[]> =>
  page(recordRow).parse((await agent(who).get(`/api/records?${query}`).expect(200)).body).items;
async function recordOf(job: SignedJob): Promise<RecordView> {
  const row = (await rows()).find(({ jobNumber }) => jobNumber === job.packed.job.number);
  if (!row) throw new Error('no record');
  return recordView.parse((await agent('Sam Safety').get(`/api/records/${row.id}`).expect(200)).body);
}
const verify = async (body: unknown) =>
  verifyAnswer.parse(
    (
      await request(server.app)
        .post('/api/verify')
        .send(body as object)
        .expect(200)
    ).body,
  );
async function pdfOf(record: string): Promise<Buffer> {
  const answer = await agent('Sam Safety')
    .get(`/api/records/${record}.pdf`)
    .buffer(true)
    .parse((response, done) => {
      const parts: Buffer[] = [];
      response.on('data', (part: Buffer) => parts.push(part));
      response.on('end', () => done(null, Buffer.concat(parts)));
    })
    .expect(200);
  return answer.body as Buffer;
}
function textOf(pdf: Buffer): string {
  const file = join(mkdtempSync(join(tmpdir(), 'coldloop-pdf-')), 'record.pdf');
  writeFileSync(file, pdf);
  return execFileSync('pdftotext', ['-layout', file, '-'], { encoding: 'utf8', maxBuffer: 64 * 1024 * 1024 });
}

describe('sealing', () => {
  it('seals a completed, countersigned job when its last entry arrives', async () => {
    const job = await sealedJob();
    const record = await recordOf(job);
    const { document } = record;
    expect(digestOf(document)).toBe(record.digest);
    expect(record.seal).toBe(sealOf(record.previousSeal, record.digest));
    expect(document.panel).toMatchObject({ tag: healthyPanel.tag, revision: 1 });
    expect(document.scope).toEqual(points);
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
    const view = await agent('Finn Foreman').get(`/api/jobs/${job.id}`).expect(200);
    expect(view.body).toMatchObject({ status: 'sealed', record: record.id });
  });

  it('queues the mail with number, seal and PDF for the safety officer and the foreman', async () => {
    const record = await recordOf(await anySealed());
    const mails = await server.services.database.query<{ data: Record<string, unknown> }[]>(
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
    for (let n = 0; n < 3; n += 1) await sealedJob();
    const chain = (await rows()).reverse();
    expect(chain.length).toBeGreaterThanOrEqual(3);
    expect(chain.map(({ number }) => number)).toEqual(chain.map((_, index) => index + 1));
    let previous: string | null = null;
    for (const { digest, seal } of chain) {
      expect(seal).toBe(sealOf(previous, digest));
      previous = seal;
    }
    expect(await chainBreaks(server.services.database)).toEqual([
      { site: 'Halden Quay', records: chain.length, broken: null },
    ]);
  });

  it('numbers two jobs that are sealed at once one after the other', async () => {
    const before = (await rows()).length;
    await Promise.all([sealedJob(), sealedJob()]);
    const numbers = (await rows()).map(({ number }) => number);
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
    const job = await givenJob();
    job.work();
    finish(job);
    await job.deliver(agent('Ada Volt'));
    const outcome = await server.services.sealing.sealIfReady(job.id);
    expect(outcome).toEqual({ sealed: false, reasons: expect.arrayContaining([reason]) as Unready[] });
    expect((await rows()).some(({ jobNumber }) => jobNumber === job.packed.job.number)).toBe(false);
  });

  it('waits while an entry is set aside, until somebody decides', async () => {
    const job = await givenJob();
    job.work();
    job.sign();
    const [first] = job.entries;
    await job.deliver(agent('Ada Volt'));
    const key = keys.get(ids['Ada Volt'] ?? '');
    if (!first || !key) throw new Error('no entry');
    const { signature: _signature, ...rest } = first;
    const twin = signed(key, { ...rest, at: '2026-11-30T09:00:00.000Z' });
    const body = { logs: { [twin.log]: key.key }, entries: [twin] };
    await request(server.app).post(`/api/jobs/${job.id}/entries`).send(body).expect(200);
    job.countersign();
    await job.deliver(agent('Ada Volt'));
    const outcome = await server.services.sealing.sealIfReady(job.id);
    expect(outcome).toEqual({ sealed: false, reasons: expect.arrayContaining(['set-aside']) as Unready[] });
  });
});

describe('entries after the seal', () => {
  it('become a numbered amendment in the same chain, and the first record stays as it was', async () => {
    const job = await sealedJob();
    const first = await recordOf(job);
    job.write(job.person('electrician'), 'note', { words: 'The lid of the duct was cracked' });
    await job.deliver(agent('Ada Volt'));
    const [amendment] = await rows();
    expect(amendment).toMatchObject({
      amendment: true,
      number: first.number + 1,
      jobNumber: first.jobNumber,
    });
    const after = recordView.parse((await agent('Sam Safety').get(`/api/records/${first.id}`)).body);
    expect(after.document).toEqual(first.document);
    expect(after.amendedBy).toEqual([first.number + 1]);
    const late = recordView.parse((await agent('Sam Safety').get(`/api/records/${amendment?.id}`)).body);
    expect(late.document.amends).toEqual({ number: first.number, digest: first.digest });
    expect(late.document.notes.map(({ words }) => words)).toEqual(['The lid of the duct was cracked']);
    expect(await verify({ digest: first.digest })).toMatchObject({
      known: true,
      chainHolds: true,
      amendedBy: [late.number],
    });
    expect(await server.services.sealing.sealIfReady(job.id)).toEqual({ sealed: false, reasons: [] });
  });
});

describe('what was sealed', () => {
  it('is refused any change by the database, to the application and to the owner of the tables', async () => {
    for (const table of ['record', 'record_pdf'])
      for (const sql of [
        `UPDATE ${table} SET ${table === 'record' ? 'foreman' : 'sha256'} = 'x'`,
        `DELETE FROM ${table}`,
      ]) {
        await expect(server.services.database.query(sql)).rejects.toThrow('permission denied');
        await pdfOf((await rows())[0]?.id ?? '');
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
    expect((await chainBreaks(server.services.database))[0]?.broken).toBeNull();
  });
});

const sealedSample = {
  number: 214,
  digest: 'f'.repeat(64),
  previousSeal: '1'.repeat(64),
  seal: '2'.repeat(64),
  sealedAt: new Date('2026-11-30T13:00:00Z'),
  verifyUrl: 'http://localhost:4310/verify?digest=x',
};

describe('the PDF', () => {
  it('holds panel, every reading, every answer’s step, both names, seal and digest', async () => {
    const record = await recordOf(await anySealed());
    const text = textOf(await pdfOf(record.id));
    const flat = text.replace(/\s+/g, ' ');
    const { document } = record;
    for (const said of [
      document.panel.tag,
      document.panel.name,
      document.site.name,
      record.seal,
      record.digest,
      'Ada Volt',
      'Finn Foreman',
    ])
      expect(flat).toContain(said);
    for (const { value, unit } of document.deadTests)
      expect(flat).toContain(`${formatNumber(value)} ${unit}`);
    const answers = [...document.points.flatMap((point) => point.answers), ...document.steps];
    const readings = answers.filter(({ answer }) => /\d (V AC|V DC|Ω|MΩ|mA|A|Nm)$/.test(answer));
    expect(readings.length).toBeGreaterThan(0);
    for (const { answer } of readings) expect(flat).toContain(answer);
    for (const address of document.scope) expect(flat).toContain(address);
    for (const { isolator, lock } of document.lockOut)
      expect(flat).toMatch(new RegExp(`${isolator} +${lock}`));
    expect(flat).toContain('I did this work and these answers are mine');
    expect(flat).toContain('I reviewed this work and accept it');
  });

  it('shows the loop of a point with an exception, in words too, and what happened to it', async () => {
    const job = await givenJob();
    let wrong = true;
    job.work((step, doing) => {
      if (!wrong || step.stage !== 'wire' || step.where?.point === undefined || step.ask.kind !== 'choice')
        return false;
      const bad = step.ask.options.find(({ ok }) => !ok);
      if (!bad) return false;
      wrong = false;
      doing.write(
        job.person('electrician'),
        'answer',
        answerBody(step, { kind: 'choice', value: bad.value }),
      );
      return true;
    });
    job.sign();
    job.countersign();
    await job.deliver(agent('Ada Volt'));
    const record = await recordOf(job);
    expect(record.exceptions).toBe(1);
    expect((await rows('exceptions=true')).map(({ id }) => id)).toContain(record.id);
    const out = record.document.points.find(({ answers }) =>
      answers.some(({ verdict }) => verdict === 'out'),
    );
    const plain = record.document.points.find(({ answers }) =>
      answers.every(({ verdict }) => verdict === 'ok'),
    );
    const drawn = healthyPanel.points.find(({ address }) => address === out?.address);
    const pdf = await pdfOf(record.id);
    const flat = textOf(pdf).replace(/\s+/g, ' ');
    expect(flat).toContain('out of limits');
    // The device's tag stands in the picture only.
    expect(flat).toContain(drawn?.device.tag);
    expect(plain).toBeDefined();
    const undrawn = healthyPanel.points.find(({ address }) => address === plain?.address);
    expect(flat).not.toContain(`${undrawn?.device.tag} `);
  });

  it('is written in the language it was signed in', async () => {
    const document = sampleRecord(4, 'es');
    const made = await recordPdf({ ...sealedSample, document, panel: widePanel(4) });
    const flat = textOf(made).replace(/\s+/g, ' ');
    for (const said of ['Pruebas de ausencia de tensión', 'Íñigo Salas', 'Ω', '≥', 'mm²'])
      expect(flat).toContain(said);
    expect(made.toString('latin1')).toContain('/Lang (es)');
  });

  it('of 500 points takes less than 5 s of work and 5 MB', async () => {
    const document = sampleRecord(500);
    const begun = process.cpuUsage();
    const at = Date.now();
    const made = await recordPdf({ ...sealedSample, document, panel: widePanel(500) });
    const { user, system } = process.cpuUsage(begun);
    const seconds = (user + system) / 1e6;
    console.log(
      `500 points: ${seconds.toFixed(1)} s of work, ${Date.now() - at} ms passed, ${made.length} bytes`,
    );
    expect(seconds).toBeLessThan(5);
    expect(made.length).toBeLessThan(5 * 1024 * 1024);
    const text = textOf(made);
    for (const { address, terminal } of document.points) expect(text).toContain(`${terminal} ${address}`);
  });

  it('is made once and found by its hash, and no other file is', async () => {
    const record = await recordOf(await anySealed());
    const pdf = await pdfOf(record.id);
    expect((await pdfOf(record.id)).equals(pdf)).toBe(true);
    expect(await verify({ digest: sha256Of(pdf) })).toEqual({
      known: true,
      chainHolds: true,
      panelTag: healthyPanel.tag,
      date: record.sealedAt,
      number: record.number,
      amendedBy: [],
    });
    const changed = Buffer.concat([pdf, Buffer.from(' ')]);
    expect(await verify({ digest: sha256Of(changed) })).toEqual({ known: false });
    expect(pdf.toString('latin1').match(/\b[0-9a-f]{64}\b/)?.[0]).toBe(record.digest);
  });
});

describe('verifying', () => {
  it('knows a record by its digest and says no more than panel and date', async () => {
    const record = await recordOf(await anySealed());
    expect(await verify({ digest: record.digest })).toEqual({
      known: true,
      chainHolds: true,
      panelTag: healthyPanel.tag,
      date: record.sealedAt,
      amendedBy: [],
    });
  });
  it('knows the JSON that was downloaded, and not one with a single changed letter', async () => {
    const record = await recordOf(await anySealed());
    const json = await agent('Sam Safety').get(`/api/records/${record.id}.json`).expect(200);
    expect(sha256Of(json.text)).toBe(record.digest);
    const whole = JSON.parse(json.text) as Record<string, unknown>;
    expect(await verify({ record: whole })).toMatchObject({
      known: true,
      chainHolds: true,
      number: record.number,
    });
    expect(await verify({ record: { ...whole, language: 'es' } })).toEqual({ known: false });
  });
  it('takes whole digests only', async () => {
    const short = await request(server.app).post('/api/verify').send({ digest: 'abc123' });
    expect(short.status).toBe(422);
  });
});

describe('the list', () => {
  it.each([
    ['panel', `panel=${healthyPanel.tag.toLowerCase()}`, true],
    ['panel', 'panel=NOWHERE', false],
    ['person', 'person=ada', true],
    ['person', 'person=Zed', false],
    ['point', `point=${points[0]}`, true],
    ['point', 'point=%25', false],
    ['lock', 'lock=A-', true],
    ['lock', 'lock=99999', false],
    ['from', 'from=2020-01-01', true],
    ['to', 'to=2020-01-01', false],
    ['exceptions', 'exceptions=true', false],
  ])('filters by %s: %s', async (_name, query, found) => {
    await anySealed();
    expect((await rows(`site=${site}&${query}`)).length > 0).toBe(found);
  });

  it('pages through everything once', async () => {
    const all = await rows();
    const seen: string[] = [];
    let after: string | null = '';
    while (after !== null) {
      const answer = await agent('Sam Safety').get(`/api/records?limit=2${after && `&after=${after}`}`);
      const read = page(recordRow).parse(answer.body);
      seen.push(...read.items.map(({ id }) => id));
      after = read.next;
    }
    expect(seen).toEqual(all.map(({ id }) => id));
  });

  it('is closed to other sites and to electricians who were not on the job', async () => {
    const record = await recordOf(await anySealed());
    expect(await rows('', 'Otto Other')).toEqual([]);
    expect(await rows('', 'Bo Ampere')).toEqual([]);
    expect((await rows('', 'Ada Volt')).length).toBeGreaterThan(0);
    for (const name of ['Otto Other', 'Bo Ampere'])
      for (const form of ['', '.json', '.pdf'])
        await agent(name).get(`/api/records/${record.id}${form}`).expect(404);
    await request(server.app).get(`/api/records/${record.id}`).expect(401);
  });
});
