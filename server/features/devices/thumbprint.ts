/** The name of a public key: RFC 7638 thumbprint, SHA-256. */
import { createHash } from 'node:crypto';
import type { PublicKey } from './entity';

/** RFC 7638 §3.2: the required members of an EC key, in lexicographic order, without white space. */
export const thumbprint = ({ crv, kty, x, y }: PublicKey): string =>
  createHash('sha256').update(JSON.stringify({ crv, kty, x, y })).digest('base64url');
