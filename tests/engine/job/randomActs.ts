/** What people do at a random job: go on, go wrong, and attack every rule of isolation. */
import type { Step } from '../../../shared/checklist/types';
import type { BodyOf } from '../../../shared/job/entry';
import { countersign, packDigest, sign } from '../../support/jobScenario';
import { at, type Turn } from './randomTurn';

export type Act = (turn: Turn) => void;

const isDead = ({ ask }: Step): boolean => ask.kind === 'reading' && ask.dead !== undefined;
const isTest = ({ stage, by }: Step): boolean => stage === 'prove-dead' && by === 'each';
const isWork = ({ needsIsolation, personal }: Step): boolean => needsIsolation && !personal;
const isWiring = (step: Step): boolean => isWork(step) && step.stage === 'wire';

/** On with it, whatever the gate says. */
const workAnyway: Act = (turn) => {
  const step = turn.pickStep(isWork);
  if (step) turn.answerWell(step);
};
const wireAnyway: Act = (turn) => {
  const step = turn.pickStep(isWiring);
  if (step) turn.answerWell(step);
};
const readTests: Act = (turn) => {
  for (const step of turn.steps) if (isTest(step)) turn.answerWell(step);
};
const readTerminals: Act = (turn) => {
  for (const step of turn.steps) if (step.personal) turn.answerWell(step);
};
const lockAll: Act = (turn) => {
  for (const isolator of turn.job.checklist.isolators) turn.lockOn(isolator);
};
const unlockAll: Act = (turn) => {
  for (const isolator of turn.job.checklist.isolators) turn.lockOff(isolator);
};
/** Everything that somebody answers alone, but the padlocks. */
const readyAlone: Act = (turn) => {
  for (const step of turn.steps)
    if (step.by === 'each' && (step.stage === 'get-ready' || isTest(step))) turn.answerWell(step);
};
const doFirst: Act = (turn) => {
  for (const step of turn.steps)
    if (step.by === 'one' && (step.stage === 'isolate' || step.stage === 'prove-dead')) turn.answerWell(step);
};
const readLive: Act = (turn) => {
  const step = turn.pickStep(isDead);
  if (step) turn.answer(step, { kind: 'reading', value: turn.pick % 2 === 0 ? 118 : -24 });
};
const readWell: Act = (turn) => {
  const step = turn.pickStep(isDead);
  if (step) turn.answerWell(step);
};
const testerFails: Act = (turn) => {
  const step = turn.pickStep(({ family }) => family === 'tester-proved');
  if (step) turn.answer(step, { kind: 'reading', value: 0 });
};
const answerBadly: Act = (turn) => {
  const step = turn.pickStep(({ ask, stage }) => ask.kind === 'choice' && stage !== 'prove-points');
  if (step) turn.answer(step, { kind: 'choice', value: 'no' });
};
const close =
  (counted: number): Act =>
  (turn) => {
    const isolator = turn.isolator();
    turn.write('closed', { isolator, step: `close.${isolator}`, counted });
  };
const closeAll: Act = (turn) => {
  for (const step of turn.steps) if (step.ask.kind === 'close') turn.answerWell(step);
};
const clear: Act = (turn) => {
  turn.write('clear', { person: turn.person.id });
};
const clearAnother: Act = (turn) => {
  const other = at(turn.job.facts.people, turn.pick);
  if (other) turn.write('clear', { person: other.id });
};
const round =
  (reason: BodyOf<'round-started'>['reason']): Act =>
  (turn) => {
    turn.write('round-started', { points: [turn.point()], reason, words: 'Again' });
  };
/** The dead tests of others as one's own: heard, or watched. */
const watchTests =
  (change: (value: number) => number): Act =>
  (turn) => {
    for (const step of turn.steps.filter(isTest)) {
      const taken = turn
        .held()
        .findLast(
          ({ kind, body, log }) => kind === 'answer' && body['step'] === step.id && log !== turn.device.log,
        );
      const value = taken?.body['value'] as BodyOf<'answer'>['value'] | undefined;
      if (taken && value?.kind === 'reading')
        turn.answer(step, { ...value, value: change(value.value) }, taken.id);
    }
  };
const hold =
  (of: (step: Step) => boolean): Act =>
  (turn) => {
    const step = turn.pickStep(of);
    if (step) turn.write('hold', { step: step.id, reason: 'not-safe', words: 'Not safe' });
  };
const decide: Act = (turn) => {
  const held = turn.held().filter(({ kind }) => kind === 'hold');
  const decision = at(['rework', 'accept', 'out-of-scope'] as const, turn.pick) ?? 'rework';
  const entry = at(held, turn.pick);
  if (entry) turn.write('hold-decided', { hold: entry.id, decision, words: 'Decided' });
};
const sendBack: Act = (turn) => {
  const step = turn.pickStep(() => true);
  if (step) turn.write('returned', { steps: [{ step: step.id, words: 'Look again' }] });
};
const remove: Act = (turn) => {
  const on = at(
    turn.held().filter(({ kind }) => kind === 'lock-on'),
    turn.pick,
  );
  const { people, logs } = turn.job.facts;
  const witness = at(people, turn.pick + 1);
  if (!on || !witness) return;
  const { isolator, lock } = on.body as BodyOf<'lock-on'>;
  const facts = { notOnSite: 'Gate list', effort: 'Called twice', toldBeforeReturn: 'By phone' };
  turn.write('lock-removed-by-supervisor', {
    isolator,
    lock,
    owner: logs[on.log] ?? '',
    witness: witness.id,
    ...facts,
  });
};
const choose: Act = (turn) => {
  const two = Object.values(turn.state().steps).filter(({ history }) => history.length > 1);
  const found = at(two, turn.pick);
  const entry = at(found?.history ?? [], turn.pick)?.entry;
  if (found && entry) turn.write('chosen', { step: found.step.id, entry, words: 'This one' });
};
const jumper: Act = (turn) => {
  turn.write('temporary', { what: 'jumper', place: 'X1:4' });
};
const takeJumperOut: Act = (turn) => {
  const made = at(
    turn.held().filter(({ kind }) => kind === 'temporary'),
    turn.pick,
  );
  if (made) turn.write('temporary', { what: 'jumper', place: 'X1:4', removes: made.id });
};
/** A newer version of the app wrote something that this one cannot read. */
const unknownKind: Act = (turn) => {
  turn.write('note', { words: 'x' });
  turn.change({ kind: 'lock-moved' });
};
const underOldPack: Act = (turn) => {
  const step = turn.pickStep(isTest);
  if (!step) return;
  turn.answerWell(step);
  turn.change({ pack: `${packDigest.slice(1)}0` });
};
const testsUnderOldPack: Act = (turn) => {
  for (const step of turn.steps.filter(isTest)) {
    turn.answerWell(step);
    turn.change({ pack: `${packDigest.slice(1)}0` });
  }
};
/** A lock-off of a padlock that is somebody else's. */
const unlockAnother: Act = (turn) => {
  for (const { body } of turn.held().filter(({ kind }) => kind === 'lock-on'))
    turn.write('lock-off', { isolator: String(body['isolator']), lock: String(body['lock']) });
};
/** Two who do not hear each other find different things; the foreman believes the better. */
const chooseBetter: Act = (turn) => {
  const step = turn.pickStep(
    ({ stage, by, ask }) => stage === 'isolate' && by === 'one' && ask.kind === 'choice',
  );
  const { people } = turn.job.facts;
  const other = people.find(({ id, part }) => id !== turn.person.id && part === 'electrician');
  const foreman = people.find(({ part }) => part === 'foreman');
  if (!step || !other || !foreman) return;
  const elsewhere = turn.as(other);
  turn.hearAll();
  const good = turn.answerWell(step);
  elsewhere.answer(step, { kind: 'choice', value: 'no' });
  turn.as(foreman).write('chosen', { step: step.id, entry: good.id, words: 'It holds' });
  turn.hearAll();
};
const signAsOpen: Act = ({ job, person }) => {
  try {
    sign(job, person);
  } catch {
    // Not this person's turn to sign.
  }
};

const chain =
  (...acts: Act[]): Act =>
  (turn) => {
    for (const act of acts) act(turn);
  };
const goOn =
  (count: number): Act =>
  (turn) => {
    turn.goOn(count);
  };
const hearAll: Act = (turn) => {
  turn.hearAll();
};
const byForeman =
  (act: Act): Act =>
  (turn) => {
    const foreman = turn.job.facts.people.find(({ part }) => part === 'foreman');
    if (foreman) act(turn.as(foreman));
  };
const clearEverybody: Act = (turn) => {
  for (const { id } of turn.job.facts.people) turn.write('clear', { person: id });
};
const relockOne: Act = (turn) => {
  const isolator = turn.isolator();
  turn.lockOff(isolator);
  turn.lockOn(isolator);
};
const otherLock: Act = (turn) => {
  turn.lockOn(turn.isolator(), '17');
};
const othersNumber: Act = (turn) => {
  const other = at(turn.job.facts.people, turn.pick);
  if (other) turn.lockOn(turn.isolator(), `${other.name.charAt(0)}-${turn.isolator()}`);
};
const unlockOne: Act = (turn) => {
  turn.lockOff(turn.isolator());
};

/** Following the app, in long and short goes. */
export const workers: readonly Act[] = [goOn(1), goOn(3), goOn(8), goOn(20), chain(hearAll, goOn(30))];

/** Each by itself; some of several steps, for a rule is broken only by what follows. */
export const attacks: readonly Act[] = [
  workAnyway,
  wireAnyway,
  chain(relockOne, wireAnyway),
  chain(relockOne, readTerminals, wireAnyway),
  chain(relockOne, readTests, wireAnyway),
  chain(unlockOne, readTests, readTerminals, lockAll, wireAnyway),
  chain(readTests, lockAll, readTerminals, wireAnyway),
  chain(unlockAll, wireAnyway),
  chain(readyAlone, lockAll, wireAnyway),
  chain(lockAll, readyAlone, wireAnyway),
  chain(lockAll, readyAlone, readTerminals, wireAnyway),
  chain(
    lockAll,
    watchTests((value) => value),
    readTerminals,
    wireAnyway,
  ),
  chain(
    lockAll,
    watchTests((value) => value + 0.25),
    readTerminals,
    wireAnyway,
  ),
  chain(readLive, wireAnyway),
  chain(readLive, wireAnyway, readWell, wireAnyway),
  chain(testerFails, wireAnyway),
  chain(answerBadly, wireAnyway),
  chain(doFirst, readTests, doFirst, readTerminals, wireAnyway),
  chain(round('break'), wireAnyway),
  chain(round('break'), doFirst, wireAnyway),
  chain(round('break'), doFirst, readTests, doFirst, wireAnyway),
  chain(round('break'), doFirst, readTests, doFirst, readTerminals, wireAnyway),
  chain(round('fault'), wireAnyway),
  chain(round('fault'), closeAll),
  chain(underOldPack, wireAnyway),
  chain(testsUnderOldPack, wireAnyway),
  chain(hearAll, unlockAnother, closeAll),
  chain(chooseBetter, wireAnyway),
  chain(othersNumber, wireAnyway),
  chain(
    hold(({ stage }) => stage === 'isolate' || stage === 'prove-dead'),
    wireAnyway,
  ),
  hold(() => true),
  decide,
  decide,
  sendBack,
  remove,
  chain(readTerminals, byForeman(remove), hearAll, wireAnyway),
  chain(readTerminals, byForeman(remove), hearAll, readTerminals, wireAnyway),
  chain(hearAll, byForeman(clearEverybody), hearAll, closeAll),
  chain(hearAll, unlockAll, byForeman(clearEverybody), hearAll, closeAll),
  chain(byForeman(clearEverybody), hearAll, closeAll),
  chain(byForeman(clearEverybody), hearAll, goOn(20)),
  chain(clear, hearAll, round('break'), goOn(40)),
  chain(byForeman(clearEverybody), hearAll, round('fault'), goOn(40)),
  choose,
  chain(close(0), wireAnyway),
  close(0),
  close(1),
  closeAll,
  chain(clear, closeAll),
  chain(clear, jumper, takeJumperOut, closeAll),
  chain(clear, otherLock, unlockOne, closeAll),
  chain(unlockAll, clear, closeAll),
  chain(clear, unlockAll, closeAll),
  chain(otherLock, closeAll),
  clear,
  clearAnother,
  chain(clearAnother, closeAll),
  otherLock,
  othersNumber,
  unlockOne,
  unlockAll,
  lockAll,
  jumper,
  takeJumperOut,
  chain(jumper, closeAll),
  unknownKind,
  chain(unknownKind, wireAnyway, closeAll),
  signAsOpen,
  ({ job, person }) => {
    countersign(job, person);
  },
];
