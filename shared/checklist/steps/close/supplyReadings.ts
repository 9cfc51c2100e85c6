/** Every supply that was made dead is read when it is back, before a fuse lets it on to the field. */
import type { Supply } from '../../../panel/panelSchema';
import { say } from '../../../panel/says';
import type { Facts } from '../../facts';
import { liveMeasuring } from '../../liveSignal';
import { makeStep } from '../../makeStep';
import { supplyLimits } from '../../supplyLimits';
import type { Stage, Step } from '../../types';

/** The pairs between poles; to neutral too where three phases carry one. */
function polePairs({ terminals }: Supply): { a: string; b: string; name: string }[] {
  if ('plus' in terminals) return [{ a: terminals.plus, b: terminals.minus, name: '+-0 V' }];
  if ('L' in terminals) return [{ a: terminals.L, b: terminals.N, name: 'L-N' }];
  const { L1, L2 } = terminals;
  const lines = [{ a: L1, b: L2, name: 'L1-L2' }];
  if (!('L3' in terminals)) return lines;
  return [...lines, { a: L2, b: terminals.L3, name: 'L2-L3' }, { a: L1, b: terminals.L3, name: 'L1-L3' }];
}

export const supplyReadings = (_facts: Facts, supplies: readonly Supply[], stage: Stage): Step[] =>
  supplies.flatMap((supply) =>
    polePairs(supply).map(({ a, b, name }) => {
      const limits = supplyLimits(supply);
      return makeStep({
        id: `close.supply.${supply.tag}.${name}`,
        stage,
        family: 'supply-readings',
        title: say('checklist.close.supply', { supply: supply.tag, a, b }),
        detail: limits ? [] : [say('checklist.close.supply.no-limits')],
        warnings: liveMeasuring(supply),
        where: { supply: supply.tag, terminal: a },
        ask: {
          kind: 'reading',
          unit: supply.kind === 'dc' ? 'V DC' : 'V AC',
          ...(limits ?? {}),
        },
        everyRound: true,
      });
    }),
  );
