/** What a new entry is built on, kept in memory between two answers so that saving one waits for a single write. */
import { logId } from '../../shared/job/logId';
import type { Databases } from './databases';
import type { DeviceKey, LogHead } from './outboxDatabase';
import { NotSavedError } from './types';
import { versionVector } from './versionVector';

export interface AppendBasis {
  job: string;
  key: DeviceKey;
  log: string;
  /** Digest of the pack that the job's screens show. */
  pack: string;
  head: LogHead | undefined;
  seen: Record<string, number>;
  /** How often everything had been forgotten when this was read. */
  turn: number;
}

async function keyOf({ outbox }: Databases, person: string): Promise<DeviceKey> {
  const key = await outbox.run(async (database) => {
    const enrolled = await database.get('people', person);
    return enrolled && database.get('keys', enrolled.key);
  });
  if (!key) throw new NotSavedError('no-key', 'this person has no key on this device');
  return key;
}

async function readBasis(
  databases: Databases,
  person: string,
  job: string,
): Promise<Omit<AppendBasis, 'turn'>> {
  const key = await keyOf(databases, person);
  const row = await databases.work.run((database) => database.get('jobs', job));
  if (!row) throw new NotSavedError('no-pack', 'the job is not on this device');
  const log = logId(job, key.key);
  const head = await databases.outbox.run((database) => database.get('heads', log));
  const seen = await versionVector(databases, row, log);
  return { job, key, log, pack: row.pack, head, seen };
}

/**
 * Whatever is kept here may be old, and only in ways that do no harm: an old head or key is found out inside the
 * write's transaction; an old `seen` claims less than is held, which can only keep a gate shut; an old `pack` is
 * the one the screens still show, because both are forgotten together.
 */
export class AppendBases {
  private kept = new Map<string, Promise<AppendBasis>>();
  private turn = 0;

  constructor(private readonly databases: Databases) {}

  of(person: string, job: string): Promise<AppendBasis> {
    const name = `${person} ${job}`;
    const known = this.kept.get(name);
    if (known) return known;
    const { kept, turn } = this;
    const reading = readBasis(this.databases, person, job).then((basis) => ({ ...basis, turn }));
    kept.set(name, reading);
    reading.catch(() => kept.delete(name));
    return reading;
  }

  /** The log has a new head; others on this device have seen less of this job than is held now. */
  move(basis: AppendBasis, head: LogHead): void {
    for (const name of this.kept.keys()) if (name.endsWith(` ${basis.job}`)) this.kept.delete(name);
    // What was forgotten while it was being written to is read again.
    if (basis.turn !== this.turn) return;
    this.kept.set(`${basis.key.person} ${basis.job}`, Promise.resolve({ ...basis, head }));
  }

  /** At every change that another tab or the sender may have made, and when a write did not go through. */
  forget(): void {
    this.turn += 1;
    this.kept = new Map();
  }
}
