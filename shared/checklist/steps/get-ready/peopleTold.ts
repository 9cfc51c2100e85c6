/** Whoever loses power through this lock-out hears it before, one step for each that goes off. */
import { say } from '../../../panel/says';
import { done } from '../../asks';
import type { Facts, IsolatorFacts } from '../../facts';
import { makeStep } from '../../makeStep';
import { naturalCompare } from '../../naturalCompare';
import type { Step } from '../../types';

/** Every other thing that goes dead with these isolators, once, in reading order. */
export const toTell = (isolators: readonly IsolatorFacts[]): string[] =>
  [...new Set(isolators.flatMap(({ tell }) => tell))].sort(naturalCompare);

export const peopleTold = ({ isolators }: Facts): Step[] =>
  toTell(isolators).map((who) =>
    makeStep({
      id: `ready.tell.${who}`,
      stage: 'get-ready',
      family: 'people-told',
      title: say('checklist.ready.tell', { who }),
      detail: [
        say('checklist.ready.tell.by', {
          isolators: isolators
            .filter(({ tell }) => tell.includes(who))
            .map(({ isolator }) => isolator.tag)
            .join(', '),
        }),
      ],
      ask: done('checklist.answer.told'),
    }),
  );
