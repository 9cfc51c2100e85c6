/** People, their roles on sites, and how they come to have a password. */
import { In, type DataSource, type EntityManager } from 'typeorm';
import type { z } from 'zod';
import type { Language, Page, Role } from '../../../shared/api/common';
import type { invitationRequest, PersonView, personChange } from '../../../shared/api/people';
import { sitesOf, type Actor } from '../../http/actor';
import { forbidden, notFound, Refused } from '../../http/refused';
import { writeAudit } from '../audit/service';
import type { MailQueue } from '../mail/queue';
import { PersonEntity, PersonRoleEntity } from './entity';
import { actorView, personView } from './mapper';
import { hashPassword, passwordMatches } from './password';
import { makeToken, personOfToken } from './tokens';

type Invitation = z.output<typeof invitationRequest>;
type Change = z.output<typeof personChange>;
interface ListQuery {
  site?: string | undefined;
  role?: Role | undefined;
  after?: string | undefined;
  limit: number;
}

/** A person as mails need them. */
export interface Contact {
  id: string;
  name: string;
  email: string;
  language: Language;
}

/** Roles that may see who works on a site. */
const lookers: Role[] = ['administrator', 'foreman', 'safety-officer'];

export class PeopleService {
  constructor(
    private readonly database: DataSource,
    private readonly mail: MailQueue,
  ) {}

  async list(actor: Actor, query: ListQuery): Promise<Page<PersonView>> {
    const sites = sitesOf(actor, ...lookers).filter(
      (site) => query.site === undefined || site === query.site,
    );
    const rows = await this.database.query<{ id: string; key: string }[]>(
      `SELECT p.id, lower(p.name) || '|' || p.id AS key FROM person p
       WHERE EXISTS (SELECT FROM person_role r WHERE r.person = p.id AND r.site = ANY($1) AND ($2::text IS NULL OR r.role = $2))
         AND ($3::text IS NULL OR lower(p.name) || '|' || p.id > $3)
       ORDER BY key LIMIT $4`,
      [sites, query.role ?? null, query.after ?? null, query.limit + 1],
    );
    const shown = rows.slice(0, query.limit);
    const people = await this.database.manager.find(PersonEntity, {
      where: { id: In(shown.map((row) => row.id)) },
      relations: { roles: true },
    });
    const byId = new Map(people.map((person) => [person.id, person]));
    const items = shown.flatMap((row) => byId.get(row.id) ?? []).map((person) => personView(person, sites));
    return { items, next: rows.length > query.limit ? (shown.at(-1)?.key ?? null) : null };
  }

  /** The signed-in person as other services know them; null when switched off or of an older epoch. */
  async actor(id: string, epoch: number): Promise<Actor | null> {
    const person = await this.database.manager.findOne(PersonEntity, {
      where: { id },
      relations: { roles: true },
    });
    return person?.active && person.epoch === epoch ? actorView(person) : null;
  }

  /** @returns the person with the epoch of their password and roles when e-mail and password are right, else null. */
  async checkPassword(email: string, password: string): Promise<(Actor & { epoch: number }) | null> {
    const person = await this.database.manager.findOne(PersonEntity, {
      where: { email },
      relations: { roles: true },
    });
    const matches = await passwordMatches(person?.passwordHash ?? null, password);
    return person?.active && matches ? { ...actorView(person), epoch: person.epoch } : null;
  }

  /** Invites by mail. The same id again is the same invitation, answered the same way. */
  async invite(actor: Actor, request: Invitation): Promise<PersonView> {
    this.mayGrant(actor, request.roles);
    return this.database.transaction(async (tx) => {
      const known = await tx.findOne(PersonEntity, { where: { id: request.id }, relations: { roles: true } });
      if (known) return personView(known, sitesOf(actor, ...lookers));
      if (await tx.existsBy(PersonEntity, { email: request.email })) throw new Refused(409, 'email-taken');
      await tx.insert(PersonEntity, {
        id: request.id,
        name: request.name,
        email: request.email,
        language: request.language,
        passwordHash: null,
        active: true,
        invitedAt: new Date(),
        joinedAt: null,
      });
      await tx.insert(
        PersonRoleEntity,
        request.roles.map((held) => ({ person: request.id, ...held })),
      );
      const token = await makeToken(tx, 'invitation', request.id);
      await this.mail.queue(tx, {
        to: request.email,
        language: request.language,
        kind: 'invitation',
        params: { name: request.name, by: actor.name },
        path: `/invitation#${token}`,
      });
      await this.audit(tx, actor, request.roles[0]?.site ?? null, 'person-invited', {
        person: request.id,
        roles: request.roles,
      });
      return personView(await this.load(tx, request.id), sitesOf(actor, ...lookers));
    });
  }

  async lookAtInvitation(token: string): Promise<{ name: string; email: string }> {
    const { name, email } = await personOfToken(this.database.manager, 'invitation', token, false);
    return { name, email };
  }

  setPassword(
    kind: 'invitation' | 'password-reset',
    token: string,
    password: string,
  ): Promise<{ email: string }> {
    return this.database.transaction(async (tx) => {
      const person = await personOfToken(tx, kind, token, true);
      await tx.update(
        PersonEntity,
        { id: person.id },
        {
          passwordHash: await hashPassword(password),
          joinedAt: person.joinedAt ?? new Date(),
          epoch: person.epoch + 1,
        },
      );
      await writeAudit(tx, { actor: person.id, site: null, act: 'password-set', about: { by: kind } });
      return { email: person.email };
    });
  }

  /** Answers the same whether or not the address is known. */
  async askPasswordReset(email: string): Promise<void> {
    await this.database.transaction(async (tx) => {
      const person = await tx.findOneBy(PersonEntity, { email, active: true });
      if (!person) return;
      const kind = person.joinedAt ? 'password-reset' : 'invitation';
      const token = await makeToken(tx, kind, person.id);
      await this.mail.queue(tx, {
        to: email,
        language: person.language,
        kind,
        params: { name: person.name, by: person.name },
        path: `/${kind}#${token}`,
      });
    });
  }

  change(actor: Actor, id: string, change: Change): Promise<PersonView> {
    return this.database.transaction(async (tx) => {
      const person = await tx.findOne(PersonEntity, { where: { id }, lock: { mode: 'pessimistic_write' } });
      const held = await tx.findBy(PersonRoleEntity, { person: id });
      const mine = sitesOf(actor, 'administrator');
      if (!person || !held.some((each) => mine.includes(each.site))) throw notFound();
      if (person.version !== change.version) throw new Refused(409, 'stale');
      if (change.active === false && id === actor.person) throw new Refused(409, 'not-yourself');
      if (change.roles) await this.replaceRoles(tx, actor, id, held, change.roles);
      const ends = change.roles !== undefined || change.active === false;
      await tx.update(
        PersonEntity,
        { id },
        {
          version: person.version + 1,
          epoch: person.epoch + (ends ? 1 : 0),
          ...(change.name === undefined ? {} : { name: change.name }),
          ...(change.language === undefined ? {} : { language: change.language }),
          ...(change.active === undefined ? {} : { active: change.active }),
        },
      );
      const { version: _version, ...about } = change;
      await this.audit(tx, actor, mine[0] ?? null, 'person-changed', { person: id, ...about });
      return personView(await this.load(tx, id), sitesOf(actor, ...lookers));
    });
  }

  /** Names by id, for services that have judged access; on the caller's own connection. */
  async names(tx: EntityManager, ids: readonly string[]): Promise<Map<string, string>> {
    const people = await tx.findBy(PersonEntity, { id: In([...new Set(ids)]) });
    return new Map(people.map(({ id, name }) => [id, name]));
  }

  /** Where people who are switched on get their mails, for services that have judged access. */
  async contacts(tx: EntityManager, ids: readonly string[]): Promise<Contact[]> {
    const people = await tx.find(PersonEntity, {
      where: { id: In([...new Set(ids)]), active: true },
      order: { name: 'ASC', id: 'ASC' },
    });
    return people.map(({ id, name, email, language }) => ({ id, name, email, language }));
  }

  /** Everybody who is switched on and holds the role on the site, for mails to an office. */
  async contactsWithRole(tx: EntityManager, site: string, role: Role): Promise<Contact[]> {
    const people = await tx.find(PersonEntity, {
      where: { active: true, roles: { site, role } },
      order: { name: 'ASC', id: 'ASC' },
    });
    return people.map(({ id, name, email, language }) => ({ id, name, email, language }));
  }

  /** Those of these people who are switched on and hold the role on the site. */
  async holders(tx: EntityManager, ids: readonly string[], site: string, role: Role): Promise<Set<string>> {
    const people = await tx.find(PersonEntity, {
      where: { id: In([...ids]), active: true, roles: { site, role } },
    });
    return new Set(people.map(({ id }) => id));
  }

  /** Those of these people who are switched on and hold any role on the site. */
  async withAccess(tx: EntityManager, ids: readonly string[], site: string): Promise<Set<string>> {
    const people = await tx.find(PersonEntity, {
      where: { id: In([...ids]), active: true, roles: { site } },
    });
    return new Set(people.map(({ id }) => id));
  }

  /** Ends every session of these people; they sign in again with their password. */
  async endSessions(tx: EntityManager, people: readonly string[]): Promise<void> {
    await tx.increment(PersonEntity, { id: In([...people]) }, 'epoch', 1);
  }

  /** An administrator speaks for their own sites only; roles elsewhere stay as they are. */
  private async replaceRoles(
    tx: EntityManager,
    actor: Actor,
    id: string,
    held: PersonRoleEntity[],
    roles: Invitation['roles'],
  ) {
    this.mayGrant(actor, roles);
    const mine = sitesOf(actor, 'administrator');
    const keepsOwn = roles.some((each) => each.role === 'administrator');
    if (id === actor.person && !keepsOwn) throw new Refused(409, 'not-yourself');
    const going = held.filter((each) => mine.includes(each.site));
    for (const { site, role } of going) await tx.delete(PersonRoleEntity, { person: id, site, role });
    if (roles.length > 0)
      await tx.insert(
        PersonRoleEntity,
        roles.map((each) => ({ person: id, ...each })),
      );
  }

  private mayGrant(actor: Actor, roles: Invitation['roles']): void {
    const mine = sitesOf(actor, 'administrator');
    if (roles.some((each) => !mine.includes(each.site))) throw forbidden();
  }

  private load(tx: EntityManager, id: string): Promise<PersonEntity> {
    return tx.findOneOrFail(PersonEntity, { where: { id }, relations: { roles: true } });
  }

  private audit(
    tx: EntityManager,
    actor: Actor,
    site: string | null,
    act: string,
    about: Record<string, unknown>,
  ) {
    return writeAudit(tx, { actor: actor.person, site, act, about });
  }
}
