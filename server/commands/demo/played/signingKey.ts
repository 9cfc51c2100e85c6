/** A key of one person on one device that signs entries the way a phone does. */
import { generateKeyPairSync, sign, type KeyObject } from 'node:crypto';
import { v7 } from 'uuid';
import type { Entry } from '../../../../shared/job/entry';
import { signedBytes } from '../../../../shared/job/entryBytes';

export interface SigningKey {
  device: string;
  key: string;
  privateKey: KeyObject;
  publicKey: { kty: 'EC'; crv: 'P-256'; x: string; y: string };
}

export function newKey(device = v7()): SigningKey {
  const pair = generateKeyPairSync('ec', { namedCurve: 'P-256' });
  const { x = '', y = '' } = pair.publicKey.export({ format: 'jwk' });
  return { device, key: v7(), privateKey: pair.privateKey, publicKey: { kty: 'EC', crv: 'P-256', x, y } };
}

export function signed({ privateKey }: SigningKey, unsigned: Omit<Entry, 'signature'>): Entry {
  const bytes = signedBytes({ ...unsigned, signature: '' });
  const signature = sign('sha256', bytes, { key: privateKey, dsaEncoding: 'ieee-p1363' });
  return { ...unsigned, signature: signature.toString('base64url') };
}
