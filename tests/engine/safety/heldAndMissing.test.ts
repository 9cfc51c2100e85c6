/** What a foreman cannot decide away, and a clear after which something of that person is missing. */
import { beforeAll, expect, test } from 'vitest';
import { generateChecklist } from '../../../shared/checklist/generate';
import { gateFor } from '../../../shared/job/gates';
import { answerWell, mara, newJob, sayClear, tomas, type Job } from '../../support/jobScenario';
import { exampleInput } from '../../support/smallPanel';

const checklist = generateChecklist({ ...exampleInput(), scope: ['DI3.02'] });
const close = checklist.steps.findIndex(({ ask }) => ask.kind === 'close');
let job: Job;
beforeAll(() => {
  job = newJob(checklist, [mara, tomas]);
  job.write(mara, 'accepted', {});
});

test.each(checklist.steps.filter(({ ask }) => ['scan', 'instrument', 'close'].includes(ask.kind)))(
  'a hold on $id is never accepted',
  ({ id }) => {
    const held = job.copy();
    const hold = held.write(mara, 'hold', { step: id, reason: 'other', words: 'Cannot' });
    held.write(tomas, 'hold-decided', { hold: hold.id, decision: 'accept', words: 'Go on' });
    expect(held.state().steps[id]?.status).toBe('held');
  },
);

test('a clear does not count while a later entry of theirs is named and held nowhere', () => {
  const done = job.copy();
  const stops = checklist.steps[close];
  for (const step of checklist.steps.slice(0, close)) answerWell(done, mara, step);
  sayClear(done);
  const gate = () => gateFor(checklist, done.state(), mara.id, stops?.id ?? '');
  const isRefused = () => {
    const now = gate();
    return !now.open && now.refusals.some(({ code }) => code === 'not-clear');
  };
  expect(isRefused()).toBe(false);
  const missing = done.write(mara, 'lock-on', { isolator: 'Q1', lock: '99' });
  done.write(tomas, 'note', { words: 'Heard of it' });
  done.entries.splice(done.entries.indexOf(missing), 1);
  expect(isRefused()).toBe(true);
});
