/** The bytes that are hashed and signed: RFC 8785 canonical JSON, the same in browser and server. */
import { sha256 } from '@noble/hashes/sha2.js';
import { bytesToHex, utf8ToBytes } from '@noble/hashes/utils.js';
import canonicalize from 'canonicalize';

/** @throws on NaN, infinities and lone surrogates, which have no canonical form. */
export function canonicalJson(value: unknown): string {
  const json = canonicalize(value);
  if (json === undefined) throw new Error('nothing to write canonically');
  return json;
}
export const canonicalBytes = (value: unknown): Uint8Array => utf8ToBytes(canonicalJson(value));
/** SHA-256, in hex, of the canonical JSON of a value. */
export const digestOf = (value: unknown): string => bytesToHex(sha256(canonicalBytes(value)));
