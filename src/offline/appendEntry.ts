/** Adds a signed entry to the outbox so that it is either wholly kept or the caller is told it was not. */
import { v7 } from 'uuid';
import { bodySchemas, type BodyOf, type Entry, type EntryKind } from '../../shared/job/entry';
import { entryHash, signedBytes } from '../../shared/job/entryBytes';
import { logId } from '../../shared/job/logId';
import type { Databases } from './databases';
import type { DeviceEnvironment } from './environment';
import { notSaved } from './notSaved';
import type { DeviceKey, LogHead, Outbox } from './outboxDatabase';
import { signEntry } from './signEntry';
import { NotSavedError } from './types';
import { versionVector } from './versionVector';
import type { Work } from './workDatabase';

// sync.md: an entry is at most 64 kB.
const maxEntryBytes = 64_000;
// Each repeat means that another tab wrote between our reading and our writing; a person makes one answer at a time.
const maxRepeats = 50;

async function keyOf(outbox: Outbox, person: string): Promise<DeviceKey> {
  const key = await outbox.run(async (database) => {
    const enrolled = await database.get('people', person);
    return enrolled && database.get('keys', enrolled.key);
  });
  if (!key) throw new NotSavedError('no-key', 'this person has no key on this device');
  return key;
}

async function packOf(work: Work, job: string): Promise<string> {
  const row = await work.run((database) => database.get('jobs', job));
  if (!row) throw new NotSavedError('no-pack', 'the job is not on this device');
  return row.pack;
}

/** False when the log has moved on since `base` was read: nothing was written then. */
async function addToOutbox(outbox: Outbox, entry: Entry, base: LogHead | undefined, head: LogHead) {
  return outbox.write(['entries', 'heads'], async (transaction) => {
    const current = await transaction.objectStore('heads').get(entry.log);
    // The same hash already there: the first try was kept and only its connection was lost.
    if (current?.hash === head.hash) return true;
    if (current?.hash !== base?.hash) return false;
    await transaction.objectStore('entries').add(entry);
    await transaction.objectStore('heads').put(head);
    return true;
  });
}

async function tryOnce<K extends EntryKind>(
  env: DeviceEnvironment,
  { outbox, work }: Databases,
  key: DeviceKey,
  job: string,
  kind: K,
  body: BodyOf<K>,
): Promise<Entry | null> {
  const log = logId(job, key.key);
  const [pack, base] = await Promise.all([
    packOf(work, job),
    outbox.run((database) => database.get('heads', log)),
  ]);
  const now = env.now();
  const unsigned = {
    id: v7({ msecs: now, random: env.randomBytes(16) }),
    job,
    log,
    seq: (base?.seq ?? 0) + 1,
    previous: base?.hash ?? null,
    seen: await versionVector({ outbox, work }, job, log),
    kind,
    body: body as Record<string, unknown>,
    pack,
    at: new Date(now).toISOString(),
  };
  if (signedBytes({ ...unsigned, signature: '' }).length > maxEntryBytes)
    throw new NotSavedError('too-big', 'the entry is larger than 64 kB');
  const entry = await signEntry(env.subtle, key.pair.privateKey, unsigned);
  const head = { log, job, key: key.key, person: key.person, seq: entry.seq, hash: entryHash(entry) };
  return (await addToOutbox(outbox, entry, base, head)) ? entry : null;
}

/**
 * Builds, signs and keeps an entry; resolves when its transaction has completed.
 * @throws NotSavedError when it was not kept; ZodError when the body is not one of its kind.
 */
export async function appendEntry<K extends EntryKind>(
  env: DeviceEnvironment,
  databases: Databases,
  person: string,
  job: string,
  kind: K,
  body: BodyOf<K>,
): Promise<Entry> {
  const parsed = bodySchemas[kind].parse(body);
  try {
    const key = await keyOf(databases.outbox, person);
    for (let repeat = 0; repeat < maxRepeats; repeat += 1) {
      const entry = await tryOnce(env, databases, key, job, kind, parsed);
      if (entry) return entry;
    }
  } catch (error) {
    throw notSaved(error);
  }
  throw new NotSavedError('locked', 'another tab keeps writing to this log');
}
