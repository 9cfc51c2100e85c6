/** What a dead reading is worth: only between two proofs of one tester, by who works, soon after each other. */
import { beforeAll, expect, test } from 'vitest';
import { generateChecklist } from '../../../shared/checklist/generate';
import type { Step } from '../../../shared/checklist/types';
import { gateFor } from '../../../shared/job/gates';
import { nextStep } from '../../../shared/job/next';
import { answerWell, jobUntil, lockNumber, mara, type Job } from '../../support/jobScenario';
import { exampleInput } from '../../support/smallPanel';

const checklist = generateChecklist({ ...exampleInput(), scope: ['DI3.02'] });
const own = checklist.steps.filter(({ stage, by }) => stage === 'prove-dead' && by === 'each');
const isProof = ({ family }: Step) => family === 'tester-proved';
const lastPart = own.filter(({ part }) => part === own.findLast(isProof)?.part);
const readings = lastPart.filter(({ ask }) => ask.kind === 'reading' && ask.dead);
const firstReading = lastPart.findIndex(({ ask }) => ask.kind === 'reading' && ask.dead);
const before = lastPart.slice(0, firstReading).filter(isProof);
const after = lastPart.slice(firstReading).filter(isProof);
const common = checklist.steps.find(({ stage }) => stage === 'wire');

let base: Job;
beforeAll(() => {
  base = jobUntil(checklist, 'wire');
});

const again = (job: Job, steps: readonly Step[]) => steps.map((step) => answerWell(job, mara, step));
const relock = (job: Job) => {
  const lock = { isolator: 'Q1', lock: lockNumber(mara, 'Q1') };
  job.write(mara, 'lock-off', lock);
  job.write(mara, 'lock-on', lock);
};
/** Everything but the last part, in order. */
const others = own.filter((step) => !lastPart.includes(step));
const later = (entries: { at: string }[], minutes: number) => {
  for (const entry of entries) entry.at = new Date(Date.parse(entry.at) + minutes * 60_000).toISOString();
};
const instrument = checklist.steps.find(({ ask }) => ask.kind === 'instrument');

const cases: [name: string, act: (job: Job) => unknown, missing: readonly Step[]][] = [
  ['proved, read, proved', (job) => job.entries.length, []],
  ['read again, not proved after it', (job) => again(job, readings.slice(0, 1)), after],
  ['read again and proved after it', (job) => again(job, [...readings.slice(0, 1), ...after]), []],
  ['proved again before, not read again', (job) => again(job, before), readings],
  [
    'locked again, read before the tester was proved',
    (job) => [relock(job), again(job, [...others, ...readings, ...before, ...after])],
    readings,
  ],
  ['locked again, everything in its order', (job) => [relock(job), again(job, [...others, ...lastPart])], []],
  ['the tester swapped after the readings', (job) => instrument && answerWell(job, mara, instrument), own],
  [
    'half an hour and a minute between the proofs',
    (job) => later(again(job, lastPart).slice(-after.length), 31),
    lastPart.filter((step) => isProof(step) || readings.includes(step)),
  ],
  [
    'the clock set back a day between the proofs',
    (job) => later(again(job, lastPart).slice(-after.length), -24 * 60),
    lastPart.filter((step) => isProof(step) || readings.includes(step)),
  ],
];

test.each(cases)('%s', (_name, act, missing) => {
  const job = base.copy();
  act(job);
  const state = job.state();
  expect(state.proofs[mara.id]?.missingTests).toEqual(missing.map(({ id }) => id));
  expect(gateFor(checklist, state, mara.id, common?.id ?? '').open).toBe(missing.length === 0);
});

test('the phone leads back to the first step that must be answered again', () => {
  const job = base.copy();
  again(job, readings.slice(0, 1));
  expect(nextStep(checklist, job.state(), mara.id)?.id).toBe(after[0]?.id);
});
