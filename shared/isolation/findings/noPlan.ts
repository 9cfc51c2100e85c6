/** No set of isolators makes the scope safe. */
import { say } from '../../panel/says';
import { node } from '../graphEdge';
import { stillWorked } from '../lockPlan';
import { reach } from '../reach';
import { workedTerminals } from '../workedTerminals';
import type { IsolationCheck } from './context';

/** Names no place of its own, so that it stops every job on the scope. */
export const noPlan: IsolationCheck = ({ panel, scope, plan }) => {
  if (plan !== null) return [];
  const allOpen = reach(panel, new Set(panel.isolators.map((one) => one.tag)));
  const worked = workedTerminals(panel, scope);
  const left = stillWorked(allOpen, worked);
  const place = left[0] ?? '';
  const live =
    allOpen.terminals.get(place) ??
    allOpen.supplies.get(place) ??
    allOpen.groups.get(place) ??
    allOpen.places.get(node.incoming(place));
  return [
    {
      rule: 'isolation.none',
      harm: 'hurts',
      where: {},
      says: say('isolation.none', { place, places: left.length, path: (live?.path ?? []).join(' → ') }),
      because: [
        { name: 'isolation.quantity.volts', value: live?.V ?? 0, unit: 'V', basis: 'supplies.V, sources.V' },
      ],
      remedy: { says: say('isolation.remedy.none') },
    },
  ];
};
