/** What the checks found and somebody accepted, or only tells: each is read before the door is opened. */
import { say } from '../../../panel/says';
import { done } from '../../asks';
import type { Facts } from '../../facts';
import { placeOf } from '../../stayingFindings';
import { makeStep } from '../../makeStep';
import type { Step } from '../../types';

export const findingsThatStay = ({ stays }: Facts): Step[] =>
  stays.map((finding) =>
    makeStep({
      id: `ready.stays.${finding.id}`,
      stage: 'get-ready',
      family: 'findings-that-stay',
      title: say('checklist.ready.stays', { place: placeOf(finding.where) }),
      detail: [finding.says, ...(finding.remedy ? [finding.remedy.says] : [])],
      where: finding.where,
      ask: done('checklist.answer.read'),
    }),
  );
