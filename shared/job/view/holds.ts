/** What a hold makes of a step: it waits for the foreman, and what stops the job cannot be decided away. */
import type { Step } from '../../checklist/types';
import { isIsolating, isProving } from '../known/proving';
import { before, type Placed, type PlacedOf } from '../order/placed';
import type { BodyOf } from '../entry';
import type { StepStatus } from '../types';
import { isAfterAll } from './frontier';
import { reopenersOf } from './rounds';
import type { Held, View } from './view';

type Decided = BodyOf<'hold-decided'>['decision'];

// Of two foremen who decided at once, the one who asks for more work counts.
const strictest: readonly Decided[] = ['rework', 'out-of-scope', 'accept'];

/** The right panel, a fit tester and an isolator closed by hand: no words of a foreman stand for these. */
const isNeverAccepted = ({ ask: { kind } }: Step): boolean =>
  kind === 'scan' || kind === 'instrument' || kind === 'close';

/** What isolates or proves is never accepted away; a point that will not read dead can leave the job. */
function decisionsFor(step: Step | undefined): readonly Decided[] {
  if (!step || isIsolating(step) || isNeverAccepted(step)) return ['rework'];
  return isProving(step) ? ['rework', 'out-of-scope'] : strictest;
}

/** The decision that counts; undefined while the hold waits. */
export function decisionOf(view: View, held: Held): PlacedOf<'hold-decided'> | undefined {
  const step = view.setting.lookup.steps[held.step];
  const allowed = decisionsFor(step);
  const newest = held.decisions.filter((each) => !held.decisions.some((other) => before(each, other)));
  return newest
    .filter(({ known }) => allowed.includes(known.body.decision))
    .sort((a, b) => strictest.indexOf(a.known.body.decision) - strictest.indexOf(b.known.body.decision))[0];
}

const isWaiting = (view: View, held: Held): boolean => decisionOf(view, held) === undefined;

/** Is this step taken out, itself or with its point, after whatever re-opened it and after its answer? */
function isOut(view: View, step: number, counts: (decision: Placed) => boolean): boolean {
  const point = view.setting.lookup.steps[step]?.where?.point;
  return point !== undefined && (view.pointsOut.get(point) ?? []).some(counts);
}

/**
 * Undefined when no hold changes what the answers say.
 * @param answer the newest answer that counts: one given after the decision stands by itself.
 */
export function heldStatus(
  view: View,
  step: number,
  person: string,
  answer: Placed | undefined,
  answered: StepStatus,
): StepStatus | undefined {
  const holds = view.holds.get(step);
  const asked = view.setting.lookup.steps[step];
  if (!holds && view.pointsOut.size === 0) return undefined;
  const mine = (holds ?? []).filter(({ placed }) => asked?.by === 'one' || placed.person === person);
  if (mine.some((held) => isWaiting(view, held))) return 'held';
  const reopeners = reopenersOf(view, step);
  const counts = (decision: Placed) =>
    isAfterAll(decision, reopeners) && !(answer && before(decision, answer));
  const decided = mine.flatMap((held) => decisionOf(view, held) ?? []).filter(counts);
  if (decided.some(({ known }) => known.body.decision === 'out-of-scope')) return 'out-of-scope';
  if (decided.some(({ known }) => known.body.decision === 'accept')) return 'accepted';
  return answered !== 'done' && isOut(view, step, counts) ? 'out-of-scope' : undefined;
}

/** Held steps of Isolate and Prove dead, undecided. */
export const stopsOf = (view: View): number[] =>
  [...view.holds]
    .filter(([step, holds]) => {
      const stage = view.setting.lookup.steps[step]?.stage;
      return (stage === 'isolate' || stage === 'prove-dead') && holds.some((held) => isWaiting(view, held));
    })
    .map(([step]) => step);
