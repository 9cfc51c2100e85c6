/** Keeps a job's row in step with its entries and tells people when it is their turn. */
import type { EntityManager } from 'typeorm';
import type { JobStatus } from '../../../shared/job/types';
import { notFound } from '../../http/refused';
import type { EntryStore } from '../entries/store';
import type { MailQueue } from '../mail/queue';
import type { PeopleService } from '../people/service';
import { JobEntity, JobPersonEntity, PackEntity } from './entity';
import type { FoldedJob, Folding } from './folding';
import { jobNumber } from './mapper';
import { progressOf, statusOf } from './progress';

type Status = JobEntity['status'];

/** A job as the entries that arrive for it need it, its row taken until the transaction ends. */
export interface TakenJob {
  id: string;
  site: string;
  lastOrder: number;
  status: Status;
}

export class JobTurns {
  constructor(
    private readonly mail: MailQueue,
    private readonly people: PeopleService,
    private readonly entries: EntryStore,
    private readonly folding: Folding,
  ) {}

  /** Takes the job's row, so that the order of its entries is the order of commits. */
  async take(tx: EntityManager, id: string): Promise<TakenJob> {
    const job = await tx.findOne(JobEntity, { where: { id }, lock: { mode: 'pessimistic_write' } });
    if (!job) throw notFound();
    return { id: job.id, site: job.site, lastOrder: job.lastOrder, status: job.status };
  }

  /** Those of these digests that name a pack once issued for the job. */
  async issuedPacks(tx: EntityManager, job: string, digests: readonly string[]): Promise<Set<string>> {
    const rows = await tx.query<{ digest: string }[]>(
      'SELECT digest FROM pack WHERE job = $1 AND digest = ANY($2)',
      [job, digests],
    );
    return new Set(rows.map(({ digest }) => digest));
  }

  /**
   * Notes new entries on the job's row and, once somebody has signed, whose turn it is, with the mails.
   * @returns the job's status as this server knows it now.
   */
  async heard(tx: EntityManager, id: string, lastOrder: number, at: Date): Promise<Status> {
    await tx.update(JobEntity, { id }, { lastOrder, lastHeard: at });
    const job = await tx.findOneByOrFail(JobEntity, { id });
    if (!(await this.entries.holdsSignature(tx, id))) return job.status;
    const before = job.status;
    const folded = await this.refresh(tx, job);
    if (folded && job.status !== before) await this.tell(tx, job, folded);
    return job.status;
  }

  /** Folds the job and keeps what boards show; `job` is changed in place. */
  async refresh(tx: EntityManager, job: JobEntity): Promise<FoldedJob | null> {
    const folded = await this.folding.fold(tx, job);
    const status = statusOf(job, folded?.state);
    const progress = folded ? await this.progress(tx, folded) : null;
    const waits = (progress?.waiting.length ?? 0) > 0;
    const known = { status, progress, waits, progressOrder: job.lastOrder };
    Object.assign(job, known);
    await tx.update(JobEntity, { id: job.id }, known);
    return folded;
  }

  /** Locks may belong to somebody who is no longer on the job, so names are read apart. */
  private async progress(tx: EntityManager, { state, entries }: FoldedJob) {
    const names = await this.people.names(
      tx,
      state.locks.map(({ person }) => person),
    );
    const times = new Map(entries.map(({ entry }) => [entry.id, entry.at]));
    return progressOf(
      state,
      (entry) => times.get(entry) ?? '',
      (person) => names.get(person) ?? '?',
    );
  }

  private async tell(tx: EntityManager, job: JobEntity, { state }: FoldedJob): Promise<void> {
    const kinds: Partial<Record<JobStatus, 'countersign-wanted' | 'job-returned'>> = {
      signed: 'countersign-wanted',
      returned: 'job-returned',
    };
    const kind = kinds[state.status];
    if (!kind || job.status !== state.status) return;
    const by = state.returns.at(-1)?.person;
    const names = await this.people.names(tx, by === undefined ? [] : [by]);
    const to = kind === 'countersign-wanted' ? [job.foreman] : await this.electricians(tx, job.id);
    for (const { name, email, language } of await this.people.contacts(tx, to))
      await this.mail.queue(tx, {
        to: email,
        language,
        kind,
        params: { name, by: names.get(by ?? '') ?? '', number: jobNumber(job.number), panel: job.panelTag },
        path: `/my/jobs/${job.id}${kind === 'countersign-wanted' ? '/review' : ''}`,
      });
  }

  private async electricians(tx: EntityManager, job: string): Promise<string[]> {
    const rows = await tx.findBy(JobPersonEntity, { job, part: 'electrician' });
    return rows.map(({ person }) => person);
  }

  /** A job's row with everything folded, the row taken: for sealing. */
  async takeFolded(tx: EntityManager, id: string): Promise<{ job: SealableJob; folded: FoldedJob } | null> {
    const job = await tx.findOne(JobEntity, { where: { id }, lock: { mode: 'pessimistic_write' } });
    const folded = job && (await this.folding.fold(tx, job));
    return job && folded ? { job: sealable(job), folded } : null;
  }

  /** Jobs that a record may be missing for: countersigned, or sealed and heard from since their newest record. */
  async awaitingRecord(tx: EntityManager): Promise<string[]> {
    const rows = await tx.query<{ id: string }[]>(
      `SELECT j.id FROM job j WHERE j.status = 'countersigned' AND j.record IS NULL
       UNION ALL
       SELECT j.id FROM job j WHERE j.record IS NOT NULL
         AND j.last_order > (SELECT max(r.last_order) FROM record r WHERE r.job = j.id)`,
    );
    return rows.map(({ id }) => id);
  }

  /** Names the record of a sealed job. The row must be taken. */
  async sealed(tx: EntityManager, id: string, record: string, at: Date): Promise<void> {
    await tx.update(JobEntity, { id }, { record, sealedAt: at, status: 'sealed', waits: false });
  }

  /** The packs of a job, oldest first: digest and time. */
  async packsOf(tx: EntityManager, job: string): Promise<{ digest: string; madeAt: Date }[]> {
    const rows = await tx.find(PackEntity, { where: { job }, order: { madeAt: 'ASC' } });
    return rows.map(({ digest, madeAt }) => ({ digest, madeAt }));
  }
}

/** What a record says of its job beside the fold. */
export interface SealableJob {
  id: string;
  site: string;
  number: string;
  panel: string;
  panelTag: string;
  panelName: string;
  revision: number;
  foreman: string;
  record: string | null;
  cancelled: boolean;
}
const sealable = (job: JobEntity): SealableJob => ({
  id: job.id,
  site: job.site,
  number: jobNumber(job.number),
  panel: job.panel,
  panelTag: job.panelTag,
  panelName: job.panelName,
  revision: job.revision,
  foreman: job.foreman,
  record: job.record,
  cancelled: job.cancelledAt !== null,
});
