/** The rules of proof written a second time, slowly and plainly, to judge the engine by. */
import type { Checklist } from '../../../shared/checklist/types';
import { bodySchemas, type BodyOf, type Entry, type EntryKind } from '../../../shared/job/entry';

const bodyOf = <K extends EntryKind>(entry: Entry, kind: K): BodyOf<K> | undefined => {
  if (entry.kind !== kind) return undefined;
  const parsed = bodySchemas[kind].safeParse(entry.body);
  return parsed.success ? parsed.data : undefined;
};

const pasts = new WeakMap<readonly Entry[], Map<Entry, Set<Entry>>>();

/** Everything an entry had seen, found by walking back step by step. No forks here. */
export function naivePast(all: readonly Entry[], from: Entry): Set<Entry> {
  const known = pasts.get(all) ?? new Map<Entry, Set<Entry>>();
  pasts.set(all, known);
  const past = known.get(from) ?? walkBack(all, from);
  known.set(from, past);
  return past;
}

function walkBack(all: readonly Entry[], from: Entry): Set<Entry> {
  const past = new Set<Entry>();
  const open = [from];
  for (let next = open.pop(); next; next = open.pop())
    for (const each of all) {
      const limit = each.log === next.log ? next.seq - 1 : (next.seen[each.log] ?? 0);
      if (each.seq > limit || past.has(each)) continue;
      past.add(each);
      open.push(each);
    }
  past.delete(from);
  return past;
}

interface Oracle {
  checklist: Checklist;
  entries: readonly Entry[];
  personOf: (entry: Entry) => string | undefined;
}

/** This person's locks on an isolator that were on, by what `at` had seen. */
function locksOn({ entries, personOf }: Oracle, past: ReadonlySet<Entry>, person: string, isolator: string) {
  return [...past].filter((entry) => {
    const lock = bodyOf(entry, 'lock-on');
    if (lock?.isolator !== isolator || personOf(entry) !== person) return false;
    return ![...past].some((other) => {
      const off = bodyOf(other, 'lock-off') ?? bodyOf(other, 'lock-removed-by-supervisor');
      return (
        off?.isolator === isolator &&
        off.lock === lock.lock &&
        (other.kind === 'lock-off' ? personOf(other) === person : true) &&
        naivePast(entries, other).has(entry)
      );
    });
  });
}

const isGoodReading = (checklist: Checklist, entry: Entry): string | undefined => {
  const body = bodyOf(entry, 'answer');
  const ask = checklist.steps.find(({ id }) => id === body?.step)?.ask;
  if (ask?.kind !== 'reading' || !ask.dead || body?.value.kind !== 'reading') return undefined;
  return Math.abs(body.value.value) <= (ask.high ?? 0) ? body.step : undefined;
};

/** Why this answer must not count; empty when nothing stands against it. */
export function reasonsAgainst(oracle: Oracle, answer: Entry): string[] {
  const { checklist, entries, personOf } = oracle;
  const person = personOf(answer) ?? '';
  const past = naivePast(entries, answer);
  const reasons: string[] = [];
  const mine = checklist.isolators.flatMap((isolator) => {
    const on = locksOn(oracle, past, person, isolator);
    if (on.length === 0) reasons.push(`no own lock on ${isolator}`);
    return on;
  });
  const tests = checklist.steps.filter(
    ({ stage, by, ask }) => stage === 'prove-dead' && by === 'each' && ask.kind === 'reading' && ask.dead,
  );
  const rounds = [...past].filter(({ kind }) => kind === 'round-started');
  for (const { id } of tests) {
    const good = [...past].filter((entry) => {
      if (personOf(entry) !== person || isGoodReading(checklist, entry) !== id) return false;
      const seen = naivePast(entries, entry);
      const afterLocks = checklist.isolators.every((isolator) =>
        mine.some((lock) => bodyOf(lock, 'lock-on')?.isolator === isolator && seen.has(lock)),
      );
      return afterLocks && rounds.every((round) => seen.has(round));
    });
    if (good.length === 0) reasons.push(`no own reading of ${id}`);
  }
  const closed = [...past].some(
    (entry) =>
      bodyOf(entry, 'closed')?.counted === 0 &&
      !rounds.some((round) => naivePast(entries, round).has(entry)) &&
      ![...past].some((other) => other.kind === 'returned' && naivePast(entries, other).has(entry)),
  );
  if (closed) reasons.push('something was closed in this round');
  return reasons;
}
