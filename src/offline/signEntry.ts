/** Puts the signature over an entry's canonical bytes to it, made with the person's key of this device. */
import type { Entry } from '../../shared/job/entry';

export const signatureAlgorithm = { name: 'ECDSA', hash: 'SHA-256' } as const;
export const keyAlgorithm = { name: 'ECDSA', namedCurve: 'P-256' } as const;

/** Base64url without padding (RFC 4648 §5). */
export function base64url(bytes: Uint8Array): string {
  return btoa(String.fromCharCode(...bytes))
    .replaceAll('+', '-')
    .replaceAll('/', '_')
    .replaceAll('=', '');
}

/**
 * WebCrypto signs ECDSA in the P1363 form (r ‖ s, 64 bytes), which is the form of our wire.
 * @param bytes the entry's `signedBytes`
 */
export async function signEntry(
  subtle: SubtleCrypto,
  key: CryptoKey,
  unsigned: Omit<Entry, 'signature'>,
  bytes: Uint8Array<ArrayBuffer>,
): Promise<Entry> {
  const signature = new Uint8Array(await subtle.sign(signatureAlgorithm, key, bytes));
  return { ...unsigned, signature: base64url(signature) };
}
