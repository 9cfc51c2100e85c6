/** The panel as a whole before it is closed: nothing loose, nothing left out of its terminal. */
import { say } from '../../../panel/says';
import { choice } from '../../asks';
import type { Facts } from '../../facts';
import { makeStep } from '../../makeStep';
import type { Step } from '../../types';

export function panelCold({ panel, modules }: Facts): Step[] {
  const common = { stage: 'check-cold', family: 'panel-cold' } as const;
  return [
    ...modules.map(({ tag }) =>
      makeStep({
        ...common,
        id: `cold.module.${tag}.strands`,
        title: say('checklist.cold.strands', { module: tag }),
        where: { module: tag },
        ask: choice(['no-strands'], ['strands']),
      }),
    ),
    makeStep({
      ...common,
      id: 'cold.panel.earth',
      title: say('checklist.cold.panel-earth', { earth: panel.earthTerminal, panel: panel.tag }),
      where: { terminal: panel.earthTerminal },
      ask: choice(['earth-tight'], ['earth-loose']),
    }),
  ];
}
