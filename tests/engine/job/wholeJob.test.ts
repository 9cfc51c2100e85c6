import { describe, expect, test } from 'vitest';
import { generateChecklist } from '../../../shared/checklist/generate';
import { canCountersign } from '../../../shared/job/canCountersign';
import { canSign } from '../../../shared/job/canSign';
import { gateFor } from '../../../shared/job/gates';
import { jobSummary } from '../../../shared/job/jobSummary';
import { nextStep } from '../../../shared/job/next';
import type { Gate } from '../../../shared/job/types';
import { signatureDigest } from '../../../shared/job/signatureDigest';
import {
  answerBody,
  completeJob,
  countersign,
  jobUntil,
  lockNumber,
  mara,
  plainJob,
  sign,
  tomas,
  walk,
  type Job,
} from '../../support/jobScenario';
import { exampleInput } from '../../support/smallPanel';

const checklist = generateChecklist({ ...exampleInput(), scope: ['DI3.02', 'DO4.01'] });
const stepOf = (id: string) => {
  const step = checklist.steps.find((each) => each.id === id);
  if (!step) throw new Error(`no step ${id}`);
  return step;
};
const codes = (gate: Gate): string[] => (gate.open ? [] : gate.refusals.map(({ code }) => code));
const gate = (job: Job, step: string): string[] => codes(gateFor(checklist, job.state(), mara.id, step));
const badAnswers = (job: Job) =>
  Object.values(job.state().steps)
    .flatMap(({ history }) => history)
    .filter(({ verdict }) => verdict === 'refused');

const dead = 'dead.S24.+-0 V.ac';
const land = 'wire.DI3.02.land.signal';
const proved = 'prove.DI3.02.on';

describe('a whole job', () => {
  test('walked from start to end is countersigned, nothing refused', () => {
    const job = completeJob(checklist);
    expect(badAnswers(job)).toEqual([]);
    expect(job.state()).toMatchObject({ status: 'countersigned', contradictions: [], gaps: [], forks: [] });
    expect(nextStep(checklist, job.state(), mara.id)).toBeUndefined();
  });

  test('written straight down in the order of the checklist is as good', () => {
    const job = plainJob(checklist);
    expect(badAnswers(job)).toEqual([]);
    sign(job, mara);
    countersign(job, tomas);
    expect(job.state().status).toBe('countersigned');
  });

  test('with a live reading, a failing point, a second round, a return and a stale countersignature', () => {
    const job = jobUntil(checklist, 'prove-dead');
    expect(job.state().status).toBe('running');
    expect(gate(job, land)).toContain('order');

    // A live reading shuts everything until it is measured again.
    let live = false;
    walk(job, mara, undefined, (step) => {
      if (step.id !== dead || live) return false;
      job.write(mara, 'answer', answerBody(step, { kind: 'reading', value: -118 }));
      live = true;
      const state = job.state();
      expect(state.dangers).toEqual([dead]);
      expect(state.proofs[mara.id]?.holds).toBe(false);
      expect(gate(job, land)).toContain('danger');
      expect(nextStep(checklist, state, mara.id)?.id).toBe(dead);
      return true;
    });
    expect(live).toBe(true);
    expect(job.state().steps[dead]?.history.map(({ verdict }) => verdict)).toEqual(['out', 'ok']);

    // The walk ended at the signature; a foreman looks and finds a fault in the proving instead.
    expect(canSign(checklist, job.state(), mara.id).open).toBe(true);
    expect(gate(job, land)).toContain('isolation-over');

    // A fault found live: the point goes back through isolation in a round of its own.
    job.write(mara, 'answer', answerBody(stepOf(proved), { kind: 'choice', value: 'light-or-bit-off' }));
    expect(job.state().steps[proved]?.status).toBe('out');
    job.write(mara, 'round-started', { points: ['DI3.02'], reason: 'fault', words: 'Wire 1 is loose' });
    const second = job.state();
    expect(second.round).toMatchObject({ number: 2, points: ['DI3.02'] });
    expect(second.steps[land]?.status).toBe('open');
    expect(second.steps['wire.DO4.01.land.signal']?.status).toBe('done');
    expect(second.steps[dead]?.status).toBe('open');
    expect(gate(job, land)).toEqual(expect.arrayContaining(['order', 'own-locks']));
    walk(job, mara);
    expect(badAnswers(job)).toEqual([]);

    const signed = sign(job, mara);
    expect(job.state().status).toBe('signed');
    expect(codes(canCountersign(checklist, job.state(), mara.id))).toEqual(
      expect.arrayContaining(['not-foreman', 'took-part']),
    );

    // The return opens its step alone, in a new round, and the signature no longer stands.
    job.write(tomas, 'returned', { steps: [{ step: land, words: 'Ferrule too short' }] });
    const returned = job.state();
    expect(returned).toMatchObject({ status: 'returned', round: { number: 3 } });
    expect(returned.steps[land]).toMatchObject({ status: 'open', returned: { words: 'Ferrule too short' } });
    expect(returned.steps['wire.DI3.02.tug']?.status).toBe('done');
    expect(returned.signatures.find(({ entry }) => entry === signed.id)?.stands).toBe(false);
    walk(job, mara);
    sign(job, mara);
    expect(job.state().status).toBe('signed');

    // Something that was not reviewed makes the countersignature one of an earlier state.
    job.hear(job.device(tomas));
    const stale = job.state().heads;
    job.write(mara, 'drawing-differs', { says: 'Terminal 2 is labelled 3' });
    job.writeDeaf(job.device(tomas), 'countersigned', countersignBody(stale));
    expect(job.state()).toMatchObject({ status: 'signed', countersign: { stands: false } });
    countersign(job, tomas);
    expect(job.state()).toMatchObject({ status: 'countersigned', countersign: { stands: true } });

    const summary = jobSummary(checklist, job.state());
    expect(summary.outOfLimits.map(({ step, status }) => [step, status])).toEqual([
      [dead, 'done'],
      [proved, 'done'],
    ]);
    expect(summary.rounds).toHaveLength(2);
    expect(summary.locks.every(({ offAt }) => offAt !== undefined)).toBe(true);
  });
});

const countersignBody = (heads: Record<string, number>) => ({
  name: tomas.name,
  zone: 'UTC',
  meaning: 'I reviewed this work and accept it',
  digest: 'e'.repeat(64),
  language: 'en' as const,
  picture: { typed: tomas.name },
  heads,
});

describe('the digest of a signature', () => {
  const job = jobUntil(checklist, 'wire');
  const pack = { digest: job.pack, job: { id: job.id, site: { id: 'site' } }, checklist };
  const digest = (language = 'en') => signatureDigest({ pack, state: job.state(), language });

  test('changes with the language and with every entry', () => {
    const before = digest();
    expect(digest()).toBe(before);
    expect(digest('es')).not.toBe(before);
    job.write(mara, 'note', { words: 'Rain' });
    expect(digest()).not.toBe(before);
  });

  test('locks are named by their own numbers', () => {
    expect(job.state().locks.map(({ lock }) => lock)).toEqual(
      checklist.isolators.map((isolator) => lockNumber(mara, isolator)),
    );
  });
});
