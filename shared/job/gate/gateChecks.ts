/** The gates of a job, each one small named question (isolation.md §4, checklist.md). */
import type { Stage } from '../../checklist/types';
import { orderBlocker } from './orderBlocker';
import { refuse, type GateCheck, type GateFacts } from './gateFacts';

const inStages = (...names: Stage[]) => {
  const set: ReadonlySet<Stage> = new Set(names);
  return ({ step }: GateFacts): boolean => set.has(step.stage);
};
const underLocks = inStages('prove-dead', 'wire', 'check-cold', 'close-up');
const whileIsolated = inStages('isolate', 'prove-dead', 'wire', 'check-cold', 'close-up');
const stoppedByHolds = inStages('isolate', 'prove-dead', 'wire', 'check-cold', 'close-up');
const provingLive = inStages('prove-points', 'restore-motion');
const energising = inStages('locks-off', 'close');

const isDeadReading = ({ step: { ask } }: GateFacts): boolean => ask.kind === 'reading' && Boolean(ask.dead);
/** What needs dead conductors, and what ends them. */
const isCritical = ({ step }: GateFacts): boolean => step.needsIsolation || step.ask.kind === 'close';
const titleOf = ({ known }: GateFacts, number: number) => known.lookup.steps[number]?.title ?? { key: '' };

const notOnJob: GateCheck = ({ known, person }) =>
  known.workers.includes(person) ? undefined : refuse('not-on-job');

const notAccepted: GateCheck = ({ known }) => (known.accepted ? undefined : refuse('not-accepted'));

const held: GateCheck = ({ known, number, person }) =>
  known.ownStatus(number, person) === 'held' ? refuse('held') : undefined;

const stopped: GateCheck = (facts) => {
  const [stop] = facts.known.stops;
  return stop !== undefined && stoppedByHolds(facts)
    ? refuse('stopped', { step: titleOf(facts, stop) })
    : undefined;
};

const order: GateCheck = (facts) => {
  const blocker = orderBlocker(facts);
  return blocker === undefined ? undefined : refuse('order', { step: titleOf(facts, blocker) });
};

const isolationOver: GateCheck = (facts) =>
  facts.known.isolationOver && whileIsolated(facts) ? refuse('isolation-over') : undefined;

const contradiction: GateCheck = (facts) => {
  const [first] = facts.known.contradictions;
  return first && isCritical(facts) ? refuse('contradiction', { what: first.says }) : undefined;
};

const unreadable: GateCheck = (facts) =>
  facts.known.unreadable > 0 && isCritical(facts) ? refuse('unreadable') : undefined;

/** A bad reading shuts everything but the reading that ends it. */
const danger: GateCheck = (facts) => {
  const [first] = facts.known.dangers;
  return first !== undefined && facts.step.needsIsolation && !isDeadReading(facts)
    ? refuse('danger', { step: titleOf(facts, first) })
    : undefined;
};

const ownLocks: GateCheck = (facts) => {
  if (!underLocks(facts)) return undefined;
  const { missingLocks } = facts.known.proofOf(facts.person);
  return missingLocks.length > 0 ? refuse('own-locks', { isolators: missingLocks.join(', ') }) : undefined;
};

const ownTests: GateCheck = (facts) => {
  if (!facts.step.needsIsolation) return undefined;
  const { missingTests, missingLocks, holds } = facts.known.proofOf(facts.person);
  const isOther = missingLocks.length > 0 || facts.known.isolationOver;
  return holds || isOther ? undefined : refuse('own-tests', { n: missingTests.length });
};

const ownTerminal: GateCheck = ({ known, step, person }) => {
  const point = step.where?.point;
  if (!step.needsIsolation || step.personal || point === undefined) return undefined;
  const unread = known.lookup.terminals.get(point)?.some((number) => !known.isRead(number, person));
  return unread ? refuse('own-terminal', { point }) : undefined;
};

/** A point somebody could not wire is not proved before the foreman has decided. */
const pointHeld: GateCheck = (facts) => {
  const { known, step } = facts;
  const point = step.where?.point;
  if (point === undefined || !provingLive(facts)) return undefined;
  const isHeld = known.lookup.ofPoint
    .get(point)
    ?.some((number) => known.lookup.steps[number]?.needsIsolation && known.ownStatus(number, '') === 'held');
  return isHeld ? refuse('point-held', { point }) : undefined;
};

const temporaries: GateCheck = (facts) => {
  const { temporariesLeft: n } = facts.known;
  const asks = energising(facts) || facts.step.id === 'closeup.temporary';
  return n > 0 && asks ? refuse('temporaries', { n }) : undefined;
};

const noOwnLock: GateCheck = ({ known, step: { ask }, person }) => {
  if (ask.kind !== 'lock-off') return undefined;
  const { isolator } = ask;
  const isMine = known.locksOn.some((lock) => lock.person === person && lock.isolator === isolator);
  return isMine ? undefined : refuse('no-own-lock', { isolator });
};

const locked: GateCheck = ({ known, step: { ask } }) => {
  if (ask.kind !== 'close') return undefined;
  const lock = known.locksOn.find(({ isolator }) => isolator === ask.isolator);
  return lock
    ? refuse('locked', { isolator: ask.isolator, lock: lock.lock, name: known.nameOf(lock.person) })
    : undefined;
};

const notClear: GateCheck = ({ known, step: { ask } }) => {
  if (ask.kind !== 'close') return undefined;
  const missing = known.workers.filter((person) => !known.isClear(person));
  return missing.length > 0
    ? refuse('not-clear', { names: missing.map((person) => known.nameOf(person)).join(', ') })
    : undefined;
};

/** In the order in which a person would hear them. */
export const gateChecks: readonly { name: string; check: GateCheck }[] = [
  { name: 'not-on-job', check: notOnJob },
  { name: 'not-accepted', check: notAccepted },
  { name: 'held', check: held },
  { name: 'stopped', check: stopped },
  { name: 'contradiction', check: contradiction },
  { name: 'unreadable', check: unreadable },
  { name: 'isolation-over', check: isolationOver },
  { name: 'danger', check: danger },
  { name: 'order', check: order },
  { name: 'own-locks', check: ownLocks },
  { name: 'own-tests', check: ownTests },
  { name: 'own-terminal', check: ownTerminal },
  { name: 'point-held', check: pointHeld },
  { name: 'temporaries', check: temporaries },
  { name: 'no-own-lock', check: noOwnLock },
  { name: 'locked', check: locked },
  { name: 'not-clear', check: notClear },
];

/** Everything that stands against this person answering this step now. */
export const gateRefusals = (facts: GateFacts) => gateChecks.flatMap(({ check }) => check(facts) ?? []);
