import { describe, expect, test } from 'vitest';
import { checklist, stepOf, codes, answer, prepare, land, reachLand } from '../../support/gateJobs';
import {
  answerBody,
  answerWell,
  goodValue,
  ilya,
  mara,
  people,
  plainJob,
  tomas,
} from '../../support/jobScenario';

describe('two answers', () => {
  const concurrent = (id: string, values: [number | string, number | string]) => {
    const job = id.startsWith('prove') ? plainJob(checklist, people) : reachLand();
    if (id.startsWith('prove'))
      for (const each of ['ready', 'prove.rule'])
        for (const step of checklist.steps.filter((one) => one.by === 'each' && one.id.startsWith(each)))
          answerWell(job, ilya, step);
    else prepare(job, ilya, id);
    for (const each of [mara, ilya]) job.hear(job.device(each));
    const step = stepOf(id);
    const value = (given: number | string) =>
      typeof given === 'number'
        ? ({ kind: 'reading', value: given } as const)
        : ({ kind: 'choice', value: given } as const);
    const entries = [mara, ilya].map((person, index) =>
      job.writeDeaf(job.device(person), 'answer', answerBody(step, value(values[index] ?? 0))),
    );
    return { job, entries };
  };

  test('the same answer twice is one', () => {
    const { job } = concurrent('prove.DI3.02.on', ['light-and-bit-on', 'light-and-bit-on']);
    expect(job.state().steps['prove.DI3.02.on']?.status).toBe('done');
  });

  test('elsewhere than in proving dead the foreman chooses, having seen both', () => {
    const { job, entries } = concurrent('prove.DI3.02.on', ['light-and-bit-on', 'light-or-bit-off']);
    expect(job.state().steps['prove.DI3.02.on']?.status).toBe('two-answers');
    job.write(mara, 'chosen', { step: 'prove.DI3.02.on', entry: entries[0]?.id ?? '', words: 'Mine' });
    expect(job.state().steps['prove.DI3.02.on']?.status).toBe('two-answers');
    job.write(tomas, 'chosen', { step: 'prove.DI3.02.on', entry: entries[1]?.id ?? '', words: 'I saw it' });
    expect(job.state().steps['prove.DI3.02.on']?.status).toBe('out');
    expect(job.state().tookPart).not.toContain(tomas.id);
  });

  test('in isolating the worse counts, and nobody may choose', () => {
    const { job, entries } = concurrent('isolate.Q1.try', ['handle-holds', 'handle-moves']);
    expect(job.state().steps['isolate.Q1.try']?.status).toBe('out');
    job.write(tomas, 'chosen', { step: 'isolate.Q1.try', entry: entries[0]?.id ?? '', words: 'It holds' });
    expect(job.state().steps['isolate.Q1.try']?.status).toBe('out');
    expect(codes(job, mara, land)).toContain('order');
    answer(job, mara, 'isolate.Q1.try');
    expect(job.state().steps['isolate.Q1.try']?.status).toBe('done');
    expect(goodValue(stepOf('isolate.Q1.try').ask)).toEqual({ kind: 'choice', value: 'handle-holds' });
  });
});
