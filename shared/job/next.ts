/** The next step that waits for a person. */
import type { Checklist, Step } from '../checklist/types';
import { gateRefusals } from './gate/gateChecks';
import type { GateFacts } from './gate/gateFacts';
import type { Known } from './known/known';
import { knownOf } from './known/knownOf';
import { isProving } from './known/proving';
import type { JobState } from './types';

/** A step waits for this person; one with two answers waits for the foreman, unless it must be measured again. */
function isWaiting(known: Known, number: number, person: string): boolean {
  const step = known.lookup.steps[number];
  const status = known.ownStatus(number, person);
  if (step?.ask.kind === 'lock-off' && !hasLock(known, step.ask.isolator, person)) return false;
  return (
    status === 'open' ||
    status === 'out' ||
    (status === 'two-answers' && step !== undefined && isProving(step))
  );
}

const hasLock = ({ locksOn }: Known, isolator: string, person: string): boolean =>
  locksOn.some((lock) => lock.isolator === isolator && lock.person === person);

/** What this person must do again before the shut step, because their own proof has ended. */
function againBefore({ known, person, step }: GateFacts, codes: ReadonlySet<string>): number | undefined {
  const { numberOf, lockOn, terminals } = known.lookup;
  const { missingLocks, missingTests } = known.proofOf(person);
  if (codes.has('own-locks')) return lockOn.get(missingLocks[0] ?? '');
  if (codes.has('danger')) return known.dangers[0];
  if (codes.has('own-tests')) return numberOf.get(missingTests[0] ?? '');
  if (codes.has('own-terminal'))
    return terminals.get(step.where?.point ?? '')?.find((number) => !known.isRead(number, person));
  return undefined;
}

interface Found {
  step: Step;
  open: boolean;
}

function look(known: Known, number: number, person: string): Found | undefined {
  const step = known.lookup.steps[number];
  if (!step) return undefined;
  const facts = { known, person, step, number };
  const refusals = gateRefusals(facts);
  if (refusals.length === 0) return { step, open: true };
  const again = againBefore(facts, new Set(refusals.map(({ code }) => code)));
  const first = again === undefined ? undefined : known.lookup.steps[again];
  if (again === undefined || !first || again === number) return { step, open: false };
  const isOpen = gateRefusals({ known, person, step: first, number: again }).length === 0;
  return { step: first, open: isOpen };
}

/**
 * The first step in the order of the checklist that this person may answer now; while none may be answered,
 * the first that waits, so that its screen can say what it waits for. Undefined when nothing waits for them.
 */
export function nextStep(checklist: Checklist, state: JobState, person: string): Step | undefined {
  if (state.status === 'cancelled' || state.status === 'countersigned') return undefined;
  const known = knownOf(checklist, state);
  if (!known.workers.includes(person)) return undefined;
  let first: Step | undefined;
  for (let number = 0; number < known.lookup.steps.length; number += 1) {
    if (!isWaiting(known, number, person)) continue;
    const found = look(known, number, person);
    if (found?.open) return found.step;
    first ??= found?.step;
  }
  return first;
}
