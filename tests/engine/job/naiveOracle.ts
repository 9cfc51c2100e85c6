/** The rules of isolation.md and checklist.md written a second time, to judge the engine by. */
import type { Checklist, Stage, Step } from '../../../shared/checklist/types';
import type { Entry } from '../../../shared/job/entry';
import { NaiveFacts, type Seen } from './naiveFacts';
import { bodyOf, type NaivePast } from './naivePast';

const among = (...stages: Stage[]) => {
  const set = new Set(stages);
  return ({ stage }: Step): boolean => set.has(stage);
};
const underLocks = among('prove-dead', 'wire', 'check-cold', 'close-up');
const isolated = among('isolate', 'prove-dead', 'wire', 'check-cold', 'close-up');
const first = among('get-ready', 'isolate', 'prove-dead');
const later = among('wire', 'check-cold', 'close-up', 'locks-off', 'close', 'prove-points');
const alone = among('wire', 'check-cold');
const isTest = ({ stage, by }: Step): boolean => stage === 'prove-dead' && by === 'each';

/** A person at a step, with what they know. */
export class NaiveOracle {
  private readonly facts: NaiveFacts;
  private lacks: string[] | undefined;

  constructor(
    private readonly checklist: Checklist,
    private readonly past: NaivePast,
    seen: Seen,
    private readonly person: string,
    /** Digest of the checklist in force; undefined where nobody has said. */
    private readonly pack?: string,
  ) {
    this.facts = new NaiveFacts(checklist, past, seen);
  }

  /** After one's own locks on every isolator, every round and removal, and nothing worse since. */
  private isRead(step: Step): boolean {
    const { facts, past, person, checklist } = this;
    const own = facts.answersTo(step).filter((each) => past.by(each) === person);
    const after = [...facts.rounds(), ...facts.removals(), ...facts.sentBack(step)];
    return own.some((good) => {
      const worse = [
        ...own.filter((each) => past.counts(each) && !past.isGood(each)),
        ...this.failures(step),
      ];
      return (
        past.isGood(good) &&
        past.isSure(good) &&
        (this.pack === undefined || good.pack === this.pack) &&
        past.sawAll(good, after) &&
        worse.every((bad) => past.saw(good, bad)) &&
        checklist.isolators.every((tag) => facts.ownLocks(person, tag).some((on) => past.saw(good, on)))
      );
    });
  }

  /** The tester did not show the known voltage. */
  private failures({ stage, part }: Step): Entry[] {
    if (stage !== 'prove-dead') return [];
    return this.checklist.steps
      .filter((step) => isTest(step) && step.family === 'tester-proved' && step.part === part)
      .flatMap((step) => this.facts.answersTo(step))
      .filter((each) => this.past.by(each) === this.person)
      .filter((each) => this.past.counts(each) && !this.past.isGood(each));
  }

  /** Why this person has no proof. */
  proof(): string[] {
    this.lacks ??= [
      ...this.locks(),
      ...this.checklist.steps
        .filter((step) => isTest(step) && !this.isRead(step))
        .map(({ id }) => `no own reading of ${id}`),
      ...(this.facts.isOver() ? ['isolation is over'] : []),
    ];
    return this.lacks;
  }

  private locks(): string[] {
    return this.checklist.isolators
      .filter((tag) => this.facts.ownLocks(this.person, tag).length === 0)
      .map((tag) => `no own lock on ${tag}`);
  }

  private terminals(step: Step): string[] {
    if (!step.needsIsolation || step.personal) return [];
    return this.checklist.steps
      .filter((each) => each.personal && each.where?.point === step.where?.point && !this.isRead(each))
      .map(({ id }) => `has not read ${id}`);
  }

  /** Answered in this round, and of answers that did not know each other none is bad. */
  private isDone(step: Step): boolean {
    const { facts, past } = this;
    if (step.stage === 'get-ready' && facts.isDecided(step)) return true;
    const after = [...(step.everyRound ? facts.rounds() : []), ...facts.sentBack(step)];
    const all = facts.answersTo(step).filter((each) => past.counts(each) && past.sawAll(each, after));
    const mine = step.by === 'each' ? all.filter((each) => past.by(each) === this.person) : all;
    const newest = mine.filter((each) => !mine.some((other) => past.saw(other, each)));
    return newest.length > 0 && newest.every((each) => past.isGood(each));
  }

  private order(step: Step): string[] {
    if (!later(step)) return [];
    return this.checklist.steps
      .filter((each) => first(each) && (each.by === 'one' || alone(step)))
      .filter(({ ask }) => ask.kind !== 'lock-on')
      .filter((each) => !this.isDone(each))
      .map(({ id }) => `${id} is not done`);
  }

  private closing({ ask }: Step): string[] {
    if (ask.kind !== 'close') return [];
    const hung = this.facts.locksOn().filter((on) => bodyOf(on, 'lock-on')?.isolator === ask.isolator);
    const people = this.past.told.people.filter(({ part }) => part === 'electrician');
    return [
      ...hung.map(() => `a lock is on ${ask.isolator}`),
      ...people.filter(({ id }) => !this.facts.isClear(id)).map(({ name }) => `${name} is not clear`),
    ];
  }

  private dangers(step: Step): string[] {
    const critical = step.needsIsolation || step.ask.kind === 'close';
    const isReading = step.ask.kind === 'reading' && step.ask.dead !== undefined;
    return [
      ...(critical && this.facts.disagree() ? ['entries disagree'] : []),
      ...(critical && this.facts.unreadable() ? ['an entry cannot be read'] : []),
      ...(step.needsIsolation && !isReading && this.facts.isLive() ? ['a reading was live'] : []),
      ...(isolated(step) && this.facts.isStopped() ? ['a hold stops the job'] : []),
      ...(isolated(step) && this.facts.isOver() ? ['isolation is over'] : []),
    ];
  }

  private leftovers({ id, stage, ask }: Step): string[] {
    const asks = stage === 'locks-off' || stage === 'close' || id === 'closeup.temporary';
    const isMine =
      ask.kind !== 'lock-off' ||
      this.facts
        .locksOn()
        .some((on) => this.past.by(on) === this.person && bodyOf(on, 'lock-on')?.isolator === ask.isolator);
    return [
      ...(asks && this.facts.hasTemporaries() ? ['a jumper is left'] : []),
      ...(isMine ? [] : ['no lock of theirs']),
    ];
  }

  private given(): string[] {
    return [
      ...(this.past.has(this.person, 'electrician') ? [] : ['does not work here']),
      ...(this.facts.seen.some(
        (each) => each.kind === 'accepted' && this.past.has(this.past.by(each), 'electrician'),
      )
        ? []
        : ['nobody has accepted the job']),
    ];
  }

  /** Everything that stands against this person answering this step; empty when nothing does. */
  against(step: Step): string[] {
    return [
      ...this.given(),
      ...this.dangers(step),
      ...(underLocks(step) ? this.locks() : []),
      ...(step.needsIsolation ? this.proof() : []),
      ...this.terminals(step),
      ...this.order(step),
      ...this.closing(step),
      ...this.leftovers(step),
    ];
  }

  /** What the answer itself has against it: a padlock that hangs elsewhere, a reading nobody took. */
  againstValue(entry: Entry): string[] {
    const lock = bodyOf(entry, 'lock-on')?.lock;
    const isTwice = this.facts.locksOn().some((on) => bodyOf(on, 'lock-on')?.lock === lock);
    const body = bodyOf(entry, 'answer');
    const watched = this.facts.seen.find(({ id }) => id === body?.watched);
    const taken = watched && bodyOf(watched, 'answer');
    const isTaken =
      watched !== undefined &&
      taken?.step === body?.step &&
      this.past.by(watched) !== this.person &&
      this.past.counts(watched) &&
      this.past.sawAll(watched, this.facts.rounds()) &&
      JSON.stringify(taken?.value) === JSON.stringify(body?.value);
    return [
      ...(lock !== undefined && isTwice ? [`lock ${lock} hangs elsewhere`] : []),
      ...(body?.watched !== undefined && !isTaken ? ['nobody took that reading'] : []),
    ];
  }
}
