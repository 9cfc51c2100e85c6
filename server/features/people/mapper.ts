import type { PersonView } from '../../../shared/api/people';
import type { Actor } from '../../http/actor';
import type { PersonEntity } from './entity';

export const personView = (person: PersonEntity, visibleSites: readonly string[]): PersonView => ({
  id: person.id,
  name: person.name,
  email: person.email,
  language: person.language,
  active: person.active,
  version: person.version,
  roles: person.roles
    .filter((held) => visibleSites.includes(held.site))
    .map(({ site, role }) => ({ site, role })),
  invitedAt: person.invitedAt?.toISOString() ?? null,
  joinedAt: person.joinedAt?.toISOString() ?? null,
});

export const actorView = (person: PersonEntity): Actor => ({
  person: person.id,
  name: person.name,
  email: person.email,
  language: person.language,
  roles: person.roles.map(({ site, role }) => ({ site, role })),
});
