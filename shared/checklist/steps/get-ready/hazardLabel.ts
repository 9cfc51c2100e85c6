/** The arc-flash and shock label decides the protective clothing, not the voltage; without one the employer does. */
import type { Source } from '../../../panel/panelSchema';
import { say, type Text } from '../../../panel/says';
import { choice, written } from '../../asks';
import type { Facts } from '../../facts';
import { makeStep } from '../../makeStep';
import { naturalCompare } from '../../naturalCompare';
import type { Step } from '../../types';

function labelOf({ tag, arcFlash }: Source): Text[] {
  if (!arcFlash) return [];
  const { calPerCm2, category, boundaryM } = arcFlash;
  return [
    ...(calPerCm2 === undefined
      ? []
      : [say('checklist.ready.label.energy', { source: tag, cal: calPerCm2 })]),
    ...(category === undefined ? [] : [say('checklist.ready.label.category', { source: tag, category })]),
    ...(boundaryM === undefined
      ? []
      : [say('checklist.ready.label.boundary', { source: tag, m: boundaryM })]),
  ];
}

export function hazardLabel({ panel }: Facts): Step[] {
  const sources = [...panel.sources].sort((a, b) => naturalCompare(a.tag, b.tag));
  return [
    makeStep({
      id: 'ready.label',
      stage: 'get-ready',
      family: 'hazard-label',
      title: say('checklist.ready.label'),
      detail: [say('checklist.ready.label.rule'), ...sources.flatMap(labelOf)],
      ask: choice(['label-read', 'label-none-decided'], ['label-none']),
    }),
    makeStep({
      id: 'ready.ppe',
      stage: 'get-ready',
      family: 'hazard-label',
      title: say('checklist.ready.ppe'),
      ask: written,
    }),
  ];
}
