/** Until it is proven dead it is live: what everybody does before the first handle moves. */
import type { StillLive } from '../../../isolation/types';
import { say, type Text } from '../../../panel/says';
import { choice, done } from '../../asks';
import type { Facts } from '../../facts';
import { makeStep } from '../../makeStep';
import { naturalCompare } from '../../naturalCompare';
import type { Step } from '../../types';

function bySupply(stillLive: readonly StillLive[]): Text[] {
  const counted = new Map<string, { V: number; places: number }>();
  for (const { supply, incomingOf, V } of stillLive) {
    const name = supply ?? incomingOf ?? '';
    const known = counted.get(name) ?? { V, places: 0 };
    counted.set(name, { V: Math.max(known.V, V), places: known.places + 1 });
  }
  return [...counted]
    .sort(([a], [b]) => naturalCompare(a, b))
    .map(([name, { V, places }]) => say('checklist.isolate.still-live.supply', { name, V, places }));
}

function stillLiveList({ panel, stillLive }: Facts): Step[] {
  if (stillLive.length === 0) return [];
  return [
    makeStep({
      id: 'isolate.still-live',
      stage: 'isolate',
      family: 'before-opening',
      title:
        panel.disconnect === null
          ? say('checklist.isolate.still-live.no-disconnect', { places: stillLive.length })
          : say('checklist.isolate.still-live', { disconnect: panel.disconnect, places: stillLive.length }),
      detail: bySupply(stillLive),
      ask: done('checklist.answer.read'),
      picture: { kind: 'energy' },
    }),
  ];
}

export function beforeOpening(facts: Facts): Step[] {
  const each = { stage: 'isolate', family: 'before-opening', by: 'each' } as const;
  return [
    makeStep({
      ...each,
      id: 'isolate.live',
      title: say('checklist.isolate.live'),
      warnings: [{ signal: 'danger', says: say('checklist.warning.live-until-proven') }],
      ask: done('checklist.answer.read'),
    }),
    makeStep({
      ...each,
      id: 'isolate.ppe',
      title: say('checklist.isolate.ppe'),
      ask: choice(['ppe-on'], ['ppe-missing']),
    }),
    ...stillLiveList(facts),
    makeStep({
      id: 'isolate.controller',
      stage: 'isolate',
      family: 'before-opening',
      title: say('checklist.isolate.controller'),
      ask: choice(['controller-stop'], ['controller-run']),
    }),
  ];
}
