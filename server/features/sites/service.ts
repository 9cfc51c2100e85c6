/** Sites and their settings; people see the sites where they hold a role. */
import { In, type DataSource } from 'typeorm';
import type { z } from 'zod';
import type { siteChange, siteRequest, SiteView } from '../../../shared/api/sites';
import { holds, sitesOf, type Actor } from '../../http/actor';
import { notFound, Refused } from '../../http/refused';
import { writeAudit } from '../audit/service';
import { SiteEntity } from './entity';

const view = ({ id, name, version, settings }: SiteEntity): SiteView => ({ id, name, version, settings });

export class SitesService {
  constructor(private readonly database: DataSource) {}

  async list(actor: Actor): Promise<SiteView[]> {
    const sites = await this.database.manager.find(SiteEntity, {
      where: { id: In(sitesOf(actor)) },
      order: { name: 'ASC' },
    });
    return sites.map(view);
  }

  /** Site by id without asking who: for other services that have judged access. */
  async byId(id: string): Promise<SiteView> {
    const site = await this.database.manager.findOneBy(SiteEntity, { id });
    if (!site) throw notFound();
    return view(site);
  }

  /** The administrator who makes a site administers it. The same id again is answered the same way. */
  create(actor: Actor, request: z.output<typeof siteRequest>): Promise<SiteView> {
    return this.database.transaction(async (tx) => {
      const known = await tx.findOneBy(SiteEntity, { id: request.id });
      if (known && !holds(actor, known.id, 'administrator')) throw notFound();
      if (known) return view(known);
      const taken = await tx.query<unknown[]>('SELECT 1 FROM site WHERE lower(name) = lower($1)', [
        request.name,
      ]);
      if (taken.length > 0) throw new Refused(409, 'name-taken');
      await tx.insert(SiteEntity, { ...request, version: 1 });
      await tx.query(`INSERT INTO person_role (person, site, role) VALUES ($1, $2, 'administrator')`, [
        actor.person,
        request.id,
      ]);
      await writeAudit(tx, {
        actor: actor.person,
        site: request.id,
        act: 'site-made',
        about: { name: request.name },
      });
      return { ...request, version: 1 };
    });
  }

  change(actor: Actor, id: string, change: z.output<typeof siteChange>): Promise<SiteView> {
    return this.database.transaction(async (tx) => {
      const site = await tx.findOne(SiteEntity, { where: { id }, lock: { mode: 'pessimistic_write' } });
      if (!site || !holds(actor, id, 'administrator')) throw notFound();
      if (site.version !== change.version) throw new Refused(409, 'stale');
      const next = { name: change.name, settings: change.settings, version: site.version + 1 };
      await tx.update(SiteEntity, { id }, next);
      await writeAudit(tx, {
        actor: actor.person,
        site: id,
        act: 'site-changed',
        about: { before: site.settings, after: change.settings },
      });
      return { id, ...next };
    });
  }
}
