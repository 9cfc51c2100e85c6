/** Makes a signed-in person's key on this device, registers its public half and keeps their PIN's verifier. */
import { v7 } from 'uuid';
import { z } from 'zod';
import { keyRequest, type deviceRequest } from '../../shared/api/deviceWire';
import { request } from '../api/request';
import type { DeviceEnvironment } from './environment';
import { deviceId } from './deviceId';
import type { DeviceKey, Outbox } from './outboxDatabase';
import { isStrongPin, makeVerifier } from './pin';
import { keyAlgorithm } from './signEntry';
import { OtherPersonError, WeakPinError } from './types';

interface Person {
  id: string;
  name: string;
  email: string;
}

/** The key this person already has here, or a new one; kept before it is registered, so a lost reply costs nothing. */
async function keyFor(env: DeviceEnvironment, outbox: Outbox, person: string): Promise<DeviceKey> {
  const pair = await env.subtle.generateKey(keyAlgorithm, false, ['sign', 'verify']);
  const key = v7({ msecs: env.now(), random: env.randomBytes(16) });
  const made = { key, person, pair, registered: false, madeAt: new Date(env.now()).toISOString() };
  // Looked up and kept in one transaction, so two tabs that enrol together make one key.
  return outbox.write(['keys'], async (transaction) => {
    const keys = transaction.objectStore('keys');
    const [kept] = await keys.index('person').getAll(person);
    if (kept) return kept;
    await keys.put(made);
    return made;
  });
}

/** The server gives a key to whoever is signed in: had that changed in another tab, one would sign as the other. */
async function mustBeSignedIn(env: DeviceEnvironment, person: string): Promise<void> {
  const session = z.looseObject({ person: z.looseObject({ id: z.uuid() }) });
  const { person: signedIn } = await request(session, '/api/session', { fetch: env.fetch });
  if (signedIn.id !== person) throw new OtherPersonError('another person is signed in');
}

/** Both requests carry ids made here and may be repeated. */
async function register(env: DeviceEnvironment, device: string, key: DeviceKey): Promise<void> {
  const jwk = await env.subtle.exportKey('jwk', key.pair.publicKey);
  const publicKey = { kty: 'EC', crv: 'P-256', x: jwk.x, y: jwk.y };
  const body: z.infer<typeof deviceRequest> = { id: device, name: env.deviceName() };
  const answered = z.looseObject({ id: z.uuid() });
  await request(answered, '/api/devices', { method: 'POST', body, fetch: env.fetch });
  await request(answered, '/api/devices/keys', {
    method: 'POST',
    body: keyRequest.parse({ id: key.key, device, publicKey }),
    fetch: env.fetch,
  });
}

/**
 * @throws WeakPinError for a PIN under six digits; OtherPersonError when somebody else is signed in; ProblemError or UnreachableError when the server did not take
 * the key, in which case nobody is enrolled.
 */
export async function enrol(
  env: DeviceEnvironment,
  outbox: Outbox,
  { id: person, name, email }: Person,
  pin: string,
): Promise<void> {
  if (!isStrongPin(pin)) throw new WeakPinError('a PIN has six digits or more');
  await mustBeSignedIn(env, person);
  const key = await keyFor(env, outbox, person);
  await register(env, await deviceId(env, outbox), key);
  const verifier = await makeVerifier(env.subtle, pin, (length) => env.randomBytes(length));
  const enrolledAt = new Date(env.now()).toISOString();
  await outbox.write(['keys', 'people'], async (transaction) => {
    await transaction.objectStore('keys').put({ ...key, registered: true });
    const row = { person, name, email, enrolledAt, key: key.key, verifier, wrong: 0, waitUntil: 0 };
    await transaction.objectStore('people').put(row);
  });
}
