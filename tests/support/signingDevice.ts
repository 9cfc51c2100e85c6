/** A device with a key of one person, that signs entries the way a phone does. */
import { createHash } from 'node:crypto';
import { v7 } from 'uuid';
import type { Entry } from '../../shared/job/entry';
import { newKey, signed, type SigningKey } from '../../server/commands/demo/played/signingKey';
import { entryHash } from '../../shared/job/entryBytes';
import { logId } from '../../shared/job/logId';
import type { Agent } from './seedPeople';

export type SigningDevice = SigningKey;
export const newDevice = newKey;
export { signed };

/** Registers the device and the signed-in person's key on it. */
export async function enrolDevice(agent: Agent, made = newDevice()): Promise<SigningDevice> {
  await agent.post('/api/devices').send({ id: made.device, name: 'Phone 7' }).expect(201);
  const { key: id, device, publicKey } = made;
  await agent.post('/api/devices/keys').send({ id, device, publicKey }).expect(201);
  return made;
}

type Content = Partial<Pick<Entry, 'kind' | 'body' | 'seen' | 'at'>>;

/** One log: each entry follows the one before. */
export class SignedLog {
  readonly entries: Entry[] = [];
  readonly log: string;

  constructor(
    readonly by: SigningDevice,
    readonly job: string,
    readonly pack: string,
  ) {
    this.log = logId(job, by.key);
  }

  /** Adds an entry after `after` (the newest, when it is not named), so that forks can be made. */
  add(content: Content = {}, after = this.entries.at(-1)): Entry {
    const entry = signed(this.by, {
      id: v7(),
      job: this.job,
      log: this.log,
      seq: (after?.seq ?? 0) + 1,
      previous: after ? entryHash(after) : null,
      seen: {},
      kind: 'note',
      body: { words: 'Looked at it' },
      pack: this.pack,
      at: new Date().toISOString(),
      ...content,
    });
    this.entries.push(entry);
    return entry;
  }

  /** The body of a push of these entries. */
  push(entries: readonly Entry[] = this.entries) {
    return { logs: { [this.log]: this.by.key }, entries };
  }
}

export const sha256 = (bytes: string | Buffer): string => createHash('sha256').update(bytes).digest('hex');
