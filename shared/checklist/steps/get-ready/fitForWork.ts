/** Each person says for themselves that they are qualified and fit: nobody can say it for another. */
import { say } from '../../../panel/says';
import { choice } from '../../asks';
import { makeStep } from '../../makeStep';
import type { Step } from '../../types';

export const fitForWork = (): Step[] => [
  makeStep({
    id: 'ready.fit',
    stage: 'get-ready',
    family: 'fit-for-work',
    title: say('checklist.ready.fit'),
    ask: choice(['fit'], ['not-fit']),
    by: 'each',
  }),
];
