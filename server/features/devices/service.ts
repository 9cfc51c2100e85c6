/** Devices and the public keys that people sign with on them. */
import { createPublicKey } from 'node:crypto';
import { In, IsNull, Not, type DataSource, type EntityManager } from 'typeorm';
import type { z } from 'zod';
import type { deviceRequest, DeviceView, keyRequest } from '../../../shared/api/jobs';
import { sitesOf, type Actor } from '../../http/actor';
import { notFound, Refused } from '../../http/refused';
import { writeAudit } from '../audit/service';
import type { MailQueue } from '../mail/queue';
import type { PeopleService } from '../people/service';
import { DeviceEntity, DeviceKeyEntity, type PublicKey } from './entity';
import { deviceViews } from './list';
import { thumbprint } from './thumbprint';

/** A registered key as other services know it. */
export interface KnownKey {
  key: string;
  person: string;
  device: string;
  publicKey: PublicKey;
  /** Its device was shut out by an administrator. */
  revoked: boolean;
}

const known = (
  { id, person, device, publicKey }: DeviceKeyEntity,
  revoked: ReadonlySet<string>,
): KnownKey => ({ key: id, person, device, publicKey, revoked: revoked.has(device) });

/** Those of these keys' devices that were shut out. */
async function revokedOf(tx: EntityManager, keys: readonly DeviceKeyEntity[]): Promise<Set<string>> {
  const ids = [...new Set(keys.map(({ device }) => device))];
  const revoked = await tx.findBy(DeviceEntity, { id: In(ids), revokedAt: Not(IsNull()) });
  return new Set(revoked.map(({ id }) => id));
}

/** @throws Refused 422 when x and y are no point of the curve. */
function mustBeOnCurve(publicKey: PublicKey): void {
  try {
    createPublicKey({ key: { ...publicKey }, format: 'jwk' });
  } catch {
    throw new Refused(422, 'invalid', {}, [{ path: 'publicKey', says: 'is no point of P-256' }]);
  }
}

export class DevicesService {
  constructor(
    private readonly database: DataSource,
    private readonly mail: MailQueue,
    private readonly people: PeopleService,
  ) {}

  /** Makes a device known. The same id again is the same device; its name follows the device. */
  register(actor: Actor, request: z.output<typeof deviceRequest>): Promise<{ id: string; name: string }> {
    return this.database.transaction(async (tx) => {
      await tx
        .createQueryBuilder()
        .insert()
        .into(DeviceEntity)
        .values({
          ...request,
          registeredAt: new Date(),
          registeredBy: actor.person,
          revokedAt: null,
          revokedBy: null,
        })
        .orIgnore()
        .execute();
      const device = await tx.findOneByOrFail(DeviceEntity, { id: request.id });
      if (device.revokedAt) throw new Refused(409, 'device-revoked');
      // People share a device, so whoever signs in on it may name it.
      if (device.name !== request.name)
        await tx.update(DeviceEntity, { id: device.id }, { name: request.name });
      return { id: device.id, name: request.name };
    });
  }

  /** Registers the asking person's key on a device and mails them that it was done. */
  registerKey(actor: Actor, request: z.output<typeof keyRequest>): Promise<{ id: string }> {
    mustBeOnCurve(request.publicKey);
    const print = thumbprint(request.publicKey);
    return this.database.transaction(async (tx) => {
      const device = await tx.findOne(DeviceEntity, {
        where: { id: request.device },
        lock: { mode: 'pessimistic_write' },
      });
      if (!device) throw notFound();
      const same = await tx.findOneBy(DeviceKeyEntity, { id: request.id });
      if (same?.person === actor.person && same.thumbprint === print && same.device === device.id)
        return { id: same.id };
      if (same || (await tx.existsBy(DeviceKeyEntity, { thumbprint: print })))
        throw new Refused(409, 'id-taken');
      if (device.revokedAt) throw new Refused(409, 'device-revoked');
      await this.addKey(tx, actor, device, request, print);
      return { id: request.id };
    });
  }

  private async addKey(
    tx: EntityManager,
    actor: Actor,
    device: DeviceEntity,
    { id, publicKey }: z.output<typeof keyRequest>,
    print: string,
  ): Promise<void> {
    await tx.insert(DeviceKeyEntity, {
      id,
      device: device.id,
      person: actor.person,
      publicKey,
      thumbprint: print,
      registeredAt: new Date(),
    });
    await this.mail.queue(tx, {
      to: actor.email,
      language: actor.language,
      kind: 'key-registered',
      params: { name: actor.name, device: device.name },
      path: '/my/device',
    });
    const about = { device: device.id, key: id };
    await writeAudit(tx, { actor: actor.person, site: null, act: 'key-registered', about });
  }

  /** Devices on which somebody of the administrator's sites has a key. */
  list(actor: Actor): Promise<DeviceView[]> {
    return deviceViews(this.database.manager, sitesOf(actor, 'administrator'));
  }

  /** A lost device: no new key on it, its people's sessions end; what it already signed may still be delivered. */
  revoke(actor: Actor, id: string): Promise<DeviceView> {
    return this.database.transaction(async (tx) => {
      const seen = await deviceViews(tx, sitesOf(actor, 'administrator'), id);
      const device = await tx.findOne(DeviceEntity, { where: { id }, lock: { mode: 'pessimistic_write' } });
      if (!device || seen.length === 0) throw notFound();
      if (!device.revokedAt) {
        await tx.update(DeviceEntity, { id }, { revokedAt: new Date(), revokedBy: actor.person });
        const keys = await tx.findBy(DeviceKeyEntity, { device: id });
        await this.people.endSessions(tx, [...new Set(keys.map(({ person }) => person))]);
        await writeAudit(tx, {
          actor: actor.person,
          site: null,
          act: 'device-revoked',
          about: { device: id },
        });
      }
      const [view] = await deviceViews(tx, sitesOf(actor, 'administrator'), id);
      if (!view) throw notFound();
      return view;
    });
  }

  /** Keys of people, oldest first. For services that have judged access. */
  async keysOf(tx: EntityManager, people: readonly string[]): Promise<KnownKey[]> {
    const keys = await tx.find(DeviceKeyEntity, {
      where: { person: In([...people]) },
      order: { registeredAt: 'ASC', id: 'ASC' },
    });
    const revoked = await revokedOf(tx, keys);
    return keys.map((key) => known(key, revoked));
  }

  /** Keys by id; unknown ids are left out. For services that have judged access. */
  async keys(tx: EntityManager, ids: readonly string[]): Promise<KnownKey[]> {
    const keys = await tx.findBy(DeviceKeyEntity, { id: In([...ids]) });
    const revoked = await revokedOf(tx, keys);
    return keys.map((key) => known(key, revoked));
  }
}
