/** Nobody signs what they have not read: one step for each who worked, before the signature. */
import { say } from '../../../panel/says';
import { done } from '../../asks';
import { makeStep } from '../../makeStep';
import type { Step } from '../../types';

export const readSummary = (): Step[] => [
  makeStep({
    id: 'sign.read',
    stage: 'sign',
    family: 'read-summary',
    title: say('checklist.sign.read'),
    ask: done('checklist.answer.read'),
    by: 'each',
    everyRound: true,
  }),
];
