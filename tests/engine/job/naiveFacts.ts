/** What a set of entries comes to, read from the pages without regard to how the engine does it. */
import type { Checklist, Step } from '../../../shared/checklist/types';
import { entryKinds, type Entry } from '../../../shared/job/entry';
import { bodyOf, type NaivePast } from './naivePast';

/** What somebody knows: the entries they have seen. */
export type Seen = readonly Entry[];

export class NaiveFacts {
  private readonly found = new Map<string, Entry[]>();

  constructor(
    readonly checklist: Checklist,
    readonly past: NaivePast,
    readonly seen: Seen,
  ) {}

  private once(name: string, find: () => Entry[]): Entry[] {
    const known = this.found.get(name) ?? find();
    this.found.set(name, known);
    return known;
  }

  private ofKind(kind: string): Entry[] {
    return this.once(kind, () => this.seen.filter((each) => each.kind === kind));
  }
  private byForeman(entry: Entry): boolean {
    return this.past.has(this.past.by(entry), 'foreman');
  }

  rounds(): Entry[] {
    return this.ofKind('round-started');
  }

  /** What may have begun a round of its own: a return, or rework of a hold. */
  roundsAtMost(): Entry[] {
    const asked = [...this.ofKind('returned'), ...this.ofKind('hold-decided')];
    return [...this.rounds(), ...asked.filter((each) => this.byForeman(each))];
  }

  /** A foreman's, of another's lock, seen by a third person. */
  removals(): Entry[] {
    return this.ofKind('lock-removed-by-supervisor').filter((each) => {
      const body = bodyOf(each, 'lock-removed-by-supervisor');
      return (
        body && this.byForeman(each) && new Set([this.past.by(each), body.owner, body.witness]).size === 3
      );
    });
  }

  private takesOff(off: Entry, on: Entry): boolean {
    const lock = bodyOf(on, 'lock-on');
    const body = bodyOf(off, 'lock-off') ?? bodyOf(off, 'lock-removed-by-supervisor');
    if (!body || body.lock !== lock?.lock || body.isolator !== lock.isolator) return false;
    const owner = 'owner' in body ? body.owner : this.past.by(off);
    return owner === this.past.by(on) && this.past.saw(off, on);
  }

  /** Every padlock that was heard on and not heard off. */
  locksOn(): Entry[] {
    const offs = [...this.ofKind('lock-off'), ...this.removals()];
    return this.once('on now', () =>
      this.ofKind('lock-on').filter((on) => !offs.some((off) => this.takesOff(off, on))),
    );
  }

  ownLocks(person: string, isolator: string): Entry[] {
    return this.locksOn().filter(
      (on) =>
        this.past.by(on) === person &&
        bodyOf(on, 'lock-on')?.isolator === isolator &&
        this.past.isGood(on) &&
        this.past.isSure(on),
    );
  }

  answersTo({ id }: Step): Entry[] {
    return this.once(`answers to ${id}`, () =>
      this.ofKind('answer').filter((each) => bodyOf(each, 'answer')?.step === id),
    );
  }

  /** The foreman sent this very step back. */
  sentBack({ id }: Step): Entry[] {
    return this.roundsAtMost().filter((each) => {
      if (bodyOf(each, 'returned')?.steps.some(({ step }) => step === id)) return true;
      const decided = bodyOf(each, 'hold-decided');
      if (decided?.decision !== 'rework') return false;
      const held = this.seen.find((hold) => hold.id === decided.hold);
      return held && bodyOf(held, 'hold')?.step === id && this.past.saw(each, held);
    });
  }

  /** A foreman had a say in it. */
  isDecided({ id }: Step): boolean {
    return this.seen.some((each) => bodyOf(each, 'hold')?.step === id || bodyOf(each, 'chosen')?.step === id);
  }

  closings(): Entry[] {
    return this.seen.filter((each) => bodyOf(each, 'closed')?.counted === 0);
  }

  /** Something was closed, or Locks off has begun, and no round has heard of it. */
  isOver(): boolean {
    const offs = this.ofKind('lock-off').filter((each) => this.past.isGood(each));
    return [...this.closings(), ...offs].some(
      (end) => !this.roundsAtMost().some((round) => this.past.saw(round, end)),
    );
  }

  /** A closing that came after a padlock, or without hearing of it, while nobody has taken that padlock off. */
  closedUnder(): { on: Entry; closing: Entry }[] {
    return this.locksOn().flatMap((on) =>
      this.closings()
        .filter((closing) => bodyOf(closing, 'closed')?.isolator === bodyOf(on, 'lock-on')?.isolator)
        .filter((closing) => !this.past.saw(on, closing))
        .map((closing) => ({ on, closing })),
    );
  }

  private isOneLockTwice(): boolean {
    const places = new Map<string, string>();
    return this.locksOn().some((on) => {
      const lock = bodyOf(on, 'lock-on');
      const place = `${lock?.isolator ?? ''} ${this.past.by(on)}`;
      const other = places.get(lock?.lock ?? '');
      places.set(lock?.lock ?? '', place);
      return other !== undefined && other !== place;
    });
  }

  disagree(): boolean {
    return this.closedUnder().length > 0 || this.isOneLockTwice();
  }

  unreadable(): boolean {
    return this.seen.some(({ kind }) => !entryKinds.some((known) => known === kind));
  }

  /** A dead reading over its limit that no good one has seen and ended. */
  isLive(): boolean {
    return this.checklist.steps.some((step) => {
      if (step.ask.kind !== 'reading' || !step.ask.dead) return false;
      const limit = step.ask.high ?? 0;
      const answers = this.answersTo(step);
      return answers.some((bad) => {
        const value = bodyOf(bad, 'answer')?.value;
        if (value?.kind !== 'reading' || Math.abs(value.value) <= limit) return false;
        return !answers.some((good) => this.past.isGood(good) && this.past.saw(good, bad));
      });
    });
  }

  /** A hold on isolating or proving dead waits until the foreman has it done again. */
  isStopped(): boolean {
    const stops = new Set(
      this.checklist.steps
        .filter(({ stage }) => stage === 'isolate' || stage === 'prove-dead')
        .map(({ id }) => id),
    );
    return this.ofKind('hold').some((hold) => {
      if (!stops.has(bodyOf(hold, 'hold')?.step ?? '')) return false;
      return !this.ofKind('hold-decided').some(
        (each) =>
          this.byForeman(each) &&
          bodyOf(each, 'hold-decided')?.hold === hold.id &&
          bodyOf(each, 'hold-decided')?.decision === 'rework',
      );
    });
  }

  hasTemporaries(): boolean {
    const all = this.ofKind('temporary');
    return all.some((made) => {
      if (bodyOf(made, 'temporary')?.removes !== undefined) return false;
      return !all.some((put) => bodyOf(put, 'temporary')?.removes === made.id && this.past.saw(put, made));
    });
  }

  /** Said so themselves, or a foreman for one who never locked on: in this round, after all their work. */
  isClear(person: string): boolean {
    const inPanel = new Set(
      this.checklist.steps
        .filter(({ stage }) => ['isolate', 'prove-dead', 'wire', 'check-cold', 'close-up'].includes(stage))
        .map(({ id }) => id),
    );
    const work = this.seen.filter((each) => {
      if (this.past.by(each) !== person) return false;
      if (each.kind === 'lock-on' || each.kind === 'temporary') return true;
      return inPanel.has(bodyOf(each, 'answer')?.step ?? '') && this.past.counts(each);
    });
    return this.ofKind('clear').some((clear) => {
      const own = this.past.by(clear) === person;
      const locked = this.ofKind('lock-on').some(
        (on) => this.past.by(on) === person && this.past.saw(clear, on),
      );
      if (bodyOf(clear, 'clear')?.person !== person) return false;
      if (!own && (locked || !this.byForeman(clear))) return false;
      return this.past.sawAll(clear, [...this.rounds(), ...work]);
    });
  }
}
