import { expect, test } from 'vitest';
import { generateChecklist } from '../../../shared/checklist/generate';
import { exampleInput } from '../../support/smallPanel';
import { completeJob } from '../../support/jobScenario';

const checklist = generateChecklist(exampleInput());

test('a job walked from start to end is countersigned', () => {
  const job = completeJob(checklist);
  const state = job.state();
  const refused = Object.values(state.steps)
    .flatMap(({ history }) => history)
    .filter((a) => a.verdict !== 'ok');
  expect(refused).toEqual([]);
  expect(state.status).toBe('countersigned');
});
