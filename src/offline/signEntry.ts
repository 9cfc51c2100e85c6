/** Signs an entry's canonical bytes with the person's key of this device. */
import { signedBytes } from '../../shared/job/entryBytes';
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

/** WebCrypto signs ECDSA in the P1363 form (r ‖ s, 64 bytes), which is the form of our wire. */
export async function signEntry(
  subtle: SubtleCrypto,
  key: CryptoKey,
  unsigned: Omit<Entry, 'signature'>,
): Promise<Entry> {
  const bytes = new Uint8Array(signedBytes({ ...unsigned, signature: '' }));
  const signature = new Uint8Array(await subtle.sign(signatureAlgorithm, key, bytes));
  return { ...unsigned, signature: base64url(signature) };
}
