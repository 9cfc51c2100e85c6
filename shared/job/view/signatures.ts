/** Signatures in a view: what each covers, whether it still stands, and what is not signed yet. */
import { stageNumber } from '../known/lookup';
import { isSettled } from '../known/passing';
import { before, type Placed, type PlacedOf } from '../order/placed';
import { reopenersOf } from './rounds';
import { ownStanding } from './stepStatus';
import type { View } from './view';
import { answerersOf, wholeStatus } from './wholeStatus';

/** Everything that says what stands on this step for this person. */
function touching(view: View, step: number, person: string): Placed[] {
  const asked = view.setting.lookup.steps[step];
  const isMine = (each: { person: string }) => asked?.by === 'one' || each.person === person;
  const point = asked?.where?.point;
  const holds = (view.holds.get(step) ?? []).filter(({ placed }) => isMine(placed));
  return [
    ...(view.answers[step] ?? []).filter(isMine).map(({ placed }) => placed),
    ...holds.flatMap(({ placed, decisions }) => [placed, ...decisions]),
    ...(view.chosen.get(step) ?? []),
    ...reopenersOf(view, step),
    ...(point === undefined ? [] : (view.pointsOut.get(point) ?? [])),
  ];
}

/** The first of its steps that something it had not seen has changed; undefined while it stands. */
export function changedStep(view: View, signature: PlacedOf<'signed'>): number | undefined {
  const { numberOf } = view.setting.lookup;
  return signature.known.body.steps
    .flatMap((id) => numberOf.get(id) ?? [])
    .find((step) => touching(view, step, signature.person).some((each) => !before(each, signature)));
}

/** People whose answers stand on a step. */
export function signersOf(view: View, step: number): string[] {
  if (view.setting.lookup.steps[step]?.by === 'each')
    return answerersOf(view, step).filter((person) => ownStanding(view, step, person).answer);
  const { answer } = ownStanding(view, step, '');
  return answer ? [answer.person] : [];
}

/** By person, the steps that their standing signatures cover. */
function covered(view: View): Map<string, Set<string>> {
  const steps = new Map<string, Set<string>>();
  for (const { placed, refusals } of view.signed) {
    if (refusals.length > 0 || changedStep(view, placed) !== undefined) continue;
    const known = steps.get(placed.person) ?? new Set<string>();
    for (const step of placed.known.body.steps) known.add(step);
    steps.set(placed.person, known);
  }
  return steps;
}

export function unsigned(view: View, person: string): string[] {
  const signed = covered(view).get(person);
  return view.setting.lookup.steps
    .filter(({ id }, step) => !signed?.has(id) && signersOf(view, step).includes(person))
    .map(({ id }) => id);
}

export function allSigned(view: View): boolean {
  const signed = covered(view);
  return view.setting.lookup.steps.every(({ id }, step) =>
    signersOf(view, step).every((person) => signed.get(person)?.has(id)),
  );
}

export function firstUnsettled(view: View): number | undefined {
  const { steps, stageOf } = view.setting.lookup;
  const found = steps.findIndex(
    (_step, number) => (stageOf[number] ?? 0) < stageNumber.sign && !isSettled(wholeStatus(view, number)),
  );
  return found < 0 ? undefined : found;
}

// What changes nothing that was reviewed.
const harmless: ReadonlySet<string> = new Set(['note', 'photo', 'accepted', 'countersigned']);

/** Did a countersignature cover everything there is? Made on a stale copy it covers an earlier state. */
export function coversAll(placed: readonly Placed[], countersign: PlacedOf<'countersigned'>): boolean {
  const { heads } = countersign.known.body;
  return placed.every((each) => {
    if (each === countersign) return true;
    if (before(each, countersign)) return (heads[each.entry.log] ?? 0) >= each.seq;
    return before(countersign, each) && harmless.has(each.entry.kind);
  });
}
