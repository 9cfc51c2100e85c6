/** What moves comes back last, with an all-clear of its own and a last look at it moving. */
import { say } from '../../../panel/says';
import { choice, written } from '../../asks';
import { deviceName, moves } from '../../device';
import type { Facts, PointFacts } from '../../facts';
import { makeStep } from '../../makeStep';
import type { Step } from '../../types';

const common = { stage: 'restore-motion', family: 'restore-motion', everyRound: true } as const;

export const allClear = ({ panel, isolators }: Facts): Step[] =>
  isolators.some(({ restoredIn }) => restoredIn === 'restore-motion')
    ? [
        makeStep({
          ...common,
          id: 'motion.clear',
          title: say('checklist.motion.clear', { panel: panel.tag }),
          warnings: [{ signal: 'danger', says: say('checklist.warning.motion') }],
          ask: choice(['everyone-clear'], ['someone-near']),
        }),
      ]
    : [];

/** Air or oil is let back in and looked at, source by source. */
export const energyBack = ({ plan }: Facts): Step[] =>
  plan.otherEnergy.map(({ tag, kind }) =>
    makeStep({
      ...common,
      id: `motion.energy.${tag}`,
      title: say('checklist.motion.energy', { tag, what: say(`checklist.energy.${kind}`) }),
      where: { source: tag },
      ask: choice(['no-leak'], ['leak']),
    }),
  );

const watched = (worked: PointFacts): Step =>
  makeStep({
    ...common,
    everyRound: false,
    id: `motion.${worked.point.address}`,
    title: say('checklist.motion.point', { device: deviceName(worked), address: worked.point.address }),
    warnings: [
      { signal: 'warning', says: say('checklist.warning.movement', { device: deviceName(worked) }) },
    ],
    where: { point: worked.point.address },
    ask: choice(['moves-right'], ['moves-wrong']),
  });

export const finalProof = ({ points }: Facts): Step[] =>
  points.filter((worked) => worked.module.io.kind === 'digital-output' && moves(worked)).map(watched);

/** The panel goes back to whoever runs it: the stage ends with a name even where nothing moves. */
export const handBack = ({ panel }: Facts): Step[] => [
  makeStep({
    ...common,
    id: 'motion.handback',
    title: say('checklist.motion.handback', { panel: panel.tag }),
    ask: written,
  }),
];
