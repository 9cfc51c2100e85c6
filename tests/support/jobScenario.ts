/** Entries that look signed, made from a checklist by people who walk through it: whole jobs, or up to a stage. */
import { v5 } from 'uuid';
import { type Ask, type Checklist, type Stage, type Step, stages } from '../../shared/checklist/types';
import type { AnswerValue, BodyOf, Entry, EntryKind } from '../../shared/job/entry';
import { entryHash } from '../../shared/job/entryBytes';
import { canSign } from '../../shared/job/canSign';
import { foldJob } from '../../shared/job/fold';
import { gateFor } from '../../shared/job/gates';
import { nextStep } from '../../shared/job/next';
import type { JobFacts, JobPerson, JobState } from '../../shared/job/types';

const space = '6f6c2a52-6a5a-4b5e-9c1e-0d6a5b1f7c11';
export const idOf = (name: string): string => v5(name, space);
/** Shaped like a signature; nobody has signed it. */
export const unsignedMark = 'A'.repeat(86);
export const packDigest = 'c'.repeat(64);

export const people: JobPerson[] = [
  { id: idOf('mara'), name: 'Mara Lind', part: 'electrician' },
  { id: idOf('ilya'), name: 'Ilya Ron', part: 'electrician' },
  { id: idOf('tomas'), name: 'Tomas Oja', part: 'foreman' },
];
export const [mara, ilya, tomas] = people as [JobPerson, JobPerson, JobPerson];

/** One person's log on one device, and what that device has heard. */
export interface Device {
  log: string;
  person: string;
  head: Entry | undefined;
  heard: Map<string, number>;
}

export class Job {
  readonly entries: Entry[] = [];
  readonly devices = new Map<string, Device>();
  private minutes = 0;

  constructor(
    readonly checklist: Checklist,
    readonly facts: JobFacts,
    readonly id = idOf('job'),
    readonly pack = packDigest,
  ) {}

  /** The person's log on a device of this name; made when first asked for. */
  device(person: JobPerson, name = 'phone'): Device {
    const key = `${person.id} ${name}`;
    const known = this.devices.get(key);
    if (known) return known;
    const log = idOf(`${this.id} ${key}`);
    const made = { log, person: person.id, head: undefined, heard: new Map<string, number>() };
    this.devices.set(key, made);
    this.facts.logs[log] = person.id;
    return made;
  }

  /** The device hears everything that was written so far. */
  hear(device: Device): void {
    for (const { log, seq } of this.entries)
      if (log !== device.log) device.heard.set(log, Math.max(seq, device.heard.get(log) ?? 0));
  }

  /** Writes without hearing anything first. */
  writeDeaf<K extends EntryKind>(device: Device, kind: K, body: BodyOf<K>): Entry {
    this.minutes += 1;
    const seq = (device.head?.seq ?? 0) + 1;
    const entry: Entry = {
      id: idOf(`${device.log} ${seq} ${this.entries.length}`),
      job: this.id,
      log: device.log,
      seq,
      previous: device.head ? entryHash(device.head) : null,
      seen: Object.fromEntries(device.heard),
      kind,
      body,
      pack: this.pack,
      at: new Date(Date.UTC(2026, 10, 30, 8, this.minutes)).toISOString(),
      signature: unsignedMark,
    };
    device.head = entry;
    this.entries.push(entry);
    return entry;
  }

  /** Hears, then writes. */
  write<K extends EntryKind>(person: JobPerson, kind: K, body: BodyOf<K>): Entry {
    const device = this.device(person);
    this.hear(device);
    return this.writeDeaf(device, kind, body);
  }

  /** The same job so far, to go on with in another way. */
  copy(): Job {
    const { people: on, logs } = this.facts;
    const job = new Job(this.checklist, { people: on, logs: { ...logs } }, this.id, this.pack);
    job.entries.push(...this.entries);
    for (const [key, device] of this.devices)
      job.devices.set(key, { ...device, heard: new Map(device.heard) });
    job.minutes = this.minutes;
    return job;
  }

  /** What this device holds: its own and what it has heard. */
  held(device: Device): Entry[] {
    return this.entries.filter(({ log, seq }) => log === device.log || seq <= (device.heard.get(log) ?? 0));
  }

  state(): JobState {
    return foldJob(this.checklist, this.entries, this.facts);
  }
}

export const newJob = (checklist: Checklist, on: JobPerson[] = people): Job =>
  new Job(checklist, { people: on, logs: {} });

const inMiddle = ({ low, high, dead }: Extract<Ask, { kind: 'reading' }>): number => {
  if (dead) return 0.1;
  if (low !== undefined && high !== undefined) return (low + high) / 2;
  return high ?? low ?? 1;
};

/** A good answer to what a step asks; undefined for locks and closing, which are entries of their own kind. */
export function goodValue(ask: Ask): AnswerValue | undefined {
  switch (ask.kind) {
    case 'done':
      return { kind: 'done' };
    case 'reading':
      return { kind: 'reading', value: inMiddle(ask) };
    case 'choice':
      return { kind: 'choice', value: ask.options.find(({ ok }) => ok)?.value ?? '' };
    case 'text':
      return { kind: 'text', text: 'As found' };
    case 'photo':
      return { kind: 'photo', sha256: 'd'.repeat(64) };
    case 'wait':
      return { kind: 'wait', waitedS: ask.seconds };
    case 'scan':
      return { kind: 'scan', text: ask.expect, typed: true };
    case 'instrument':
      return {
        kind: 'instrument',
        make: 'Sample',
        number: '0417',
        category: 'CAT IV',
        ratedV: Math.max(1000, ask.minV),
        checkDue: '2099-01-01',
      };
    default:
      return undefined;
  }
}

export const answerBody = (step: Step, value: AnswerValue): BodyOf<'answer'> => ({
  step: step.id,
  value,
  shown: step.title.key,
  language: 'en',
});

/** The number of this person's lock on an isolator: every lock its own. */
export const lockNumber = (person: JobPerson, isolator: string): string =>
  `${person.name.charAt(0)}-${isolator}`;

/** Answers a step well, whatever it asks. */
export function answerWell(job: Job, person: JobPerson, step: Step): Entry {
  const { ask } = step;
  if (ask.kind === 'lock-on' || ask.kind === 'lock-off') {
    const { isolator } = ask;
    return job.write(person, ask.kind, { isolator, lock: lockNumber(person, isolator), step: step.id });
  }
  if (ask.kind === 'close')
    return job.write(person, 'closed', { isolator: ask.isolator, step: step.id, counted: 0 });
  return job.write(person, 'answer', answerBody(step, goodValue(ask) ?? { kind: 'done' }));
}

const signature = (person: JobPerson, meaning: string) => ({
  name: person.name,
  zone: 'UTC',
  meaning,
  digest: 'e'.repeat(64),
  language: 'en' as const,
  picture: { typed: person.name },
});

export function sign(job: Job, person: JobPerson): Entry {
  const gate = canSign(job.checklist, job.state(), person.id);
  if (!gate.open) throw new Error(gate.refusals.map(({ code }) => code).join());
  const meaning = 'I did this work and these answers are mine';
  return job.write(person, 'signed', { ...signature(person, meaning), steps: gate.steps });
}

export function countersign(job: Job, person: JobPerson): Entry {
  const meaning = 'I reviewed this work and accept it';
  job.hear(job.device(person));
  return job.write(person, 'countersigned', { ...signature(person, meaning), heads: job.state().heads });
}

/** What a person does about a step instead of answering it well; true when it was dealt with. */
export type Otherwise = (step: Step, job: Job) => boolean;

/**
 * The person follows the next step, over and over, until nothing waits for them, a step of `until` does,
 * or the step that waits is shut.
 * Whoever is on the job says to be clear when the first isolator would be closed.
 */
export function walk(job: Job, person: JobPerson, until?: Stage, otherwise?: Otherwise): void {
  const end = until === undefined ? stages.length : stages.indexOf(until);
  for (let count = 0; count < 100_000; count += 1) {
    const state = job.state();
    const step = nextStep(job.checklist, state, person.id);
    if (!step || stages.indexOf(step.stage) >= end) return;
    if (step.ask.kind === 'close' && !state.clear.includes(person.id)) {
      sayClear(job);
      continue;
    }
    if (otherwise?.(step, job)) continue;
    if (!gateFor(job.checklist, state, person.id, step.id).open) return;
    answerWell(job, person, step);
  }
}

/** Every electrician says to be clear, each on their own phone. */
export function sayClear(job: Job): void {
  for (const person of job.facts.people)
    if (person.part === 'electrician') job.write(person, 'clear', { person: person.id });
}

/** Accepts and walks the job up to the first step of a stage; without a stage, to the signature's gate. */
export function jobUntil(checklist: Checklist, until?: Stage, on: JobPerson[] = [mara, tomas]): Job {
  const job = newJob(checklist, on);
  const [worker] = on;
  if (!worker) throw new Error('a job needs somebody who works');
  job.write(worker, 'accepted', {});
  walk(job, worker, until);
  return job;
}

/** A whole job of one electrician and a foreman: every stage, signed and countersigned. */
export function completeJob(checklist: Checklist, on: JobPerson[] = [mara, tomas]): Job {
  const job = jobUntil(checklist, undefined, on);
  const [worker] = on;
  const foreman = on.find(({ part }) => part === 'foreman');
  if (worker) sign(job, worker);
  if (foreman) countersign(job, foreman);
  return job;
}

/**
 * The same job written straight down in the order of the checklist, without asking what comes next:
 * quick for thousands of steps. One electrician; every answer is good.
 */
export function plainJob(checklist: Checklist, on: JobPerson[] = [mara, tomas]): Job {
  const job = newJob(checklist, on);
  const [worker] = on;
  if (!worker) throw new Error('a job needs somebody who works');
  job.write(worker, 'accepted', {});
  const firstClose = checklist.steps.find(({ ask }) => ask.kind === 'close');
  for (const step of checklist.steps) {
    if (step === firstClose) sayClear(job);
    answerWell(job, worker, step);
  }
  return job;
}
