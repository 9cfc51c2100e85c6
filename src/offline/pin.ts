/** The PIN that opens the app offline: how it is kept and how long a wrong one makes the next wait. */
import type { PinVerifier } from './outboxDatabase';

// sync.md: PBKDF2-SHA-256, 600,000 rounds, as OWASP's password storage cheat sheet asks of this function.
export const pinRounds = 600_000;
const saltBytes = 16;
const hashBits = 256;

export const isStrongPin = (pin: string): boolean => /^\d{6,}$/.test(pin);

// One second after the first wrong PIN, doubling, never above five minutes: a nuisance to a guesser,
// but a colleague cannot keep somebody from taking their own lock off.
const firstDelayMs = 1_000;
const maxDelayMs = 300_000;

/** How long the next try waits after `wrong` wrong ones in a row, in milliseconds. */
export const pinDelayMs = (wrong: number): number =>
  wrong === 0 ? 0 : Math.min(maxDelayMs, firstDelayMs * 2 ** Math.min(wrong - 1, 20));

async function derive(subtle: SubtleCrypto, pin: string, salt: Uint8Array<ArrayBuffer>, rounds: number) {
  const key = await subtle.importKey('raw', new TextEncoder().encode(pin), 'PBKDF2', false, ['deriveBits']);
  const bits = await subtle.deriveBits(
    { name: 'PBKDF2', hash: 'SHA-256', salt, iterations: rounds },
    key,
    hashBits,
  );
  return new Uint8Array(bits);
}

export async function makeVerifier(
  subtle: SubtleCrypto,
  pin: string,
  randomBytes: (length: number) => Uint8Array<ArrayBuffer>,
): Promise<PinVerifier> {
  const salt = randomBytes(saltBytes);
  return { salt, rounds: pinRounds, hash: await derive(subtle, pin, salt, pinRounds) };
}

/** Compares every byte whatever the first ones say. */
export async function pinMatches(subtle: SubtleCrypto, pin: string, verifier: PinVerifier): Promise<boolean> {
  const hash = await derive(subtle, pin, verifier.salt, verifier.rounds);
  const difference = hash.reduce((sum, byte, index) => sum | (byte ^ (verifier.hash[index] ?? 256)), 0);
  return difference === 0 && hash.length === verifier.hash.length;
}
