/** Adds a signed entry to the outbox so that it is either wholly kept or the caller is told it was not. */
import { v7 } from 'uuid';
import { bodySchemas, type BodyOf, type Entry, type EntryKind } from '../../shared/job/entry';
import { entryHash, signedBytes } from '../../shared/job/entryBytes';
import { addToOutbox } from './addToOutbox';
import type { AppendBases, AppendBasis } from './appendBasis';
import type { DeviceEnvironment } from './environment';
import { notSaved } from './notSaved';
import type { Outbox } from './outboxDatabase';
import { signEntry } from './signEntry';
import { NotSavedError } from './types';

// sync.md: an entry is at most 64 kB.
const maxEntryBytes = 64_000;
// Each repeat means that another tab wrote between our reading and our writing; a person makes one answer at a time.
const maxRepeats = 50;

export interface AppendContext {
  env: DeviceEnvironment;
  outbox: Outbox;
  bases: AppendBases;
}

function unsignedEntry<K extends EntryKind>(
  env: DeviceEnvironment,
  { job, log, head, seen, pack }: AppendBasis,
  kind: K,
  body: BodyOf<K>,
): Omit<Entry, 'signature'> {
  const now = env.now();
  return {
    id: v7({ msecs: now, random: env.randomBytes(16) }),
    job,
    log,
    seq: (head?.seq ?? 0) + 1,
    previous: head?.hash ?? null,
    seen,
    kind,
    body: body,
    pack,
    at: new Date(now).toISOString(),
  };
}

/** Null, with nothing written, when the log has moved on since the basis was read. */
async function tryOnce<K extends EntryKind>(
  { env, outbox, bases }: AppendContext,
  basis: AppendBasis,
  kind: K,
  body: BodyOf<K>,
): Promise<Entry | null> {
  const unsigned = unsignedEntry(env, basis, kind, body);
  const bytes = new Uint8Array(signedBytes({ ...unsigned, signature: '' }));
  if (bytes.length > maxEntryBytes) throw new NotSavedError('too-big', 'the entry is larger than 64 kB');
  const entry = await signEntry(env.subtle, basis.key.pair.privateKey, unsigned, bytes);
  const { job, log, key } = basis;
  const head = { log, job, key: key.key, person: key.person, seq: entry.seq, hash: entryHash(entry) };
  if (!(await addToOutbox(outbox, entry, basis.head, head))) return null;
  bases.move(basis, head);
  return entry;
}

async function tryUntilKept<K extends EntryKind>(
  context: AppendContext,
  person: string,
  job: string,
  kind: K,
  body: BodyOf<K>,
): Promise<Entry> {
  for (let repeat = 0; repeat < maxRepeats; repeat += 1) {
    const entry = await tryOnce(context, await context.bases.of(person, job), kind, body);
    if (entry) return entry;
    context.bases.forget();
  }
  throw new NotSavedError('locked', 'another tab keeps writing to this log');
}

/**
 * Builds, signs and keeps an entry; resolves when its transaction has completed.
 * @throws NotSavedError when it was not kept; ZodError when the body is not one of its kind.
 */
export async function appendEntry<K extends EntryKind>(
  context: AppendContext,
  person: string,
  job: string,
  kind: K,
  body: BodyOf<K>,
): Promise<Entry> {
  const parsed = bodySchemas[kind].parse(body);
  try {
    return await tryUntilKept(context, person, job, kind, parsed);
  } catch (error) {
    context.bases.forget();
    throw notSaved(error);
  }
}
