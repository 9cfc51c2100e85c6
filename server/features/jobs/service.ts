/** Jobs planned, sent and cancelled by the foreman. */
import { In, type DataSource, type EntityManager } from 'typeorm';
import type { z } from 'zod';
import type { Language } from '../../../shared/api/common';
import type {
  cancelRequest,
  JobPreview,
  jobPreviewRequest,
  jobRequest,
  JobRequest,
  JobView,
  PackPerson,
} from '../../../shared/api/jobs';
import { canonicalJson, digestOf } from '../../../shared/panel/canonical';
import { say } from '../../../shared/panel/says';
import { holds, type Actor } from '../../http/actor';
import { forbidden, notFound, Refused, type PathError } from '../../http/refused';
import { writeAudit } from '../audit/service';
import type { DevicesService } from '../devices/service';
import type { MailQueue } from '../mail/queue';
import type { IssuedRevision } from '../panels/revisions';
import type { PeopleService } from '../people/service';
import { changeableJob, readableJob } from './access';
import type { JobBoards } from './boards';
import type { JobChoices } from './choices';
import { JobEntity, JobPersonEntity, PackEntity } from './entity';
import { jobNumber } from './mapper';
import { mustStart } from './mustStart';
import { makePack } from './pack';
import { prepareJob, type JobChoice, type PreparedJob } from './prepare';
import { previewView } from './preview';
import { jobMakers, jobReaders } from './roles';
import type { JobTurns } from './turns';

export interface JobParts {
  database: DataSource;
  mail: MailQueue;
  people: PeopleService;
  devices: DevicesService;
  choices: JobChoices;
  boards: JobBoards;
  turns: JobTurns;
}
interface Planned {
  chosen: IssuedRevision;
  prepared: PreparedJob;
  digest: string;
  number: number;
}
/** An entry of these kinds that was set aside leaves its isolator not known. */
const lockKinds: readonly string[] = [
  'lock-on',
  'lock-off',
  'lock-removed-by-supervisor',
  'handover',
  'closed',
];

export class JobsService {
  constructor(private readonly parts: JobParts) {}

  /** What a job on these points would be. */
  async preview(
    actor: Actor,
    { panel, revision, points }: z.output<typeof jobPreviewRequest>,
    language: Language,
  ): Promise<JobPreview> {
    const chosen = await this.revisionFor(actor, panel, revision);
    const prepared = prepareJob(await this.parts.choices.of(chosen, points, []));
    return previewView(prepared, chosen.content.points.length, language);
  }

  /** Plans a job. The same id with the same request is the same job, answered the same way. */
  async create(actor: Actor, request: z.output<typeof jobRequest>): Promise<JobView> {
    const digest = digestOf(request);
    const chosen = await this.revisionFor(actor, request.panel, request.revision);
    const known = await this.sameJob(this.parts.database.manager, actor, request.id, digest);
    if (!known) {
      const given = request.acceptances.map((each) => ({ ...each, by: actor.name }));
      const prepared = prepareJob(await this.parts.choices.of(chosen, request.points, given));
      mustStart(prepared, request.acceptances);
      await this.parts.database.transaction(async (tx) => {
        await this.mustFit(tx, chosen.site, request);
        const number = await this.nextNumber(tx, chosen.site);
        // The counter's row is held now: whoever sent the same request twice waits here and finds the job.
        if (await this.sameJob(tx, actor, request.id, digest)) return;
        await this.plan(tx, actor, request, { chosen, prepared, digest, number });
      });
    }
    return this.parts.boards.view(actor, request.id);
  }

  private async sameJob(tx: EntityManager, actor: Actor, id: string, digest: string): Promise<boolean> {
    const known = await tx.findOneBy(JobEntity, { id });
    if (known && (known.requestDigest !== digest || !holds(actor, known.site, ...jobMakers)))
      throw new Refused(409, 'id-taken');
    return known !== null;
  }

  private async revisionFor(actor: Actor, panel: string, number: number): Promise<IssuedRevision> {
    const revision = await this.parts.choices.revision(panel, number);
    if (!holds(actor, revision.site, ...jobReaders)) throw notFound();
    if (!holds(actor, revision.site, ...jobMakers)) throw forbidden();
    return revision;
  }

  /** Who works must be an electrician of the site, who countersigns a foreman of it who does not work. */
  private async mustFit(
    tx: EntityManager,
    site: string,
    { electricians, foreman }: JobRequest,
  ): Promise<void> {
    const working = await this.parts.people.holders(tx, electricians, site, 'electrician');
    const leading = await this.parts.people.holders(tx, [foreman], site, 'foreman');
    const errors: PathError[] = electricians.flatMap((person, index) =>
      working.has(person) ? [] : [{ path: `electricians.${index}`, says: say('reason.no-electrician') }],
    );
    if (!leading.has(foreman)) errors.push({ path: 'foreman', says: say('reason.no-foreman') });
    if (electricians.includes(foreman)) errors.push({ path: 'foreman', says: say('reason.same-person') });
    if (errors.length > 0) throw new Refused(422, 'not-fit', {}, errors);
  }

  private async plan(
    tx: EntityManager,
    actor: Actor,
    request: JobRequest,
    { chosen, prepared, digest, number }: Planned,
  ): Promise<void> {
    const { id, foreman, due, words, acceptances, electricians } = request;
    await tx.insert(JobEntity, {
      id,
      site: chosen.site,
      number,
      panel: chosen.panel,
      revision: chosen.number,
      panelTag: chosen.content.tag,
      panelName: chosen.content.name,
      panelPoints: chosen.content.points.length,
      isolators: prepared.plan?.isolators.map(({ isolator }) => isolator.tag) ?? [],
      scope: prepared.points,
      foreman,
      due,
      words: words ?? null,
      acceptances: acceptances.map((each) => ({ ...each, by: actor.name })),
      requestDigest: digest,
      createdAt: new Date(),
      createdBy: actor.person,
    });
    const parts = [...new Set(electricians)].map((person) => ({ person, part: 'electrician' as const }));
    await tx.insert(
      JobPersonEntity,
      [...parts, { person: foreman, part: 'foreman' as const }].map((each) => ({ job: id, ...each })),
    );
    await writeAudit(tx, { actor: actor.person, site: chosen.site, act: 'job-planned', about: { job: id } });
  }

  /** One number a job and site, taken in the transaction that makes the job. */
  private async nextNumber(tx: EntityManager, site: string): Promise<number> {
    const rows = await tx.query<{ last: number }[]>(
      `INSERT INTO job_counter AS c (site, last) VALUES ($1, 1)
       ON CONFLICT (site) DO UPDATE SET last = c.last + 1 RETURNING last`,
      [site],
    );
    const row = rows[0];
    if (!row) throw new Error('the job counter was not written');
    return row.last;
  }

  /** Gives a planned job to its people: makes its pack. Sent already, it is answered as it stands. */
  async send(actor: Actor, id: string): Promise<JobView> {
    const { panel, revision, scope, acceptances } = await readableJob(this.parts.database.manager, actor, id);
    const chosen = await this.revisionFor(actor, panel, revision);
    const choice = await this.parts.choices.of(chosen, scope, acceptances);
    const prepared = prepareJob(choice);
    await this.parts.database.transaction(async (tx) => {
      const job = await changeableJob(tx, actor, id);
      if (job.cancelledAt !== null) throw new Refused(409, 'not-planned');
      if (job.pack !== null) return;
      mustStart(prepared, []);
      await this.givePack(tx, actor, job, choice, prepared);
      await this.mailElectricians(tx, actor, job);
      await writeAudit(tx, { actor: actor.person, site: job.site, act: 'job-sent', about: { job: id } });
    });
    return this.parts.boards.view(actor, id);
  }

  private async givePack(
    tx: EntityManager,
    actor: Actor,
    job: JobEntity,
    { site, panel }: JobChoice,
    prepared: PreparedJob,
  ): Promise<void> {
    const pack = makePack({
      job: { id: job.id, number: jobNumber(job.number), due: job.due, words: job.words },
      site,
      panel,
      revision: job.revision,
      prepared,
      people: await this.packPeople(tx, job.id),
    });
    await tx.insert(PackEntity, {
      digest: pack.digest,
      job: job.id,
      content: canonicalJson(pack),
      madeAt: new Date(),
      madeBy: actor.person,
    });
    const isolators = pack.plan.isolators.map(({ isolator }) => isolator.tag);
    const sent = { pack: pack.digest, sentAt: new Date(), sentBy: actor.person, isolators };
    await tx.update(JobEntity, { id: job.id }, sent);
    Object.assign(job, sent);
    await this.parts.turns.refresh(tx, job);
  }

  private async packPeople(tx: EntityManager, job: string): Promise<PackPerson[]> {
    const members = await tx.find(JobPersonEntity, { where: { job }, order: { part: 'ASC', person: 'ASC' } });
    const ids = members.map(({ person }) => person);
    const names = await this.parts.people.names(tx, ids);
    const keys = await this.parts.devices.keysOf(tx, ids);
    return members.map(({ person, part }) => ({
      id: person,
      name: names.get(person) ?? '?',
      part,
      keys: keys
        .filter((each) => each.person === person)
        .map(({ key, publicKey }) => ({ key, publicKey: { ...publicKey } })),
    }));
  }

  private async mailElectricians(tx: EntityManager, actor: Actor, job: JobEntity): Promise<void> {
    const members = await tx.findBy(JobPersonEntity, { job: job.id, part: In(['electrician']) });
    const contacts = await this.parts.people.contacts(
      tx,
      members.map(({ person }) => person),
    );
    for (const { name, email, language } of contacts)
      await this.parts.mail.queue(tx, {
        to: email,
        language,
        kind: 'job-given',
        params: { name, by: actor.name, number: jobNumber(job.number), panel: job.panelTag, due: job.due },
        path: `/my/jobs/${job.id}`,
      });
  }

  /** Ends a job without a record; never while a lock is on, or may be. Cancelled already, it is answered as it stands. */
  async cancel(actor: Actor, id: string, { words }: z.output<typeof cancelRequest>): Promise<JobView> {
    await this.parts.database.transaction(async (tx) => {
      const job = await changeableJob(tx, actor, id);
      if (job.cancelledAt !== null) return;
      const folded = await this.parts.turns.refresh(tx, job);
      if (job.record !== null || job.status === 'countersigned') throw new Refused(409, 'ended');
      const unknown = folded?.setAside.some(({ entry }) => lockKinds.includes(entry.kind)) ?? false;
      const on = folded?.state.locks.some(({ offAt }) => offAt === undefined) ?? false;
      const notKnown = Object.values(folded?.state.isolators ?? {}).some(
        ({ status }) => status === 'not-known',
      );
      if (unknown || on || notKnown) throw new Refused(409, 'locks-on');
      const cancelled = { cancelledAt: new Date(), cancelledBy: actor.person, cancelWords: words };
      await tx.update(JobEntity, { id }, { ...cancelled, status: 'cancelled', waits: false });
      const about = { job: id, words };
      await writeAudit(tx, { actor: actor.person, site: job.site, act: 'job-cancelled', about });
    });
    return this.parts.boards.view(actor, id);
  }
}
