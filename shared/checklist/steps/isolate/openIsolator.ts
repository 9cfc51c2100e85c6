/** One isolator: tell, unload, open, lock, tag, try its handle. */
import { say } from '../../../panel/says';
import { choice, done } from '../../asks';
import type { IsolatorFacts } from '../../facts';
import { makeStep } from '../../makeStep';
import type { Step, Warning } from '../../types';

const common = (tag: string) =>
  ({
    stage: 'isolate',
    family: 'open-isolator',
    where: { isolator: tag },
    picture: { kind: 'energy' },
  }) as const;

function beforeIt({ isolator, tell, currentMustBeZero }: IsolatorFacts): Step[] {
  const { tag } = isolator;
  const told = makeStep({
    ...common(tag),
    id: `isolate.${tag}.tell`,
    title: say('checklist.isolate.tell', { tag }),
    detail: tell.map((who) => say('checklist.isolate.tell.who', { who })),
    ask: done('checklist.answer.told'),
  });
  const unloaded = makeStep({
    ...common(tag),
    id: `isolate.${tag}.load`,
    title: say('checklist.isolate.load', { tag }),
    warnings: [{ signal: 'danger', says: say('checklist.warning.no-load-break', { tag }) }],
    ask: { kind: 'reading', unit: 'A', low: 0, high: 0, why: say('checklist.why.no-load-break', { tag }) },
  });
  return [...(tell.length > 0 ? [told] : []), ...(currentMustBeZero ? [unloaded] : [])];
}

const arc = (holds: boolean): Warning[] =>
  holds ? [] : [{ signal: 'warning', says: say('checklist.warning.stand-aside') }];

function opened({ isolator, holds }: IsolatorFacts): Step {
  const { tag, location, inSight } = isolator;
  return makeStep({
    ...common(tag),
    id: `isolate.${tag}.open`,
    title: say(holds ? 'checklist.isolate.shut-off' : 'checklist.isolate.open', { tag }),
    detail: [
      say('checklist.at', { location }),
      ...(inSight ? [] : [say('checklist.isolate.not-in-sight', { tag })]),
    ],
    warnings: arc(holds !== undefined),
    ask: choice(['handle-off'], ['handle-not-off']),
  });
}

function lockedAndTagged({ isolator }: IsolatorFacts): Step[] {
  const { tag, lock, lockDevice } = isolator;
  const tagOnly = lock === 'cannot-lock';
  const device = lockDevice ?? say('checklist.isolate.lock.some-device');
  return [
    makeStep({
      ...common(tag),
      id: `isolate.${tag}.lock`,
      title: say(tagOnly ? 'checklist.isolate.lock.tag-only' : 'checklist.isolate.lock', { tag }),
      detail: lock === 'device-needed' ? [say('checklist.isolate.lock.device', { device })] : [],
      ask: { kind: 'lock-on', isolator: tag },
      by: 'each',
    }),
    makeStep({
      ...common(tag),
      id: `isolate.${tag}.tag`,
      title: say(tagOnly ? 'checklist.isolate.tag.filled' : 'checklist.isolate.tag', { tag }),
      ask: choice(['tag-says-all'], ['tag-missing']),
      by: 'each',
    }),
  ];
}

function afterIt({ isolator, extraMeasure }: IsolatorFacts): Step[] {
  const { tag } = isolator;
  const extra = makeStep({
    ...common(tag),
    id: `isolate.${tag}.extra`,
    title: say('checklist.isolate.extra', { tag }),
    warnings: [{ signal: 'warning', says: say('checklist.warning.tag-only', { tag }) }],
    ask: choice(['extra-fuse-out', 'extra-second-device', 'extra-blocked'], ['extra-none']),
  });
  const tried = makeStep({
    ...common(tag),
    id: `isolate.${tag}.try`,
    title: say('checklist.isolate.try', { tag }),
    ask: choice(['handle-holds'], ['handle-moves']),
  });
  return [...(extraMeasure ? [extra] : []), tried];
}

export const openIsolator = (facts: IsolatorFacts): Step[] => [
  ...beforeIt(facts),
  opened(facts),
  ...lockedAndTagged(facts),
  ...afterIt(facts),
];
