/** A job of the demo that people walk through with real keys, on phones that hear of one another. */
import { v7 } from 'uuid';
import type { Pack } from '../../../../shared/api/jobs';
import type { Language } from '../../../../shared/api/common';
import type { Step } from '../../../../shared/checklist/types';
import { canSign } from '../../../../shared/job/canSign';
import type { AnswerValue, BodyOf, Entry, EntryKind } from '../../../../shared/job/entry';
import { entryHash } from '../../../../shared/job/entryBytes';
import { foldJob } from '../../../../shared/job/fold';
import { gateFor } from '../../../../shared/job/gates';
import { logId } from '../../../../shared/job/logId';
import { nextStep } from '../../../../shared/job/next';
import { signatureDigest } from '../../../../shared/job/signatureDigest';
import type { JobState } from '../../../../shared/job/types';
import { render } from '../../../../shared/wording/render';
import { demoAnswer } from './demoAnswers';
import { signed, type SigningKey } from './signingKey';

const answerSeconds = 40;
/** A quick hand on the glass, as fractions of the width with pressure. */
const stroke: [number, number, number][] = [
  [0.08, 0.2, 0.4],
  [0.14, 0.08, 0.6],
  [0.2, 0.22, 0.5],
  [0.3, 0.1, 0.6],
  [0.38, 0.2, 0.5],
  [0.52, 0.12, 0.4],
  [0.7, 0.18, 0.3],
];

/** What somebody does about a step instead of answering it well; true when it was dealt with. */
export type Otherwise = (step: Step, job: DemoJob) => boolean;

export class DemoJob {
  readonly entries: Entry[] = [];
  private readonly heads = new Map<string, Entry>();
  private nowMs: number;

  constructor(
    readonly pack: Pack,
    private readonly keys: ReadonlyMap<string, SigningKey>,
    startedAt: Date,
    private readonly language: Language = 'en',
  ) {
    this.nowMs = startedAt.getTime();
  }

  private keyOf(person: string): SigningKey {
    const key = this.keys.get(person);
    if (!key) throw new Error(`no key for ${person}`);
    return key;
  }

  private logOf(person: string): string {
    return logId(this.pack.job.id, this.keyOf(person).key);
  }

  /** log → key of everybody who wrote, as a push names them. */
  logs(): Record<string, string> {
    const people = this.pack.people.filter(({ id }) => this.heads.has(this.logOf(id)));
    return Object.fromEntries(people.map(({ id }) => [this.logOf(id), this.keyOf(id).key]));
  }

  state(): JobState {
    const people = this.pack.people.map(({ id, name, part }) => ({ id, name, part }));
    const logs = Object.fromEntries(people.map(({ id }) => [this.logOf(id), id]));
    return foldJob(this.pack.checklist, this.entries, { people, logs });
  }

  write<K extends EntryKind>(person: string, kind: K, body: BodyOf<K>): Entry {
    const log = this.logOf(person);
    const head = this.heads.get(log);
    this.nowMs += answerSeconds * 1000;
    const others = [...this.heads].filter(([other]) => other !== log);
    const entry = signed(this.keyOf(person), {
      id: v7(),
      job: this.pack.job.id,
      log,
      seq: (head?.seq ?? 0) + 1,
      previous: head ? entryHash(head) : null,
      seen: Object.fromEntries(others.map(([other, { seq }]) => [other, seq])),
      kind,
      body,
      pack: this.pack.digest,
      at: new Date(this.nowMs).toISOString(),
    });
    this.heads.set(log, entry);
    this.entries.push(entry);
    return entry;
  }

  answer(person: string, step: Step, value: AnswerValue): void {
    const shown = [step.title, ...(step.detail ?? [])].map((text) => render(this.language, text)).join(' ');
    this.write(person, 'answer', {
      step: step.id,
      value,
      shown: shown.slice(0, 2000),
      language: this.language,
    });
  }

  private answerWell(person: string, step: Step): void {
    const { ask } = step;
    if (ask.kind === 'lock-on' || ask.kind === 'lock-off') {
      const lock = `${this.lockOf(person)}${this.pack.checklist.isolators.indexOf(ask.isolator)}`;
      this.write(person, ask.kind, { isolator: ask.isolator, lock, step: step.id });
    } else if (ask.kind === 'close')
      this.write(person, 'closed', { isolator: ask.isolator, step: step.id, counted: 0 });
    else this.answer(person, step, demoAnswer(step) ?? { kind: 'done' });
  }

  /** Each person's padlocks are a series of their own: 11, 12 … or 21, 22 … */
  private lockOf(person: string): number {
    return 1 + this.pack.people.findIndex(({ id }) => id === person);
  }

  /** Follows the next step until none is left, `until` names it, or its gate is shut. */
  walk(person: string, until: (step: Step) => boolean = () => false, otherwise?: Otherwise): void {
    for (;;) {
      const state = this.state();
      const step = nextStep(this.pack.checklist, state, person);
      if (!step || until(step)) return;
      if (step.ask.kind === 'close' && !state.clear.includes(person)) {
        for (const { id, part } of this.pack.people)
          if (part === 'electrician') this.write(id, 'clear', { person: id });
        continue;
      }
      if (otherwise?.(step, this)) continue;
      if (!gateFor(this.pack.checklist, state, person, step.id).open) return;
      this.answerWell(person, step);
    }
  }

  private signature(person: string, meaning: string) {
    const name = this.pack.people.find(({ id }) => id === person)?.name ?? '';
    const digest = signatureDigest({ pack: this.pack, state: this.state(), language: this.language });
    return {
      name,
      zone: 'Europe/Madrid',
      meaning,
      digest,
      language: this.language,
      picture: { strokes: [stroke] },
    };
  }

  sign(person: string): void {
    const gate = canSign(this.pack.checklist, this.state(), person);
    if (!gate.open) throw new Error(`cannot be signed: ${gate.refusals.map(({ code }) => code).join(', ')}`);
    const meaning = render(this.language, { key: 'field.sign.meaning' });
    this.write(person, 'signed', { ...this.signature(person, meaning), steps: gate.steps });
  }

  countersign(person: string): void {
    const meaning = render(this.language, { key: 'field.sign.countersignMeaning' });
    this.write(person, 'countersigned', { ...this.signature(person, meaning), heads: this.state().heads });
  }
}
