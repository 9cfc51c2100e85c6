/** One-time tokens sent by mail: made, looked at, used once. */
import { IsNull, MoreThan, type EntityManager } from 'typeorm';
import { Refused } from '../../http/refused';
import { MailTokenEntity, PersonEntity } from './entity';
import { newToken, tokenHash } from './password';

type Kind = MailTokenEntity['kind'];
const hours = 3_600_000;
const lifetimeMs: Record<Kind, number> = { invitation: 7 * 24 * hours, 'password-reset': hours };

/** Makes a token; older unused ones of the same kind end. */
export async function makeToken(tx: EntityManager, kind: Kind, person: string): Promise<string> {
  await tx.update(MailTokenEntity, { kind, person, usedAt: IsNull() }, { usedAt: new Date() });
  const token = newToken();
  await tx.insert(MailTokenEntity, {
    hash: tokenHash(token),
    kind,
    person,
    expiresAt: new Date(Date.now() + lifetimeMs[kind]),
    usedAt: null,
  });
  return token;
}

/** @throws Refused 410 when the token is unknown, used or too old. */
export async function personOfToken(
  tx: EntityManager,
  kind: Kind,
  token: string,
  use: boolean,
): Promise<PersonEntity> {
  const row = await tx.findOne(MailTokenEntity, {
    where: { hash: tokenHash(token), kind, usedAt: IsNull(), expiresAt: MoreThan(new Date()) },
    ...(use ? { lock: { mode: 'pessimistic_write' as const } } : {}),
  });
  const person =
    row &&
    (await tx.findOne(PersonEntity, { where: { id: row.person, active: true }, relations: { roles: true } }));
  if (!row || !person) throw new Refused(410, 'token-ended');
  if (use) await tx.update(MailTokenEntity, { hash: row.hash }, { usedAt: new Date() });
  return person;
}
