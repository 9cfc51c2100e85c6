/** One person's turn at a random job: what they hold, and the plain things that they can write. */
import type { Step } from '../../../shared/checklist/types';
import type { AnswerValue, BodyOf, Entry, EntryKind } from '../../../shared/job/entry';
import { foldJob } from '../../../shared/job/fold';
import { gateFor } from '../../../shared/job/gates';
import { nextStep } from '../../../shared/job/next';
import type { JobPerson, JobState } from '../../../shared/job/types';
import { answerBody, goodValue, lockNumber, type Device, type Job } from '../../support/jobScenario';

export const at = <T>(list: readonly T[], pick: number): T | undefined =>
  list[pick % Math.max(1, list.length)];

export class Turn {
  constructor(
    readonly job: Job,
    readonly person: JobPerson,
    readonly device: Device,
    readonly pick: number,
    /** Entries of answers that the phone let through. */
    private readonly letThrough: Set<string>,
  ) {}

  /** What this phone shows now. */
  state(): JobState {
    return foldJob(this.job.checklist, this.job.held(this.device), this.job.facts);
  }
  held(): Entry[] {
    return this.job.held(this.device);
  }
  get steps(): readonly Step[] {
    return this.job.checklist.steps;
  }
  isolator(): string {
    return at(this.job.checklist.isolators, this.pick) ?? '';
  }
  point(): string {
    return at(this.job.checklist.scope, this.pick) ?? '';
  }
  pickStep(of: (step: Step) => boolean): Step | undefined {
    return at(this.steps.filter(of), this.pick);
  }

  write<K extends EntryKind>(kind: K, body: BodyOf<K>): Entry {
    return this.job.writeDeaf(this.device, kind, body);
  }

  /** Rewrites the newest entry: what this version of the app would not write itself. */
  change(changes: Partial<Entry>): void {
    const { job, device } = this;
    const last = job.entries.at(-1);
    if (!last || last !== device.head) return;
    device.head = { ...last, ...changes };
    job.entries[job.entries.length - 1] = device.head;
  }

  answer(step: Step, value: AnswerValue, watched?: string): Entry {
    const body = answerBody(step, value);
    return this.write('answer', watched === undefined ? body : { ...body, watched });
  }

  /** Answers a step well, whatever its gate says. */
  answerWell(step: Step, lock?: string): Entry {
    const { ask } = step;
    if (ask.kind === 'lock-on') return this.lockOn(ask.isolator, lock);
    if (ask.kind === 'lock-off')
      return this.write('lock-off', {
        isolator: ask.isolator,
        lock: lock ?? this.ownNumber(ask.isolator),
        step: step.id,
      });
    if (ask.kind === 'close')
      return this.write('closed', { isolator: ask.isolator, step: step.id, counted: 0 });
    return this.answer(step, goodValue(ask) ?? { kind: 'done' });
  }

  /** A padlock that is free to put on, or the own one that hangs there. */
  private padlock({ ask }: Step, { locks }: JobState): string | undefined {
    if (ask.kind !== 'lock-on' && ask.kind !== 'lock-off') return undefined;
    const on = locks.filter(({ offAt }) => offAt === undefined);
    if (ask.kind === 'lock-off')
      return on.find(({ person, isolator }) => person === this.person.id && isolator === ask.isolator)?.lock;
    const own = this.ownNumber(ask.isolator);
    return on.some(({ lock }) => lock === own) ? `${own}-${this.job.entries.length}` : own;
  }

  ownNumber(isolator: string): string {
    return lockNumber(this.person, isolator);
  }
  lockOn(isolator: string, lock = this.ownNumber(isolator)): Entry {
    return this.write('lock-on', { isolator, lock });
  }
  lockOff(isolator: string): Entry {
    return this.write('lock-off', { isolator, lock: this.ownNumber(isolator) });
  }

  /** Follows the app, so many steps; who works says to be clear when asked. */
  goOn(count: number): void {
    for (let left = count; left > 0; left -= 1) {
      const state = this.state();
      const step = nextStep(this.job.checklist, state, this.person.id);
      if (!step) return;
      const asksClear = step.ask.kind === 'close' && !state.clear.includes(this.person.id);
      if (asksClear) this.write('clear', { person: this.person.id });
      else if (gateFor(this.job.checklist, state, this.person.id, step.id).open)
        this.letThrough.add(this.answerWell(step, this.padlock(step, state)).id);
      else return;
    }
  }

  /** The turn of somebody else on the job, on their own phone, who has heard everything. */
  as(person: JobPerson): Turn {
    const turn = new Turn(this.job, person, this.job.device(person), this.pick, this.letThrough);
    turn.hearAll();
    return turn;
  }

  hearAll(): void {
    this.job.hear(this.device);
  }
}
