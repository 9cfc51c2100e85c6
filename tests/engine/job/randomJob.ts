/** Jobs that go on in random ways: several people, several phones, hearing each other or not, doing right or wrong. */
import type { Step } from '../../../shared/checklist/types';
import type { BodyOf } from '../../../shared/job/entry';
import { foldJob } from '../../../shared/job/fold';
import { gateFor } from '../../../shared/job/gates';
import { nextStep } from '../../../shared/job/next';
import type { JobPerson, JobState } from '../../../shared/job/types';
import {
  answerBody,
  countersign,
  goodValue,
  ilya,
  lockNumber,
  mara,
  sign,
  tomas,
  type Device,
  type Job,
} from '../../support/jobScenario';

export interface Move {
  who: number;
  phone: number;
  /** 0: hears nothing; 1: one log and all that it had heard; else everything. */
  hear: number;
  act: number;
  pick: number;
}

interface Turn {
  job: Job;
  person: JobPerson;
  device: Device;
  pick: number;
  state: JobState;
}

const at = <T>(list: readonly T[], pick: number): T | undefined => list[pick % Math.max(1, list.length)];

/** What stands on one's own padlock there. */
function ownNumber({ state, person }: Turn, isolator: string): string {
  const own = state.locks.find(
    (lock) => lock.person === person.id && lock.isolator === isolator && lock.offAt === undefined,
  );
  return own?.lock ?? lockNumber(person, isolator);
}

function write(turn: Turn, step: Step): void {
  const { job, device, person } = turn;
  const { ask } = step;
  if (ask.kind === 'lock-on' || ask.kind === 'lock-off')
    job.writeDeaf(device, ask.kind, {
      isolator: ask.isolator,
      lock: ask.kind === 'lock-off' ? ownNumber(turn, ask.isolator) : lockNumber(person, ask.isolator),
      step: step.id,
    });
  else if (ask.kind === 'close')
    job.writeDeaf(device, 'closed', { isolator: ask.isolator, step: step.id, counted: 0 });
  else job.writeDeaf(device, 'answer', answerBody(step, goodValue(ask) ?? { kind: 'done' }));
}

const anyStep = ({ job: { checklist }, pick }: Turn): Step | undefined => at(checklist.steps, pick);
const isolatorOf = ({ job: { checklist }, pick }: Turn): string => at(checklist.isolators, pick) ?? '';

function goOn(turn: Turn): void {
  const { job, state, person } = turn;
  const step = nextStep(job.checklist, state, person.id);
  if (step && gateFor(job.checklist, state, person.id, step.id).open) write(turn, step);
}

function readLive(turn: Turn): void {
  const dead = turn.job.checklist.steps.filter(({ ask }) => ask.kind === 'reading' && ask.dead);
  const step = at(dead, turn.pick);
  if (step) turn.job.writeDeaf(turn.device, 'answer', answerBody(step, { kind: 'reading', value: 118 }));
}

/** All that this person answers alone in Prove dead, at one go, and a terminal after it. */
function proveAgain(turn: Turn): void {
  for (const step of turn.job.checklist.steps)
    if ((step.stage === 'prove-dead' && step.by === 'each') || step.personal) write(turn, step);
}

/** The lock comes off and goes on again: what was read before is worth nothing. */
function relock(turn: Turn): void {
  const isolator = isolatorOf(turn);
  const lock = ownNumber(turn, isolator);
  turn.job.writeDeaf(turn.device, 'lock-off', { isolator, lock });
  turn.job.writeDeaf(turn.device, 'lock-on', { isolator, lock });
}

function round(reason: BodyOf<'round-started'>['reason']) {
  return ({ job, device, pick }: Turn): void => {
    const point = at(job.checklist.scope, pick) ?? '';
    job.writeDeaf(device, 'round-started', { points: [point], reason, words: 'Again' });
  };
}

function hold(turn: Turn): void {
  const step = anyStep(turn);
  if (step)
    turn.job.writeDeaf(turn.device, 'hold', { step: step.id, reason: 'other', words: 'Cannot do it' });
}

function decide({ job, device, state, pick }: Turn): void {
  const held = Object.values(state.steps).flatMap((each) => (each.hold ? [each.hold.entry] : []));
  const entry = at(held, pick);
  const decision = at(['rework', 'accept', 'out-of-scope'] as const, pick) ?? 'rework';
  if (entry) job.writeDeaf(device, 'hold-decided', { hold: entry, decision, words: 'Decided' });
}

function remove({ job, device, state, pick }: Turn): void {
  const lock = at(
    state.locks.filter(({ offAt }) => offAt === undefined),
    pick,
  );
  if (lock)
    job.writeDeaf(device, 'lock-removed-by-supervisor', {
      isolator: lock.isolator,
      lock: lock.lock,
      owner: lock.person,
      notOnSite: 'Gate list',
      effort: 'Called twice',
      toldBeforeReturn: 'By phone',
      witness: lock.person === mara.id ? ilya.id : mara.id,
    });
}

function choose({ job, device, state, pick }: Turn): void {
  const two = Object.values(state.steps).filter(({ status }) => status === 'two-answers');
  const found = at(two, pick);
  const entry = at(found?.history ?? [], pick)?.entry;
  if (found && entry) job.writeDeaf(device, 'chosen', { step: found.step.id, entry, words: 'This one' });
}

function signIfOpen({ job, person }: Turn): void {
  try {
    sign(job, person);
  } catch {
    // Not this person's turn to sign.
  }
}

const acts: readonly ((turn: Turn) => void)[] = [
  ...Array.from({ length: 16 }, () => goOn),
  readLive,
  (turn) => {
    const isolator = isolatorOf(turn);
    turn.job.writeDeaf(turn.device, 'lock-off', { isolator, lock: lockNumber(turn.person, isolator) });
  },
  (turn) => {
    const isolator = isolatorOf(turn);
    turn.job.writeDeaf(turn.device, 'lock-on', { isolator, lock: lockNumber(turn.person, isolator) });
  },
  (turn) => {
    const isolator = isolatorOf(turn);
    turn.job.writeDeaf(turn.device, 'closed', {
      isolator,
      step: `close.${isolator}`,
      counted: turn.pick % 2,
    });
  },
  round('fault'),
  round('break'),
  (turn) => {
    const step = anyStep(turn);
    if (step) write(turn, step);
  },
  (turn) => {
    const wiring = turn.job.checklist.steps.filter(({ needsIsolation }) => needsIsolation);
    const step = at(wiring, turn.pick);
    if (step) write(turn, step);
  },
  hold,
  decide,
  (turn) => {
    const step = anyStep(turn);
    if (step)
      turn.job.writeDeaf(turn.device, 'returned', { steps: [{ step: step.id, words: 'Look again' }] });
  },
  remove,
  ({ job, device, person }) => {
    job.writeDeaf(device, 'clear', { person: person.id });
  },
  (turn) => {
    turn.job.writeDeaf(turn.device, 'lock-on', { isolator: isolatorOf(turn), lock: '17' });
  },
  choose,
  ({ job, device }) => {
    job.writeDeaf(device, 'temporary', { what: 'jumper', place: 'X1:4' });
  },
  signIfOpen,
  ({ job, person }) => {
    countersign(job, person);
  },
  relock,
  proveAgain,
];

export const actCount = acts.length;

/** Hearing is whole: whoever hears a log also hears what that log had heard. */
function hear(job: Job, device: Device, { hear: how, pick }: Move): void {
  if (how === 0) return;
  if (how > 1) {
    job.hear(device);
    return;
  }
  const other = at([...job.devices.values()], pick);
  if (!other || other === device) return;
  const known = new Map([...other.heard, [other.log, other.head?.seq ?? 0] as const]);
  for (const [log, seq] of known)
    if (log !== device.log && seq > (device.heard.get(log) ?? 0)) device.heard.set(log, seq);
}

export const walkers = [mara, ilya, tomas] as const;

/** Plays the moves on a job; answers given through an open gate are named by their entry. */
export function play(job: Job, moves: readonly Move[]): { throughOpenGate: Set<string> } {
  const throughOpenGate = new Set<string>();
  for (const move of moves) {
    const person = at(walkers, move.who) ?? mara;
    const device = job.device(person, move.phone === 0 ? 'phone' : 'tablet');
    hear(job, device, move);
    const state = foldJob(job.checklist, job.held(device), job.facts);
    const act = at(acts, move.act);
    const before = job.entries.length;
    act?.({ job, person, device, pick: move.pick, state });
    const [written] = job.entries.slice(before);
    if (act === goOn && written) throughOpenGate.add(written.id);
  }
  return { throughOpenGate };
}
