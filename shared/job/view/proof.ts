/** One person's proof in a view: their locks on every isolator and, after them, their own dead readings. */
import type { Placed } from '../order/placed';
import { unprovedIn } from './provedParts';
import { isAfterAll } from './frontier';
import { ownLock } from './locks';
import { ownNewest } from './ownNewest';
import { isolationOver, reopenersOf } from './rounds';
import type { Answered, Lock, PanelProof, View } from './view';

/** A tester that failed on the known voltage takes every reading of its part before with it. */
function testerFailures(view: View, step: number, person: string): Placed[] {
  const { steps, ownTests } = view.setting.lookup;
  const part = steps[step]?.part;
  if (steps[step]?.stage !== 'prove-dead') return [];
  return ownTests
    .filter((each) => steps[each]?.part === part && steps[each]?.family === 'tester-proved')
    .flatMap((each) => view.failures.get(each) ?? [])
    .filter((failed) => failed.person === person)
    .map(({ placed }) => placed);
}

interface Since {
  person: string;
  /** What a reading must have seen: own locks, the tester it is read with, every round, supervised removals. */
  after: readonly Placed[];
  locks: readonly Lock[];
  /** Digest of the checklist in force; readings answered under another prove nothing. */
  pack: string | undefined;
}

export function sinceOf(view: View, person: string, pack: string | undefined): Since {
  const locks = view.setting.lookup.isolators.flatMap((tag) => ownLock(view, tag, person) ?? []);
  const rounds = view.rounds.map(({ placed }) => placed);
  const testers = view.setting.lookup.instruments
    .flatMap((step) => ownNewest(view, step, person))
    .map(({ placed }) => placed);
  const after = [...locks.map(({ on }) => on), ...testers, ...rounds, ...view.removals];
  return { person, after, locks, pack };
}

/** Did this person answer this step in limits since then, and nothing worse after it? */
export function isMeasured(view: View, step: number, since: Since): boolean {
  const newest = ownNewest(view, step, since.person);
  if (newest.length === 0) return false;
  const earlier = [...since.after, ...reopenersOf(view, step), ...testerFailures(view, step, since.person)];
  return newest.every(
    ({ verdict, placed }) =>
      verdict === 'ok' &&
      (since.pack === undefined || placed.entry.pack === since.pack) &&
      placed.seq > (view.setting.unsureUpTo[placed.log] ?? 0) &&
      isAfterAll(placed, earlier),
  );
}

function lastTest(view: View, person: string): Answered | undefined {
  return view.setting.lookup.ownTests
    .flatMap((step) => ownNewest(view, step, person))
    .sort((a, b) => a.placed.at - b.placed.at)
    .at(-1);
}

function proofIn(view: View, person: string, pack: string | undefined): PanelProof {
  const { steps, isolators, ownTests } = view.setting.lookup;
  const since = sinceOf(view, person, pack);
  const locked = since.locks.map(({ isolator, lock, on }) => ({ isolator, lock, at: on.entry.at }));
  const missingLocks = isolators.filter((tag) => !locked.some(({ isolator }) => isolator === tag));
  const unproved = unprovedIn(view, person);
  const missingTests = ownTests
    .filter((step) => unproved.has(step) || !isMeasured(view, step, since))
    .flatMap((step) => steps[step]?.id ?? []);
  // Without an isolator or a reading there is nothing that could have proved anything.
  const isAsked = isolators.length > 0 && ownTests.length > 0;
  const last = lastTest(view, person);
  return {
    person,
    locked,
    missingLocks,
    missingTests,
    holds: isAsked && missingLocks.length + missingTests.length === 0 && !isolationOver(view),
    ...(last && { lastTestAt: last.placed.entry.at }),
  };
}

/** Worked out once until something changes that a proof hangs on. */
export function proofOf(view: View, person: string, pack: string | undefined): PanelProof {
  const key = `${person} ${pack ?? ''}`;
  const known = view.proofs.get(key);
  if (known?.version === view.proofVersion) return known.proof;
  const proof = proofIn(view, person, pack);
  view.proofs.set(key, { version: view.proofVersion, proof });
  return proof;
}
