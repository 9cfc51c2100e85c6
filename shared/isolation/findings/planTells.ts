/** What people must know about the isolators of the plan. */
import { say } from '../../panel/says';
import type { PlannedIsolator } from '../types';
import type { IsolationCheck } from './context';

const tells =
  (rule: string, applies: (planned: PlannedIsolator) => boolean): IsolationCheck =>
  ({ plan }) =>
    (plan?.isolators ?? []).filter(applies).map(({ isolator }) => ({
      rule,
      harm: 'tells',
      where: { isolator: isolator.tag },
      says: say(rule, { isolator: isolator.tag, location: isolator.location }),
      because: [],
    }));

export const cannotLock = tells('isolation.single-point-cannot-lock', ({ extraMeasure }) => extraMeasure);
export const notInSight = tells('isolation.not-in-sight', ({ isolator }) => !isolator.inSight);
export const noLoadBreak = tells('isolation.no-load-break', ({ currentMustBeZero }) => currentMustBeZero);
