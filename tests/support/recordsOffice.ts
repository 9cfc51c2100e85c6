/** A site with its crew, a panel, and jobs that get sealed: what tests of records start from. */
import { execFileSync } from 'node:child_process';
import { mkdtempSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import request from 'supertest';
import { healthyPanel } from '../../server/commands/demo/panels/healthy';
import type { Config } from '../../server/config';
import { page } from '../../shared/api/common';
import type { Pack } from '../../shared/api/jobs';
import { recordView, type RecordView } from '../../shared/api/recordDocument';
import { recordRow, verifyAnswer, type RecordRow, type VerifyAnswer } from '../../shared/api/records';
import { issuePanel, sendJob } from './seedJobs';
import { seedPerson, seedSite, signIn, type Agent } from './seedPeople';
import { SignedJob } from './signedJob';
import { enrolDevice, type SigningDevice } from './signingDevice';
import { testServices, type TestServer } from './testServices';

const crew = [
  ['Pia Panel', 'panel-engineer'],
  ['Finn Foreman', 'foreman'],
  ['Ada Volt', 'electrician'],
  ['Bo Ampere', 'electrician'],
  ['Sam Safety', 'safety-officer'],
] as const;

/** The points of every job here. */
export const workedPoints = healthyPanel.points.slice(0, 2).map(({ address }) => address);

export class RecordsOffice {
  private readonly agents = new Map<string, Agent>();
  private readonly ids = new Map<string, string>();
  private readonly keys = new Map<string, SigningDevice>();
  private panel = '';
  site = '';
  private first: Promise<SignedJob> | undefined;

  private constructor(readonly server: TestServer) {}

  static async open(overrides: Partial<Config> = {}): Promise<RecordsOffice> {
    const office = new RecordsOffice(await testServices(overrides));
    const { services } = office.server;
    office.site = await seedSite(services, 'Halden Quay');
    const elsewhere = await seedSite(services, 'Elsewhere');
    for (const [name, role] of crew) await office.hire(name, office.site, role);
    await office.hire('Otto Other', elsewhere, 'safety-officer');
    for (const name of ['Ada Volt', 'Finn Foreman'])
      office.keys.set(office.id(name), await enrolDevice(office.agent(name)));
    office.panel = await issuePanel(office.agent('Pia Panel'), office.site, healthyPanel);
    return office;
  }

  private async hire(name: string, site: string, role: (typeof crew)[number][1]): Promise<void> {
    const { id, email } = await seedPerson(this.server.services, name, [{ site, role }]);
    this.ids.set(name, id);
    this.agents.set(name, await signIn(this.server.app, email));
  }

  id(name: string): string {
    return this.ids.get(name) ?? '';
  }
  agent(name: string): Agent {
    const found = this.agents.get(name);
    if (!found) throw new Error(`nobody is called ${name}`);
    return found;
  }
  keyOf(name: string): SigningDevice {
    const key = this.keys.get(this.id(name));
    if (!key) throw new Error(`${name} has no key`);
    return key;
  }

  async givenJob(): Promise<SignedJob> {
    const people = { electricians: [this.id('Ada Volt')], foreman: this.id('Finn Foreman') };
    const { job } = await sendJob(this.agent('Finn Foreman'), this.panel, workedPoints, people);
    const answer = await this.agent('Ada Volt').get('/api/my/packs').expect(200);
    const pack = (answer.body as { packs: Pack[] }).packs.find((each) => each.job.id === job);
    if (!pack) throw new Error('the pack did not arrive');
    return new SignedJob(pack, this.keys);
  }

  async sealedJob(): Promise<SignedJob> {
    const job = await this.givenJob();
    job.work();
    job.sign();
    job.countersign();
    await job.deliver(this.agent('Ada Volt'));
    return job;
  }

  /** One sealed job that tests only read. */
  anySealed(): Promise<SignedJob> {
    this.first ??= this.sealedJob();
    return this.first;
  }

  async rows(query = '', who = 'Sam Safety'): Promise<RecordRow[]> {
    const answer = await this.agent(who).get(`/api/records?${query}`).expect(200);
    return page(recordRow).parse(answer.body).items;
  }

  /** A record by its id. */
  async view(id: string): Promise<RecordView> {
    return recordView.parse((await this.agent('Sam Safety').get(`/api/records/${id}`).expect(200)).body);
  }

  async recordOf(job: SignedJob): Promise<RecordView> {
    const row = (await this.rows('limit=200')).find(({ jobNumber }) => jobNumber === job.packed.job.number);
    if (!row) throw new Error('no record');
    return this.view(row.id);
  }

  /** Asked without a session. */
  async verify(body: object): Promise<VerifyAnswer> {
    return verifyAnswer.parse(
      (await request(this.server.app).post('/api/verify').send(body).expect(200)).body,
    );
  }

  async pdfOf(record: string): Promise<Buffer> {
    const answer = await this.agent('Sam Safety')
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
}

/** The text of a PDF as poppler reads it, every run of white space one space. */
export function textOf(pdf: Buffer): string {
  const file = join(mkdtempSync(join(tmpdir(), 'coldloop-pdf-')), 'record.pdf');
  writeFileSync(file, pdf);
  const text = execFileSync('pdftotext', ['-layout', file, '-'], {
    encoding: 'utf8',
    maxBuffer: 64 * 1024 * 1024,
  });
  return text.replace(/\s+/g, ' ');
}
