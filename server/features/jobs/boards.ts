/** Jobs to look at: the board, one job, its folded state, and the packs of a person's phone. */
import type { DataSource, EntityManager } from 'typeorm';
import type { z } from 'zod';
import type { Language, Page } from '../../../shared/api/common';
import type { jobQuery, JobRow, JobStateView, JobView, PackList } from '../../../shared/api/jobs';
import { sitesOf, type Actor } from '../../http/actor';
import { notFound } from '../../http/refused';
import type { PeopleService } from '../people/service';
import { readableJob, reachOf } from './access';
import { JobEntity } from './entity';
import type { Folding } from './folding';
import { jobRow, jobView } from './mapper';
import { jobRows, staleJobs, type JobFilter } from './rows';
import { stateView } from './stateView';
import type { JobTurns } from './turns';

type ListQuery = z.output<typeof jobQuery>;

export class JobBoards {
  constructor(
    private readonly database: DataSource,
    private readonly people: PeopleService,
    private readonly folding: Folding,
    private readonly turns: JobTurns,
  ) {}

  async list(actor: Actor, query: ListQuery): Promise<Page<JobRow>> {
    const { waiting, ...rest } = query;
    const filter: JobFilter = { ...reachOf(actor), ...rest, waitingForMe: waiting === 'me' };
    await this.catchUp(filter);
    const rows = await jobRows(this.database.manager, filter);
    const shown = rows.slice(0, query.limit);
    return {
      items: shown.map((row) => jobRow(row, Date.now())),
      next: rows.length > query.limit ? (shown.at(-1)?.cursor ?? null) : null,
    };
  }

  async view(actor: Actor, id: string): Promise<JobView> {
    const tx = this.database.manager;
    const job = await readableJob(tx, actor, id);
    const filter: JobFilter = { ...reachOf(actor), job: id, limit: 1 };
    await this.catchUp(filter);
    return this.viewOf(tx, job, filter);
  }

  private async viewOf(tx: EntityManager, job: JobEntity, filter: JobFilter): Promise<JobView> {
    const [row] = await jobRows(tx, filter);
    if (!row) throw notFound();
    const names = await this.people.names(tx, job.cancelledBy === null ? [] : [job.cancelledBy]);
    return jobView(jobRow(row, Date.now()), job, (person) => names.get(person) ?? '?');
  }

  /** @throws Refused 404 when there is no such job for this person. */
  async status(actor: Actor, id: string): Promise<JobRow['status']> {
    return (await readableJob(this.database.manager, actor, id)).status;
  }

  /** The job folded from what this server has heard. */
  async state(actor: Actor, id: string, language: Language): Promise<JobStateView> {
    const tx = this.database.manager;
    const job = await readableJob(tx, actor, id);
    const folded = await this.folding.fold(tx, job);
    if (!folded) throw notFound();
    return stateView(folded, language);
  }

  /** Entries arrive oftener than boards are read, so the fold for a board is made when it is read. */
  private async catchUp(filter: JobFilter): Promise<void> {
    for (const id of await staleJobs(this.database.manager, filter))
      await this.database.transaction(async (tx) => {
        const job = await tx.findOne(JobEntity, { where: { id }, lock: { mode: 'pessimistic_write' } });
        if (job && job.progressOrder < job.lastOrder) await this.turns.refresh(tx, job);
      });
  }

  /** Packs of the jobs a person is on; those their device has already are only named. */
  async myPacks(actor: Actor, have: ReadonlySet<string>): Promise<PackList> {
    const tx = this.database.manager;
    const rows = await tx.query<{ id: string; pack: string; status: JobRow['status'] }[]>(
      `SELECT j.id, j.pack, j.status FROM job j JOIN job_person m ON m.job = j.id
       WHERE m.person = $1 AND j.site = ANY($2) AND j.pack IS NOT NULL
         AND (j.status NOT IN ('sealed', 'cancelled')
           OR coalesce(j.sealed_at, j.cancelled_at) > now() - interval '30 days')
       ORDER BY j.due, j.id`,
      [actor.person, sitesOf(actor)],
    );
    const open = rows.filter(({ status }) => status !== 'sealed' && status !== 'cancelled');
    const wanted = open.filter(({ pack }) => !have.has(pack));
    const packs = [];
    for (const { pack } of wanted) packs.push(await this.folding.pack(tx, pack));
    return { packs, current: rows.map(({ id, pack, status }) => ({ job: id, digest: pack, status })) };
  }
}
