/** The small job on which the gates are tried, and short ways to bring it where a gate stands. */
import { generateChecklist } from '../../shared/checklist/generate';
import { gateFor } from '../../shared/job/gates';
import type { JobPerson } from '../../shared/job/types';
import { answerBody, answerWell, lockNumber, mara, newJob, people, type Job } from './jobScenario';
import { exampleInput } from './smallPanel';

export const checklist = generateChecklist({ ...exampleInput(), scope: ['DI3.02', 'DO4.01'] });
export const stepOf = (id: string) => {
  const step = checklist.steps.find((each) => each.id === id);
  if (!step) throw new Error(`no step ${id}`);
  return step;
};
export const codes = (job: Job, person: JobPerson, step: string): string[] => {
  const gate = gateFor(checklist, job.state(), person.id, step);
  return gate.open ? [] : gate.refusals.map(({ code }) => code);
};

/** Written down in order by one electrician, up to the first step whose id begins so. */
export function upTo(prefix: string, on: JobPerson[] = people): Job {
  const job = newJob(checklist, on);
  job.write(mara, 'accepted', {});
  const end = checklist.steps.findIndex(({ id }) => id.startsWith(prefix));
  for (const step of checklist.steps.slice(0, end)) answerWell(job, mara, step);
  return job;
}
export const answer = (job: Job, person: JobPerson, id: string) => answerWell(job, person, stepOf(id));
export const off = (job: Job, person: JobPerson, isolator: string) =>
  job.write(person, 'lock-off', { isolator, lock: lockNumber(person, isolator) });
export const read = (job: Job, id: string, value: number) =>
  job.write(mara, 'answer', answerBody(stepOf(id), { kind: 'reading', value }));

/** Proves the tester once more after the part of the first dead test. */
export const proveAfter = (job: Job) =>
  checklist.steps
    .filter(({ id, part }) => id.includes('.tester.after') && part === stepOf(deadTest).part)
    .filter(({ stage }) => stage === 'prove-dead')
    .map((step) => answerWell(job, mara, step));

/** Everything that a person answers alone before a step. */
export function prepare(job: Job, person: JobPerson, before: string): void {
  const end = checklist.steps.findIndex(({ id }) => id === before);
  for (const step of checklist.steps.slice(0, end))
    if (step.by === 'each' && step.ask.kind !== 'lock-off' && step.stage !== 'sign')
      answerWell(job, person, step);
}

export const terminals = checklist.steps.filter(
  ({ personal, where }) => personal && where?.point === 'DI3.02',
);
export const land = 'wire.DI3.02.land.signal';
export const deadTest = 'dead.S24.+-0 V.ac';
export const hold = (job: Job, step: string) =>
  job.write(mara, 'hold', { step, reason: 'not-safe', words: 'Not safe' });

export const reachLand = () => {
  const job = upTo('wire.');
  for (const step of checklist.steps.filter(({ id }) => id.startsWith('wire.group.G3')))
    answerWell(job, mara, step);
  for (const step of terminals) answerWell(job, mara, step);
  return job;
};
