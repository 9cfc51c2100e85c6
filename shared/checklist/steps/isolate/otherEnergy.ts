/** Air, oil, height, springs, heat: shut off and locked like the rest, then let out and proven gone. */
import type { Source } from '../../../panel/panelSchema';
import { say } from '../../../panel/says';
import { choice } from '../../asks';
import { makeStep } from '../../makeStep';
import type { Step } from '../../types';

export function otherEnergy({ tag, kind, location, dissipate, verify }: Source): Step[] {
  const common = { stage: 'isolate', family: 'other-energy', where: { source: tag } } as const;
  const what = say(`checklist.energy.${kind}`);
  return [
    makeStep({
      ...common,
      id: `isolate.energy.${tag}.release`,
      title: say('checklist.isolate.release', { tag, what }),
      detail: [
        dissipate ? say('checklist.said', { words: dissipate }) : say('checklist.isolate.release.unknown'),
        say('checklist.at', { location }),
      ],
      warnings: [{ signal: 'warning', says: say('checklist.warning.stored-energy', { what }) }],
      ask: choice(['energy-released'], ['energy-not-released']),
    }),
    makeStep({
      ...common,
      id: `isolate.energy.${tag}.verify`,
      title: say('checklist.isolate.verify', { tag, what }),
      detail: [verify ? say('checklist.said', { words: verify }) : say('checklist.isolate.verify.unknown')],
      ask: choice(['energy-gone'], ['energy-there']),
    }),
  ];
}
