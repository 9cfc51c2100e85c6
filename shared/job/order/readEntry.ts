/** Reads whatever came as an entry: nothing a device sends may throw in the fold. */
import { canonicalJson } from '../../panel/canonical';
import { bodySchemas, entryKinds, type Entry, type EntryKind, type KnownEntry } from '../entry';

const kinds: ReadonlySet<string> = new Set(entryKinds);
const isKind = (kind: string): kind is EntryKind => kinds.has(kind);

const isRecord = (value: unknown): value is Record<string, unknown> =>
  typeof value === 'object' && value !== null && !Array.isArray(value);

const isSeq = (value: unknown): value is number => Number.isSafeInteger(value) && Number(value) > 0;

/** The outside of an entry holds together; signatures and hashes are the server's and the device's to check. */
export function isEntry(value: unknown): value is Entry {
  if (!isRecord(value)) return false;
  const { id, log, seq, seen, kind, body, at, pack, previous } = value;
  return (
    [id, log, kind, at, pack].every((each) => typeof each === 'string' && each.length > 0) &&
    (previous === null || typeof previous === 'string') &&
    isSeq(seq) &&
    isRecord(body) &&
    isRecord(seen) &&
    Object.values(seen).every(isSeq)
  );
}

// Entries never change, so what was read once need not be read again for the next state.
const read = new WeakMap<Entry, KnownEntry | false>();

/** The entry with its body parsed; undefined for a kind or a body that this version does not know. */
export function knownEntry(entry: Entry): KnownEntry | undefined {
  const before = read.get(entry);
  if (before !== undefined) return before || undefined;
  const isBody = isKind(entry.kind) && bodySchemas[entry.kind].safeParse(entry.body).success;
  // The schema of its kind has just accepted the body.
  const known = isBody ? (entry as unknown as KnownEntry) : undefined;
  read.set(entry, known ?? false);
  return known;
}

/** The canonical text of an entry, to tell two apart; undefined where it has none. */
export function textOf(entry: Entry): string | undefined {
  try {
    return canonicalJson(entry);
  } catch {
    return undefined;
  }
}
