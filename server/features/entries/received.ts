/** What a push carries, as it will be stored: hashed, with the place of each entry in its log. */
import { canonicalJson } from '../../../shared/panel/canonical';
import type { Entry } from '../../../shared/job/entry';
import { signedBytes } from '../../../shared/job/entryBytes';
import { createHash } from 'node:crypto';
import { Refused, type PathError } from '../../http/refused';

export interface Arrival {
  entry: Entry;
  key: string;
  hash: string;
  /** Canonical JSON: the bytes of `hash`. */
  content: string;
  signed: Uint8Array;
  /** Place in the request, for telling what was refused. */
  index: number;
}

/** sync.md: an entry is 64 kB at most. */
const mostBytes = 65_536;

export const refusedAt = (
  code: 'invalid' | 'bad-signature' | 'broken-log' | 'unknown-key' | 'unknown-pack',
  errors: PathError[],
) => new Refused(422, code, {}, errors);

function bytesOf(entry: Entry, index: number): { content: string; signed: Uint8Array } {
  try {
    return { content: canonicalJson(entry), signed: signedBytes(entry) };
  } catch {
    // A lone surrogate has no canonical form, so nobody can have signed it.
    throw refusedAt('invalid', [{ path: `entries.${index}`, says: 'has no canonical form' }]);
  }
}

/** @throws Refused 422 for an entry that is too large or has no canonical form. */
export function arrivalsOf(entries: readonly Entry[], keyOf: (log: string) => string): Arrival[] {
  return entries.map((entry, index) => {
    const { content, signed } = bytesOf(entry, index);
    if (Buffer.byteLength(content) > mostBytes)
      throw refusedAt('invalid', [{ path: `entries.${index}`, says: `has more than ${mostBytes} bytes` }]);
    const hash = createHash('sha256').update(content).digest('hex');
    return { entry, key: keyOf(entry.log), hash, content, signed, index };
  });
}
