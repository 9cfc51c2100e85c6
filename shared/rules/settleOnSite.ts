/** The step that an accepted finding leaves behind: somebody looks at that place and writes down what is there. */
import type { StepSeed, Where } from './finding';

export const settleOnSite = (rule: string, where: Where): StepSeed[] => [
  { family: 'settle-doubt', where, params: { rule } },
];
