/** Puts the demo's sites and people into the database; answers their ids. */
import { v7 } from 'uuid';
import { hashPassword } from '../../features/people/password';
import type { Services } from '../../services';
import type { DemoIds } from './demoActor';
import { demoPassword, demoPeople, demoSites, type DemoSite } from './people';

async function seedSites(services: Services): Promise<Record<DemoSite, string>> {
  const ids = { waterWorks: v7(), packaging: v7() };
  for (const key of ['waterWorks', 'packaging'] as const)
    await services.database.query('INSERT INTO site (id, name, settings) VALUES ($1, $2, $3)', [
      ids[key],
      demoSites[key].name,
      JSON.stringify(demoSites[key].settings),
    ]);
  return ids;
}

export async function seedPeople(services: Services): Promise<DemoIds> {
  const sites = await seedSites(services);
  const people = new Map<string, string>();
  const hash = await hashPassword(demoPassword);
  for (const { key, name, email, language, roles } of demoPeople) {
    const id = v7();
    people.set(key, id);
    await services.database.query(
      `INSERT INTO person (id, name, email, language, password_hash, joined_at) VALUES ($1, $2, $3, $4, $5, now())`,
      [id, name, email, language, hash],
    );
    for (const { site, role } of roles)
      await services.database.query('INSERT INTO person_role (person, site, role) VALUES ($1, $2, $3)', [
        id,
        sites[site],
        role,
      ]);
  }
  return { sites, people };
}
