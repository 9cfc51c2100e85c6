/** What is signed and what is chained of an entry. */
import { canonicalBytes, digestOf } from '../panel/canonical';
import type { Entry } from './entry';

/** The bytes a device signs: every field but the signature. */
export const signedBytes = ({ signature: _signature, ...rest }: Entry): Uint8Array => canonicalBytes(rest);
/** What the next entry of the log names as `previous`: the hash of the whole entry, signature included. */
export const entryHash = (entry: Entry): string => digestOf(entry);
