import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { generateChecklist } from '../../../shared/checklist/generate';
import type { Stage } from '../../../shared/checklist/types';
import type { Entry } from '../../../shared/job/entry';
import { foldJob } from '../../../shared/job/fold';
import { gateFor } from '../../../shared/job/gates';
import { nextStep } from '../../../shared/job/next';
import { ilya, mara, newJob, people, walk, type Job } from '../../support/jobScenario';
import { exampleInput } from '../../support/smallPanel';
import { naivePast, reasonsAgainst } from './naiveOracle';
import { actCount, play, type Move } from './randomJob';

const checklist = generateChecklist({ ...exampleInput(), scope: ['DI3.02'] });
const needsIsolation = new Set(checklist.steps.filter((step) => step.needsIsolation).map(({ id }) => id));

/** Jobs of two electricians that stand at the beginning of each of these stages. */
const starts: Job[] = (
  ['get-ready', 'prove-dead', 'wire', 'close-up', 'close', 'prove-points', 'sign'] as Stage[]
).map((until) => {
  const job = newJob(checklist, people);
  job.write(mara, 'accepted', {});
  if (until !== 'get-ready') {
    walk(job, mara, 'wire');
    walk(job, ilya, 'wire');
    walk(job, mara, until);
    walk(job, ilya, until);
    walk(job, mara, until);
  }
  return job;
});

const move: fc.Arbitrary<Move> = fc.record({
  who: fc.nat({ max: 2 }),
  phone: fc.nat({ max: 4 }).map((phone) => (phone === 0 ? 1 : 0)),
  hear: fc.nat({ max: 5 }),
  act: fc.nat({ max: actCount - 1 }),
  pick: fc.nat({ max: 500 }),
});

const story = fc.record({
  start: fc.nat({ max: starts.length - 1 }),
  moves: fc.array(move, { minLength: 4, maxLength: 30 }),
});
// Locks off and on again, work without either, readings: what a proof hangs on, close together.
const proving = {
  goOn: 0,
  readLive: 16,
  lockOff: 17,
  lockOn: 18,
  takeUp: 21,
  work: 23,
  proveAgain: actCount - 1,
};
const provingStory = fc.record({
  start: fc.constant(2),
  moves: fc.array(
    fc.record({
      who: fc.nat({ max: 1 }),
      phone: fc.constant(0),
      hear: fc.constantFrom(0, 2, 2, 2),
      act: fc.constantFrom(
        proving.goOn,
        proving.readLive,
        proving.takeUp,
        proving.lockOff,
        proving.relock,
        proving.relock,
        ...[proving.work, proving.proveAgain].flatMap((act) => [act, act, act]),
      ),
      pick: fc.nat({ max: 7 }),
    }),
    { minLength: 6, maxLength: 24 },
  ),
});
const runs = Number(process.env.RUNS ?? 40);

function played({ start, moves }: { start: number; moves: Move[] }) {
  const job = (starts[start] ?? starts[0])?.copy();
  if (!job) throw new Error('no job to start from');
  return { job, ...play(job, moves) };
}

const answersOf = (job: Job, entries: readonly Entry[]) => {
  const state = foldJob(checklist, entries, job.facts);
  return Object.values(state.steps).flatMap(({ step, history }) =>
    history.map((answer) => ({ step, answer })),
  );
};

describe('the fold of random jobs', () => {
  test('gives the same state for any order of arrival', () => {
    fc.assert(
      fc.property(story, fc.infiniteStream(fc.nat({ max: 1_000_000 })), (given, numbers) => {
        const { job } = played(given);
        const keys = new Map(job.entries.map((entry) => [entry.id, numbers.next().value as number]));
        const shuffled = [...job.entries, ...job.entries.slice(0, 3)].sort(
          (a, b) => (keys.get(a.id) ?? 0) - (keys.get(b.id) ?? 0),
        );
        expect(foldJob(checklist, shuffled, job.facts)).toEqual(job.state());
      }),
      { numRuns: runs, endOnFailure: true },
    );
  });

  test.each([
    ['wherever the job stands', story],
    ['when locks come and go while wiring', provingStory],
  ])('never counts work without own locks and, after them, own dead readings: %s', (_name, stories) => {
    let counted = 0;
    let refused = 0;
    fc.assert(
      fc.property(
        stories,
        fc.array(fc.nat({ max: 9 }), { minLength: 400, maxLength: 400 }),
        (given, keep) => {
          const { job } = played(given);
          // Every other job has lost some of its entries.
          const lost = given.moves.length % 2 === 0 ? 0 : 11;
          const held = job.entries.filter((_each, index) => (keep[index] ?? 1) !== lost);
          const oracle = { checklist, entries: held, personOf: ({ log }: Entry) => job.facts.logs[log] };
          const byId = new Map(held.map((entry) => [entry.id, entry]));
          for (const { step, answer } of answersOf(job, held)) {
            const entry = byId.get(answer.entry);
            if (!entry || !needsIsolation.has(step.id)) continue;
            if (answer.verdict === 'refused') {
              refused += 1;
              continue;
            }
            counted += 1;
            expect({ entry: entry.id, reasons: reasonsAgainst(oracle, entry) }).toEqual({
              entry: entry.id,
              reasons: [],
            });
          }
        },
      ),
      { numRuns: Math.ceil(runs / 2), endOnFailure: true },
    );
    // The property says something only when work was counted, and when some was refused.
    expect(counted).toBeGreaterThan(20);
    expect(refused).toBeGreaterThan(20);
  });

  test('calls no isolator closed under a known lock without a contradiction', () => {
    fc.assert(
      fc.property(story, (given) => {
        const { job } = played(given);
        const state = job.state();
        for (const { on, closing } of underLock(job)) {
          const [lock, closed] = [on.id, closing.id];
          const found = state.contradictions.find(
            ({ code, entries }) =>
              code === 'closed-under-lock' && entries.includes(lock) && entries.includes(closed),
          );
          expect({ lock, closed, found: found?.code }).toEqual({ lock, closed, found: 'closed-under-lock' });
          expect(state.isolators[closing.body.isolator as string]?.status).toBe('not-known');
          for (const { id } of people)
            for (const step of needsIsolation) expect(gateFor(checklist, state, id, step).open).toBe(false);
        }
      }),
      { numRuns: runs, endOnFailure: true },
    );
  });

  test('takes every answer that a phone let through by what it held', () => {
    fc.assert(
      fc.property(story, (given) => {
        const { job, throughOpenGate } = played(given);
        const refused = answersOf(job, job.entries)
          .filter(({ answer }) => throughOpenGate.has(answer.entry) && answer.verdict === 'refused')
          .map(({ step, answer }) => [step.id, answer.refusals?.map(({ code }) => code)]);
        expect(refused).toEqual([]);
      }),
      { numRuns: runs, endOnFailure: true },
    );
  });

  test('always says what comes next to somebody whose work is not done', () => {
    fc.assert(
      fc.property(story, (given) => {
        const state = played(given).job.state();
        for (const { id } of [mara, ilya]) {
          const next = nextStep(checklist, state, id);
          if (next) expect(checklist.steps.some((step) => step.id === next.id)).toBe(true);
        }
      }),
      { numRuns: Math.ceil(runs / 3), endOnFailure: true },
    );
  });
});

/** Locks known on, and closings that came after them or without knowing of them. */
function underLock(job: Job): { on: Entry; closing: Entry }[] {
  const { entries, facts } = job;
  const closings = entries.filter(({ kind, body }) => kind === 'closed' && body.counted === 0);
  const isOff = (on: Entry) =>
    entries.some(
      (off) =>
        (off.kind === 'lock-off' ? facts.logs[off.log] === facts.logs[on.log] : isRemoval(job, off)) &&
        off.body.isolator === on.body.isolator &&
        off.body.lock === on.body.lock &&
        naivePast(entries, off).has(on),
    );
  return entries
    .filter((on) => on.kind === 'lock-on' && !isOff(on))
    .flatMap((on) =>
      closings
        .filter((closing) => closing.body.isolator === on.body.isolator)
        .filter((closing) => !naivePast(entries, on).has(closing))
        .map((closing) => ({ on, closing })),
    );
}

const isRemoval = (job: Job, { kind, log, body }: Entry): boolean =>
  kind === 'lock-removed-by-supervisor' &&
  job.facts.people.some(({ id, part }) => id === job.facts.logs[log] && part === 'foreman') &&
  body.owner !== body.witness;
