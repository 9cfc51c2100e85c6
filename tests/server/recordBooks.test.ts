import request from 'supertest';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { healthyPanel } from '../../server/commands/demo/panels/healthy';
import { recordPdf } from '../../server/features/records/pdf/recordPdf';
import { sha256Of } from '../../server/features/records/seal';
import { page } from '../../shared/api/common';
import { recordRow } from '../../shared/api/records';
import { formatNumber } from '../../shared/wording/render';
import { answerBody } from '../support/jobScenario';
import { sampleRecord, widePanel } from '../support/recordSample';
import { RecordsOffice, textOf, workedPoints } from '../support/recordsOffice';

let office: RecordsOffice;
beforeAll(async () => {
  office = await RecordsOffice.open();
});
afterAll(() => office.server.close());

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
    const record = await office.recordOf(await office.anySealed());
    const flat = textOf(await office.pdfOf(record.id));
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
    const job = await office.givenJob();
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
    await job.deliver(office.agent('Ada Volt'));
    const record = await office.recordOf(job);
    expect(record.exceptions).toBe(1);
    expect((await office.rows('exceptions=true')).map(({ id }) => id)).toContain(record.id);
    const out = record.document.points.find(({ answers }) =>
      answers.some(({ verdict }) => verdict === 'out'),
    );
    const plain = record.document.points.find(({ answers }) =>
      answers.every(({ verdict }) => verdict === 'ok'),
    );
    const drawn = healthyPanel.points.find(({ address }) => address === out?.address);
    const pdf = await office.pdfOf(record.id);
    const flat = textOf(pdf);
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
    const flat = textOf(made);
    for (const said of ['Pruebas de ausencia de tensión', 'Íñigo Salas', 'Ω', '≥', 'mm²'])
      expect(flat).toContain(said);
    expect(made.toString('latin1')).toContain('/Lang (es)');
  });

  it.each([
    ['IEC 60204-1', '595.28 841.89'],
    ['NFPA 79', '612 792'],
  ] as const)('of a panel after %s is on paper of that place', async (practice, size) => {
    const panel = { ...widePanel(2), practice };
    const made = await recordPdf({ ...sealedSample, document: sampleRecord(2), panel });
    expect(made.toString('latin1')).toContain(`/MediaBox [0 0 ${size}]`);
    expect(textOf(made)).toContain('2222222222');
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
    const record = await office.recordOf(await office.anySealed());
    const pdf = await office.pdfOf(record.id);
    expect((await office.pdfOf(record.id)).equals(pdf)).toBe(true);
    expect(await office.verify({ digest: sha256Of(pdf) })).toEqual({
      known: true,
      chainHolds: true,
      panelTag: healthyPanel.tag,
      date: record.sealedAt,
      number: record.number,
      amendedBy: [],
    });
    const changed = Buffer.concat([pdf, Buffer.from(' ')]);
    expect(await office.verify({ digest: sha256Of(changed) })).toEqual({ known: false });
    expect(pdf.toString('latin1').match(/\b[0-9a-f]{64}\b/)?.[0]).toBe(record.digest);
  });
});

describe('verifying', () => {
  it('knows a record by its digest and says no more than panel and date', async () => {
    const record = await office.recordOf(await office.anySealed());
    expect(await office.verify({ digest: record.digest })).toEqual({
      known: true,
      chainHolds: true,
      panelTag: healthyPanel.tag,
      date: record.sealedAt,
      amendedBy: [],
    });
  });
  it('knows the JSON that was downloaded, and not one with a single changed letter', async () => {
    const record = await office.recordOf(await office.anySealed());
    const json = await office.agent('Sam Safety').get(`/api/records/${record.id}.json`).expect(200);
    expect(sha256Of(json.text)).toBe(record.digest);
    const whole = JSON.parse(json.text) as Record<string, unknown>;
    expect(await office.verify({ record: whole })).toMatchObject({
      known: true,
      chainHolds: true,
      number: record.number,
    });
    expect(await office.verify({ record: { ...whole, language: 'es' } })).toEqual({ known: false });
  });
  it('takes whole digests only', async () => {
    const short = await request(office.server.app).post('/api/verify').send({ digest: 'abc123' });
    expect(short.status).toBe(422);
  });
});

describe('the list', () => {
  it.each([
    ['panel', `panel=${healthyPanel.tag.toLowerCase()}`, true],
    ['panel', 'panel=NOWHERE', false],
    ['person', 'person=ada', true],
    ['person', 'person=Zed', false],
    ['point', `point=${workedPoints[0]}`, true],
    ['point', 'point=%25', false],
    ['lock', 'lock=A-', true],
    ['lock', 'lock=99999', false],
    ['from', 'from=2020-01-01', true],
    ['to', 'to=2020-01-01', false],
    ['exceptions', 'exceptions=false', true],
  ])('filters by %s: %s', async (_name, query, found) => {
    await office.anySealed();
    expect((await office.rows(`site=${office.site}&${query}`)).length > 0).toBe(found);
  });

  it('pages through everything once', async () => {
    const all = await office.rows();
    const seen: string[] = [];
    let after: string | null = '';
    while (after !== null) {
      const answer = await office
        .agent('Sam Safety')
        .get(`/api/records?limit=2${after && `&after=${after}`}`);
      const read = page(recordRow).parse(answer.body);
      seen.push(...read.items.map(({ id }) => id));
      after = read.next;
    }
    expect(seen).toEqual(all.map(({ id }) => id));
  });

  it('is closed to other sites and to electricians who were not on the job', async () => {
    const record = await office.recordOf(await office.anySealed());
    expect(await office.rows('', 'Otto Other')).toEqual([]);
    expect(await office.rows('', 'Bo Ampere')).toEqual([]);
    expect((await office.rows('', 'Ada Volt')).length).toBeGreaterThan(0);
    for (const name of ['Otto Other', 'Bo Ampere'])
      for (const form of ['', '.json', '.pdf'])
        await office.agent(name).get(`/api/records/${record.id}${form}`).expect(404);
    await request(office.server.app).get(`/api/records/${record.id}`).expect(401);
  });
});
