/** What nobody could say at the desk is found out at the panel and written down. */
import { say } from '../../../panel/says';
import { written } from '../../asks';
import type { Facts } from '../../facts';
import { placeOf } from '../../stayingFindings';
import { makeStep } from '../../makeStep';
import type { Step } from '../../types';

type Seed = ReturnType<Facts['seeds']>[number];

const settled = ({ where, finding }: Seed): Step =>
  makeStep({
    id: `cold.settle.${finding.id}.${placeOf(where)}`,
    stage: 'check-cold',
    family: 'settle-doubt',
    title: say('checklist.cold.settle', { place: placeOf(where) }),
    detail: [finding.says],
    where,
    ask: written,
  });

const once = (steps: Step[]): Step[] => [...new Map(steps.map((step) => [step.id, step])).values()];

export const settlePointDoubt = (facts: Facts, address: string): Step[] =>
  once(
    facts
      .seeds('settle-doubt')
      .filter(({ where }) => where.point === address)
      .map(settled),
  );

/** Doubts about a supply, a group, a module, or a point beside the worked ones: once for the panel. */
export const settlePanelDoubt = (facts: Facts): Step[] =>
  once(
    facts
      .seeds('settle-doubt')
      .filter(({ where }) => where.point === undefined || !facts.worked(where.point))
      .map(settled),
  );
