import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { generateChecklist } from '../../../shared/checklist/generate';
import type { Checklist, Stage } from '../../../shared/checklist/types';
import { entryKinds, type Entry } from '../../../shared/job/entry';
import { foldJob } from '../../../shared/job/fold';
import { gateFor } from '../../../shared/job/gates';
import { nextStep } from '../../../shared/job/next';
import { canonicalJson } from '../../../shared/panel/canonical';
import type { JobState } from '../../../shared/job/types';
import type { Job } from '../../support/jobScenario';
import { exampleInput } from '../../support/smallPanel';
import { NaiveFacts } from './naiveFacts';
import { NaiveOracle } from './naiveOracle';
import { NaivePast, type Verdict } from './naivePast';
import { actCount, crews, play, startAt, workerCount, type Move } from './randomJob';
import { tinyChecklist } from './tinyChecklist';

// More runs or another seed for a longer look: RUNS=5000 SEED=7.
const runs = Number(process.env['RUNS'] ?? 200);
const seed = Number(process.env['SEED'] ?? 20261130);
const assertFor = <T>(count: number, property: fc.IPropertyWithHooks<T>) => {
  fc.assert(property, { numRuns: Math.ceil(count), seed, endOnFailure: true });
};

const stagesToStart: readonly Stage[] = [
  'get-ready',
  'prove-dead',
  'wire',
  'wire',
  'wire',
  'check-cold',
  'close-up',
  'close',
  'close',
  'prove-points',
];
const starts = stagesToStart.map((stage) => crews.map((crew) => startAt(tinyChecklist, crew, stage)));

const move: fc.Arbitrary<Move> = fc.record({
  who: fc.nat({ max: 9 }),
  phone: fc.nat({ max: 5 }),
  hear: fc.nat({ max: 5 }),
  act: fc.integer({ min: -workerCount * 6, max: actCount - 1 }),
  pick: fc.nat({ max: 500 }),
});
const story = fc.record({
  stage: fc.nat({ max: starts.length - 1 }),
  crew: fc.nat({ max: crews.length - 1 }),
  moves: fc.array(move, { minLength: 3, maxLength: 12 }),
});
/** Which entries have arrived, and in what order: one number each. */
const arrival = fc.record({
  lost: fc.constantFrom(0, 0, 1, 1, 5, 20),
  numbers: fc.array(fc.nat({ max: 999 }), { minLength: 60, maxLength: 60 }),
});
type Story = { stage: number; crew: number; moves: Move[] };
type Arrival = { lost: number; numbers: number[] };

function played({ stage, crew, moves }: Story) {
  const job = starts[stage]?.[crew]?.copy();
  if (!job) throw new Error('no job to start from');
  return { job, letThrough: play(job, moves) };
}

const numberOf = ({ numbers }: Arrival, index: number): number =>
  ((numbers[index % numbers.length] ?? 0) * 7919 + index * 104729) % 1000;

/** About `lost` in a hundred entries have not come. */
const arrived = (job: Job, how: Arrival): Entry[] =>
  job.entries.filter((_entry, index) => numberOf(how, index) >= how.lost * 10);

/** In any order, some of them twice. */
const shuffled = (entries: readonly Entry[], how: Arrival): Entry[] =>
  [...entries, ...entries.filter((_entry, index) => numberOf(how, index) % 7 === 0)]
    .map((entry, index) => ({ entry, number: numberOf(how, index * 31) }))
    .sort((a, b) => a.number - b.number)
    .map(({ entry }) => entry);

const answersOf = (state: JobState) =>
  Object.values(state.steps).flatMap(({ step, history }) => history.map((answer) => ({ step, answer })));

function pastOf(job: Job, held: readonly Entry[], state: JobState): NaivePast {
  const { people, logs } = job.facts;
  const owner = ({ log }: Entry) => logs[log] ?? '';
  const verdicts = new Map<string, Verdict>(
    answersOf(state).map(({ answer }) => [answer.entry, answer.verdict]),
  );
  return new NaivePast({ people, held, owner, verdicts });
}

/** Every answer that counts, with what stood against it when it was given. */
function wrongly(checklist: Checklist, past: NaivePast, state: JobState) {
  const byId = new Map(past.told.held.map((entry) => [entry.id, entry]));
  return answersOf(state).flatMap(({ step, answer }) => {
    const entry = byId.get(answer.entry);
    if (!entry || answer.verdict === 'refused') return [];
    const oracle = new NaiveOracle(checklist, past, [...past.of(entry)], past.by(entry), entry.pack);
    const against = [...oracle.against(step), ...oracle.againstValue(entry)];
    return against.length > 0 ? [{ step: step.id, entry: entry.id, against }] : [];
  });
}

/** Every gate that stands open now though something is against it, and every proof that should not hold. */
function openedWrongly(checklist: Checklist, past: NaivePast, state: JobState) {
  return past.told.people.flatMap(({ id }) => {
    const oracle = new NaiveOracle(checklist, past, past.told.held, id);
    const gates = checklist.steps.flatMap((step) => {
      if (!gateFor(checklist, state, id, step.id).open) return [];
      const against = oracle.against(step);
      return against.length > 0 ? [{ person: id, step: step.id, against }] : [];
    });
    const proof = state.proofs[id]?.holds ? oracle.proof() : [];
    return proof.length > 0 ? [...gates, { person: id, step: 'proof', against: proof }] : gates;
  });
}

/** Padlocks under which an isolator was closed, and what the state must say of each. */
function hidden(checklist: Checklist, past: NaivePast, state: JobState) {
  return new NaiveFacts(checklist, past, past.told.held).closedUnder().filter(({ on, closing }) => {
    const isSaid = state.contradictions.some(
      ({ code, entries }) =>
        code === 'closed-under-lock' && entries.includes(on.id) && entries.includes(closing.id),
    );
    const { isolator } = closing.body;
    return !isSaid || state.isolators[String(isolator)]?.status !== 'not-known';
  });
}

const codesMet = new Map<string, number>();
const countIn = (counts: Map<string, number>, key: string) => counts.set(key, (counts.get(key) ?? 0) + 1);

/** What happened at all: a rule that was never tried proves nothing. */
function note(state: JobState): void {
  for (const { step, answer } of answersOf(state))
    if (answer.verdict !== 'refused') countIn(codesMet, `${step.stage} counts`);
    else for (const { code } of answer.refusals ?? []) countIn(codesMet, code);
}

describe('the fold of random jobs', () => {
  test('breaks no rule, whatever entries have come', () => {
    assertFor(
      runs,
      fc.property(story, arrival, (given, how) => {
        const { job } = played(given);
        const held = arrived(job, how);
        const state = foldJob(tinyChecklist, held, job.facts);
        const past = pastOf(job, held, state);
        note(state);
        expect(wrongly(tinyChecklist, past, state)).toEqual([]);
        expect(openedWrongly(tinyChecklist, past, state)).toEqual([]);
        expect(hidden(tinyChecklist, past, state)).toEqual([]);
        const unreadable = held.filter(({ kind }) => !entryKinds.some((known) => known === kind));
        expect(state.unknown.map(({ entry }) => entry).sort()).toEqual(unreadable.map(({ id }) => id).sort());
      }),
    );
    const tried = [...met].filter((code) => (codesMet.get(code) ?? 0) < 5);
    expect(tried).toEqual([]);
  });

  test('gives the same state for any order of arrival', () => {
    assertFor(
      runs / 4,
      fc.property(story, arrival, (given, how) => {
        const { job } = played(given);
        const held = arrived(job, how);
        const inOrder = canonicalJson(foldJob(tinyChecklist, held, job.facts));
        expect(canonicalJson(foldJob(tinyChecklist, shuffled(held, how), job.facts))).toBe(inOrder);
      }),
    );
  });

  test('takes every answer that a phone let through by what it held', () => {
    assertFor(
      runs / 4,
      fc.property(story, (given) => {
        const { job, letThrough } = played(given);
        const refused = answersOf(job.state())
          .filter(({ answer }) => letThrough.has(answer.entry) && answer.verdict === 'refused')
          .map(({ step, answer }) => [step.id, answer.refusals?.map(({ code }) => code)]);
        expect(refused).toEqual([]);
      }),
    );
  });

  test('always says what comes next in the words of the checklist', () => {
    assertFor(
      runs / 8,
      fc.property(story, (given) => {
        const { job } = played(given);
        const state = job.state();
        const next = job.facts.people.flatMap(({ id }) => nextStep(tinyChecklist, state, id) ?? []);
        expect(next.filter((step) => !tinyChecklist.steps.includes(step))).toEqual([]);
      }),
    );
  });
});

describe('the fold of random jobs on a real checklist', () => {
  const checklist = generateChecklist({ ...exampleInput(), scope: ['DI3.02'] });
  const begun = startAt(checklist, 2, 'wire');
  test('breaks no rule', () => {
    assertFor(
      runs / 40,
      fc.property(fc.array(move, { minLength: 2, maxLength: 6 }), arrival, (moves, how) => {
        const job = begun.copy();
        play(job, moves);
        const held = arrived(job, how);
        const state = foldJob(checklist, held, job.facts);
        const past = pastOf(job, held, state);
        expect(wrongly(checklist, past, state)).toEqual([]);
        expect(hidden(checklist, past, state)).toEqual([]);
      }),
    );
  });
});

/** Every gate that an attack should have met, and every stage that somebody should have come to. */
const met = [
  'own-locks',
  'own-tests',
  'own-terminal',
  'danger',
  'contradiction',
  'unreadable',
  'isolation-over',
  'stopped',
  'order',
  'locked',
  'not-clear',
  'temporaries',
  'no-own-lock',
  'lock-elsewhere',
  'not-watched',
  'not-on-job',
  'wire counts',
  'check-cold counts',
  'close counts',
  'prove-points counts',
];
