import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { generateChecklist } from '../../../shared/checklist/generate';
import { entryKinds, type Entry } from '../../../shared/job/entry';
import { foldJob } from '../../../shared/job/fold';
import { gateFor } from '../../../shared/job/gates';
import { jobSummary } from '../../../shared/job/jobSummary';
import { nextStep } from '../../../shared/job/next';
import {
  answerWell,
  ilya,
  lockNumber,
  mara,
  newJob,
  people,
  tomas,
  type Job,
} from '../../support/jobScenario';
import { exampleInput } from '../../support/smallPanel';

const checklist = generateChecklist({ ...exampleInput(), scope: ['DI3.02'] });
const land = 'wire.DI3.02.land.signal';

function upTo(prefix: string): Job {
  const job = newJob(checklist, people);
  job.write(mara, 'accepted', {});
  const end = checklist.steps.findIndex(({ id }) => id.startsWith(prefix));
  for (const step of checklist.steps.slice(0, end)) answerWell(job, mara, step);
  return job;
}
const isOpen = (job: Job, step: string, entries: readonly Entry[] = job.entries): boolean =>
  gateFor(checklist, foldJob(checklist, entries, job.facts), mara.id, step).open;

const logs = Object.fromEntries(['l1', 'l2', 'l3'].map((log, index) => [log, people[index]?.id ?? '']));
const ids = fc.constantFrom('a', 'b', 'c', 'd', 'e', 'f', 'g', 'h');
const stepIds = fc.constantFrom(...checklist.steps.map(({ id }) => id), 'no.such.step', '__proto__');
const tags = fc.constantFrom('Q1', 'F7', 'F9', 'V1', 'constructor');
const bodies = fc.oneof(
  fc.object(),
  fc.record({ step: stepIds, value: fc.anything(), shown: fc.string(), language: fc.constant('en') }),
  fc.record({
    step: stepIds,
    value: fc.constant({ kind: 'done' }),
    shown: fc.constant('x'),
    language: fc.constant('en'),
  }),
  fc.record({ isolator: tags, lock: fc.constantFrom('1', '2'), step: stepIds }),
  fc.record({ isolator: tags, step: stepIds, counted: fc.constantFrom(0, 1, -1) }),
  fc.record({ steps: fc.array(fc.record({ step: stepIds, words: fc.constant('x') })) }),
  fc.record({
    points: fc.array(fc.constantFrom('DI3.02', 'x')),
    reason: fc.constant('fault'),
    words: fc.constant('x'),
  }),
);
const seen = fc.dictionary(
  fc.constantFrom('l1', 'l2', 'l3', 'l4', '__proto__'),
  fc.constantFrom(1, 2, 5, 1e9),
);
const almostEntry = fc.record({
  id: ids,
  job: fc.constant('j'),
  log: fc.constantFrom('l1', 'l2', 'l3', 'l4'),
  seq: fc.constantFrom(1, 2, 3, 7, 2 ** 40),
  previous: fc.constantFrom(null, 'x'),
  seen,
  kind: fc.constantFrom(...entryKinds, 'lock-moved', '__proto__', 'constructor'),
  body: bodies,
  pack: fc.constant('p'),
  at: fc.constantFrom('2026-12-01T08:00:00Z', 'noon'),
  signature: fc.constant('s'),
});
const garbage = fc.array(
  fc.oneof({ weight: 6, arbitrary: almostEntry }, { weight: 1, arbitrary: fc.anything() }),
  {
    maxLength: 25,
  },
);

describe('the fold', () => {
  test('makes a state of anything, the same in any order', () => {
    fc.assert(
      fc.property(garbage, (given) => {
        const facts = { people, logs };
        const state = foldJob(checklist, given, facts);
        expect(foldJob(checklist, [...given].reverse(), facts)).toEqual(state);
        for (const { id } of people) {
          nextStep(checklist, state, id);
          gateFor(checklist, state, id, land);
        }
        jobSummary(checklist, state);
      }),
      { numRuns: 150, endOnFailure: true },
    );
  });

  test('keeps an entry that came twice once, and trusts neither of two contents', () => {
    const job = upTo('isolate.');
    const [first] = job.entries;
    if (!first) throw new Error('no entry');
    expect(foldJob(checklist, [...job.entries, { ...first }], job.facts)).toEqual(job.state());
    const other = foldJob(
      checklist,
      [...job.entries, { ...first, at: '2026-12-01T00:00:00.000Z' }],
      job.facts,
    );
    expect(other.contradictions.map(({ code }) => code)).toEqual(['two-contents']);
  });

  test('names a hole, and counts no lock or reading of its log from before', () => {
    const job = upTo('wire.DI3.02.dead');
    const terminal = checklist.steps.find(({ personal }) => personal)?.id ?? '';
    expect(isOpen(job, terminal)).toBe(true);
    const { log } = job.device(mara);
    const last = job.write(mara, 'note', { words: 'One' });
    job.write(mara, 'note', { words: 'Two' });
    const held = job.entries.filter((entry) => entry !== last);
    const state = foldJob(checklist, held, job.facts);
    expect(state.gaps).toEqual([{ log, person: mara.id, seq: last.seq - 1 }]);
    expect(isOpen(job, terminal, held)).toBe(false);
    expect(isOpen(job, terminal)).toBe(true);
  });

  test('keeps both branches of a fork, and counts nothing that was proved before it', () => {
    const job = upTo('wire.DI3.02.dead');
    const terminal = checklist.steps.find(({ personal }) => personal)?.id ?? '';
    const device = job.device(mara);
    const restored = { ...device, heard: new Map(device.heard) };
    job.write(mara, 'lock-off', { isolator: 'Q1', lock: lockNumber(mara, 'Q1') });
    job.writeDeaf(restored, 'note', { words: 'Restored' });
    const state = job.state();
    expect(state.forks).toHaveLength(1);
    expect(state.forks[0]?.entries).toHaveLength(2);
    expect(state.locks.find(({ isolator }) => isolator === 'Q1')?.offAt).toBeDefined();
    expect(isOpen(job, terminal)).toBe(false);
  });

  test('is not taken in by entries that claim to have seen each other', () => {
    const job = newJob(checklist, people);
    job.write(mara, 'accepted', {});
    const [a, b] = [job.device(mara), job.device(ilya)];
    a.heard.set(b.log, 1);
    b.heard.set(a.log, 2);
    job.writeDeaf(a, 'note', { words: 'I saw yours' });
    job.writeDeaf(b, 'note', { words: 'And I yours' });
    expect(job.state().notes).toHaveLength(2);
  });

  test('counts nothing of people who are not on the job', () => {
    const job = upTo('isolate.');
    const before = job.state();
    const strangers = { ...tomas, id: '0190a1b2-0000-7000-8000-0000000000ff' };
    job.write(strangers, 'returned', { steps: [{ step: 'ready.panel', words: 'No' }] });
    const { heads, ...after } = job.state();
    const { heads: headsBefore, ...rest } = before;
    expect(after).toEqual(rest);
    expect(Object.keys(heads)).toHaveLength(Object.keys(headsBefore).length + 1);
  });
});
