/** A site and people with a password, put straight into the database; and a signed-in agent for each. */
import type { Express } from 'express';
import request from 'supertest';
import { v7 } from 'uuid';
import type { SiteSettings } from '../../shared/api/sites';
import type { Role } from '../../shared/api/common';
import { hashPassword } from '../../server/features/people/password';
import type { Services } from '../../server/services';

export const testPassword = 'a long test password';
let hashed: Promise<string> | undefined;

export async function seedSite(
  services: Services,
  name: string,
  instruments: SiteSettings['instruments'] = [],
): Promise<string> {
  const id = v7();
  const settings = {
    emergencyNumber: '112',
    musterPoint: 'Gate 2',
    deadLimitV: 1,
    permitAsked: false,
    ferruleScheme: 'DIN 46228-4',
    instruments,
  };
  await services.database.query('INSERT INTO site (id, name, settings) VALUES ($1, $2, $3)', [
    id,
    name,
    JSON.stringify(settings),
  ]);
  return id;
}

export async function seedPerson(services: Services, name: string, roles: { site: string; role: Role }[]) {
  const id = v7();
  const email = `${name.toLowerCase().replaceAll(' ', '.')}@example.org`;
  hashed ??= hashPassword(testPassword);
  await services.database.query(
    `INSERT INTO person (id, name, email, language, password_hash, joined_at) VALUES ($1, $2, $3, 'en', $4, now())`,
    [id, name, email, await hashed],
  );
  for (const { site, role } of roles)
    await services.database.query('INSERT INTO person_role (person, site, role) VALUES ($1, $2, $3)', [
      id,
      site,
      role,
    ]);
  return { id, name, email };
}

export type Agent = ReturnType<typeof request.agent>;
/** A signed-in client that sends what a browser on our own page sends. */
export async function signIn(app: Express, email: string): Promise<Agent> {
  const agent = request.agent(app).set('sec-fetch-site', 'same-origin');
  await agent.post('/api/session').send({ email, password: testPassword }).expect(200);
  return agent;
}
