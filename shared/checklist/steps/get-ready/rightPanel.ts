/** The person stands at the panel the job is for, with its drawing in hand. */
import { say } from '../../../panel/says';
import { choice } from '../../asks';
import type { Facts } from '../../facts';
import { makeStep } from '../../makeStep';
import type { Step } from '../../types';

export function rightPanel({ panel }: Facts): Step[] {
  const { tag, location, drawing } = panel;
  return [
    makeStep({
      id: 'ready.panel',
      stage: 'get-ready',
      family: 'right-panel',
      title: say('checklist.ready.panel', { panel: tag }),
      detail: [say('checklist.ready.panel.where', { location })],
      ask: { kind: 'scan', expect: tag },
    }),
    makeStep({
      id: 'ready.drawing',
      stage: 'get-ready',
      family: 'right-panel',
      title: say('checklist.ready.drawing', { number: drawing.number }),
      ask: choice(['drawing-same'], ['drawing-other'], { revision: drawing.revision }),
    }),
  ];
}
