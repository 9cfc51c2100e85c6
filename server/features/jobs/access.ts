/** Who sees which jobs; one that somebody may not see does not exist for them. */
import type { EntityManager } from 'typeorm';
import { holds, sitesOf, type Actor } from '../../http/actor';
import { forbidden, notFound } from '../../http/refused';
import { JobEntity, JobPersonEntity } from './entity';
import { jobMakers, jobReaders } from './roles';
import type { JobFilter } from './rows';

export const reachOf = (actor: Actor): Pick<JobFilter, 'person' | 'sites' | 'anySites'> => ({
  person: actor.person,
  sites: sitesOf(actor, ...jobReaders),
  anySites: sitesOf(actor),
});

async function mayRead(tx: EntityManager, actor: Actor, { id, site }: JobEntity): Promise<boolean> {
  if (holds(actor, site, ...jobReaders)) return true;
  return holds(actor, site) && tx.existsBy(JobPersonEntity, { job: id, person: actor.person });
}

/** @throws Refused 404 when there is no such job for this person. */
export async function readableJob(tx: EntityManager, actor: Actor, id: string): Promise<JobEntity> {
  const job = await tx.findOneBy(JobEntity, { id });
  if (!job || !(await mayRead(tx, actor, job))) throw notFound();
  return job;
}

/** Takes the job's row for a change until the transaction ends. */
export async function changeableJob(tx: EntityManager, actor: Actor, id: string): Promise<JobEntity> {
  const job = await tx.findOne(JobEntity, { where: { id }, lock: { mode: 'pessimistic_write' } });
  if (!job || !(await mayRead(tx, actor, job))) throw notFound();
  if (!holds(actor, job.site, ...jobMakers)) throw forbidden();
  return job;
}
