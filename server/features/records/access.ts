/** Who reads which records: the office of a site all of them, an electrician those of jobs they were on. */
import { holds, sitesOf, type Actor } from '../../http/actor';
import { jobReaders } from '../jobs/roles';
import type { RecordEntity } from './entity';

export const mayRead = (actor: Actor, { site, people }: RecordEntity): boolean =>
  holds(actor, site, ...jobReaders) || (holds(actor, site) && people.includes(actor.person));

export const reachOf = (actor: Actor) => ({
  person: actor.person,
  sites: sitesOf(actor, ...jobReaders),
  anySites: sitesOf(actor),
});
