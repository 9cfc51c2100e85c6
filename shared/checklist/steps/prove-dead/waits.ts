/** Stored charge is given its time before anybody comes near: a clock where it is known, a measurement where it is not. */
import type { Wait } from '../../../isolation/types';
import { say } from '../../../panel/says';
import type { Facts } from '../../facts';
import { makeStep } from '../../makeStep';
import { naturalCompare } from '../../naturalCompare';
import type { Step, Warning } from '../../types';

// From here a charged bank can burn (our own limit, no source): about 10 mF at 24 V.
const burnsFromUF = 10_000;

function burnWarning({ panel }: Facts, tag: string): Warning[] {
  const bulk = panel.supplies.find((supply) => supply.tag === tag)?.bulk;
  return bulk !== undefined && bulk !== 'none' && bulk.uF >= burnsFromUF
    ? [{ signal: 'warning', says: say('checklist.warning.charged-bank', { supply: tag }) }]
    : [];
}

/** The longest of the known times, in whole seconds; null when nobody stated or computed one. */
export function secondsToWait({ t60S, t1S, statedS }: Wait): number | null {
  const known = [t60S, t1S, statedS].filter((time) => time !== null && time !== undefined);
  return known.length > 0 ? Math.ceil(Math.max(...known)) : null;
}

export const waits = (facts: Facts): Step[] =>
  [...facts.waits]
    .sort((a, b) => naturalCompare(a.supply, b.supply))
    .flatMap((wait) => {
      const seconds = secondsToWait(wait);
      if (seconds === 0) return [];
      const { supply } = wait;
      const common = { stage: 'prove-dead', family: 'waits', where: { supply } } as const;
      return seconds === null
        ? [
            makeStep({
              ...common,
              id: `dead.stored.${supply}`,
              title: say('checklist.dead.stored', { supply }),
              detail: [say('checklist.dead.stored.unknown')],
              warnings: [
                { signal: 'warning', says: say('checklist.warning.stored-charge', { supply }) },
                ...burnWarning(facts, supply),
              ],
              ask: {
                kind: 'reading',
                unit: 'V DC',
                low: -facts.settings.deadLimitV,
                high: facts.settings.deadLimitV,
                why: say('checklist.why.stored-unknown', { supply }),
              },
              by: 'each',
            }),
          ]
        : [
            makeStep({
              ...common,
              id: `dead.wait.${supply}`,
              title: say('checklist.dead.wait', { supply, seconds }),
              warnings: burnWarning(facts, supply),
              ask: { kind: 'wait', seconds },
            }),
          ];
    });
