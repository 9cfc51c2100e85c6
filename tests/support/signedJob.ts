/** A job on the server that people walk through with real keys: the scenario's own walk, each entry signed. */
import { v7 } from 'uuid';
import type { Pack } from '../../shared/api/jobs';
import type { BodyOf, Entry, EntryKind } from '../../shared/job/entry';
import { entryHash } from '../../shared/job/entryBytes';
import { logId } from '../../shared/job/logId';
import { signatureDigest } from '../../shared/job/signatureDigest';
import type { JobPerson } from '../../shared/job/types';
import { canSign } from '../../shared/job/canSign';
import { answerWell, Job, sayClear, walk, type Device, type Otherwise } from './jobScenario';
import type { Agent } from './seedPeople';
import { signed, type SigningDevice } from './signingDevice';

export class SignedJob extends Job {
  private count = 0;
  private sent = 0;

  constructor(
    readonly packed: Pack,
    private readonly keys: ReadonlyMap<string, SigningDevice>,
  ) {
    const people = packed.people.map(({ id, name, part }) => ({ id, name, part }));
    super(packed.checklist, { people, logs: {} }, packed.job.id, packed.digest);
  }

  private keyOf(person: string): SigningDevice {
    const key = this.keys.get(person);
    if (!key) throw new Error(`no key for ${person}`);
    return key;
  }

  override device(person: JobPerson): Device {
    const known = this.devices.get(person.id);
    if (known) return known;
    const log = logId(this.id, this.keyOf(person.id).key);
    const made: Device = { log, person: person.id, head: undefined, heard: new Map() };
    this.devices.set(person.id, made);
    this.facts.logs[log] = person.id;
    return made;
  }

  override writeDeaf<K extends EntryKind>(device: Device, kind: K, body: BodyOf<K>): Entry {
    this.count += 1;
    const entry = signed(this.keyOf(device.person), {
      id: v7(),
      job: this.id,
      log: device.log,
      seq: (device.head?.seq ?? 0) + 1,
      previous: device.head ? entryHash(device.head) : null,
      seen: Object.fromEntries(device.heard),
      kind,
      body,
      pack: this.pack,
      at: new Date(Date.UTC(2026, 10, 30, 8, 0, this.count)).toISOString(),
    });
    device.head = entry;
    this.entries.push(entry);
    return entry;
  }

  person(part: JobPerson['part']): JobPerson {
    const found = this.facts.people.find((each) => each.part === part);
    if (!found) throw new Error(`nobody is ${part}`);
    return found;
  }

  private signature(person: JobPerson, meaning: string) {
    const digest = signatureDigest({ pack: this.packed, state: this.state(), language: 'en' });
    const picture = {
      strokes: [
        [
          [0.1, 0.2, 0.5],
          [0.3, 0.1, 0.5],
          [0.6, 0.2, 0.5],
        ] as [number, number, number][],
      ],
    };
    return { name: person.name, zone: 'Europe/Madrid', meaning, digest, language: 'en' as const, picture };
  }

  /** The electrician does everything, straight down the checklist; with `otherwise`, step by step as it comes next. */
  work(otherwise?: Otherwise): void {
    const worker = this.person('electrician');
    this.write(worker, 'accepted', {});
    if (otherwise) walk(this, worker, undefined, otherwise);
    else this.straightDown(worker);
  }

  private straightDown(worker: JobPerson): void {
    const firstClose = this.checklist.steps.find(({ ask }) => ask.kind === 'close');
    for (const step of this.checklist.steps) {
      if (step === firstClose) sayClear(this);
      answerWell(this, worker, step);
    }
  }

  sign(person = this.person('electrician')): void {
    const gate = canSign(this.checklist, this.state(), person.id);
    if (!gate.open) throw new Error(gate.refusals.map(({ code }) => code).join());
    const body = this.signature(person, 'I did this work and these answers are mine');
    this.write(person, 'signed', { ...body, steps: gate.steps });
  }

  countersign(change: Partial<BodyOf<'countersigned'>> = {}): void {
    const person = this.person('foreman');
    this.device(person);
    const body = this.signature(person, 'I reviewed this work and accept it');
    this.write(person, 'countersigned', { ...body, heads: this.state().heads, ...change });
  }

  /** Pushes what is new, in the order it was written. */
  async deliver(agent: Agent): Promise<void> {
    const logs = Object.fromEntries(
      [...this.devices.values()].map(({ log, person }) => [log, this.keyOf(person).key]),
    );
    while (this.sent < this.entries.length) {
      const entries = this.entries.slice(this.sent, this.sent + 300);
      const named = Object.fromEntries(entries.map(({ log }) => [log, logs[log]]));
      const answer = await agent.post(`/api/jobs/${this.id}/entries`).send({ logs: named, entries });
      if (answer.status !== 200) throw new Error(JSON.stringify(answer.body));
      this.sent += entries.length;
    }
  }
}
