/** A screen is earthed where the panel file says: at one end, else it carries current instead of stopping noise. */
import { say } from '../../../panel/says';
import { choice } from '../../asks';
import type { Facts, PointFacts } from '../../facts';
import { makeStep } from '../../makeStep';
import type { Step } from '../../types';
import { conductorsOf } from './conductorsOf';

export function screenEarth({ panel }: Facts, { point }: PointFacts): Step[] {
  const { address, cable } = point;
  const screen = conductorsOf(point).find(({ role }) => role === 'screen');
  if (!cable?.screened && !screen) return [];
  // Not stated: the panel end, as for low-frequency signals (reference §9.3).
  const end = cable?.screenEarthed ?? 'panel';
  return [
    makeStep({
      id: `wire.${address}.screen`,
      stage: 'wire',
      family: 'screen-earth',
      title: say(`checklist.wire.screen.${end}`, {
        cable: cable?.tag ?? point.wire,
        terminal: screen?.terminal ?? panel.earthTerminal,
      }),
      where: { point: address, terminal: screen?.terminal ?? panel.earthTerminal },
      ask: choice(['screen-right'], ['screen-wrong']),
      picture: { kind: 'loop', point: address, mark: 'screen' },
    }),
  ];
}
