/** Verifies what a chain of entries rests on: the signature of the last entry of each branch, in the thread pool. */
import { createPublicKey, verify, type KeyObject } from 'node:crypto';
import type { KnownKey } from '../devices/service';
import { refusedAt, type Arrival } from './received';

/** Registered keys never change, so their parsed form is good for ever. */
const keptKeys = 1_000;
const parsed = new Map<string, KeyObject>();

function keyObject({ key, publicKey }: KnownKey): KeyObject {
  const known = parsed.get(key);
  if (known) return known;
  const made = createPublicKey({ key: { ...publicKey }, format: 'jwk' });
  parsed.set(key, made);
  for (const oldest of parsed.keys()) if (parsed.size > keptKeys) parsed.delete(oldest);
  return made;
}

/** ECDSA P-256 with SHA-256; the signature is r ‖ s (IEEE P1363). */
export function signatureFits(key: KnownKey, { entry, signed }: Arrival): Promise<boolean> {
  const options = { key: keyObject(key), dsaEncoding: 'ieee-p1363' as const };
  return new Promise((resolve, reject) => {
    verify('sha256', signed, options, Buffer.from(entry.signature, 'base64url'), (error, fits) =>
      error ? reject(error) : resolve(fits),
    );
  });
}

/**
 * Entries that no other entry of the same log in this push names as `previous`. Each of the others is covered: its
 * hash, signature included, stands in the signed bytes of the one after it.
 */
export function lastOfBranches(arrivals: readonly Arrival[]): Arrival[] {
  const named = new Set(arrivals.map(({ entry }) => `${entry.log} ${entry.previous}`));
  return arrivals.filter(({ entry, hash }) => !named.has(`${entry.log} ${hash}`));
}

/** @throws Refused 422 naming each entry whose signature does not fit. */
export async function verifyBranches(
  arrivals: readonly Arrival[],
  keys: ReadonlyMap<string, KnownKey>,
): Promise<void> {
  const checked = await Promise.all(
    lastOfBranches(arrivals).map(async (arrival) => {
      const key = keys.get(arrival.key);
      return { arrival, fits: key !== undefined && (await signatureFits(key, arrival)) };
    }),
  );
  const errors = checked
    .filter(({ fits }) => !fits)
    .map(({ arrival }) => ({ path: `entries.${arrival.index}.signature`, says: 'does not fit the entry' }));
  if (errors.length > 0) throw refusedAt('bad-signature', errors);
}
