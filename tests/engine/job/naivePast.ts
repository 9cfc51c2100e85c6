/** Who had seen what, found slowly and plainly; for jobs without forks. */
import { bodySchemas, type BodyOf, type Entry, type EntryKind } from '../../../shared/job/entry';
import type { JobPerson } from '../../../shared/job/types';

export type Verdict = 'ok' | 'out' | 'refused';

export interface Told {
  people: readonly JobPerson[];
  /** Entries of people on the job, those held only, in the order in which they were written. */
  held: readonly Entry[];
  owner: (entry: Entry) => string;
  /** What the engine made of each answer: it is checked entry by entry, so earlier ones may be relied on. */
  verdicts: ReadonlyMap<string, Verdict>;
}

const readable = new WeakMap<Entry, boolean>();

/** The body of an entry of this kind; undefined for any other. */
export function bodyOf<K extends EntryKind>(entry: Entry, kind: K): BodyOf<K> | undefined {
  if (entry.kind !== kind) return undefined;
  const isRead = readable.get(entry) ?? bodySchemas[kind].safeParse(entry.body).success;
  readable.set(entry, isRead);
  // The schema of its kind has accepted the body.
  return isRead ? (entry.body as unknown as BodyOf<K>) : undefined;
}

export class NaivePast {
  private readonly pasts = new Map<Entry, Set<Entry>>();
  private readonly missing = new Map<string, number>();

  constructor(readonly told: Told) {
    for (const entry of told.held) this.pasts.set(entry, this.walkBack(entry));
    for (const { log } of told.held) if (!this.missing.has(log)) this.missing.set(log, this.newestHole(log));
  }

  private walkBack(entry: Entry): Set<Entry> {
    const past = new Set<Entry>();
    for (const [other, before] of this.pasts) {
      const upTo = other.log === entry.log ? entry.seq - 1 : (entry.seen[other.log] ?? 0);
      if (other.seq > upTo) continue;
      past.add(other);
      for (const each of before) past.add(each);
    }
    return past;
  }

  /** The highest number of a log that somebody names, or that something follows, and that is not here. */
  private newestHole(log: string): number {
    const here = new Set(this.told.held.filter((each) => each.log === log).map(({ seq }) => seq));
    let seq = Math.max(...here, ...this.told.held.map(({ seen }) => seen[log] ?? 0));
    while (seq > 0 && here.has(seq)) seq -= 1;
    return seq;
  }

  of(entry: Entry): ReadonlySet<Entry> {
    return this.pasts.get(entry) ?? new Set();
  }
  saw(later: Entry, earlier: Entry): boolean {
    return this.of(later).has(earlier);
  }
  sawAll(later: Entry, earlier: readonly Entry[]): boolean {
    return earlier.every((each) => this.saw(later, each));
  }
  /** Nothing that could take it back is missing from its log. */
  isSure({ log, seq }: Entry): boolean {
    return seq > (this.missing.get(log) ?? 0);
  }
  by(entry: Entry): string {
    return this.told.owner(entry);
  }
  has(person: string, part: JobPerson['part']): boolean {
    return this.told.people.some((each) => each.id === person && each.part === part);
  }
  isGood({ id }: Entry): boolean {
    return this.told.verdicts.get(id) === 'ok';
  }
  counts(entry: Entry): boolean {
    const verdict = this.told.verdicts.get(entry.id);
    return verdict === 'ok' || verdict === 'out';
  }
}
