/** Each person takes off their own lock and tag; nobody else's. */
import { say } from '../../../panel/says';
import type { IsolatorFacts } from '../../facts';
import { makeStep } from '../../makeStep';
import type { Stage, Step } from '../../types';

/** Used in Locks off, and in Restore motion for what stays locked until the points are proved. */
export const lockOff = ({ isolator }: IsolatorFacts, stage: Stage): Step =>
  makeStep({
    id: `off.${isolator.tag}`,
    stage,
    family: 'lock-off',
    title: say(isolator.lock === 'cannot-lock' ? 'checklist.off.tag-only' : 'checklist.off', {
      tag: isolator.tag,
    }),
    detail: [say('checklist.at', { location: isolator.location })],
    where: { isolator: isolator.tag },
    ask: { kind: 'lock-off', isolator: isolator.tag },
    by: 'each',
    everyRound: true,
  });
