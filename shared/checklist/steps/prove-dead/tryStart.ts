/** The last proof: ask the machine to start. It must not. Then everything goes back to off. */
import type { Panel } from '../../../panel/panelSchema';
import { say } from '../../../panel/says';
import { choice } from '../../asks';
import type { Facts } from '../../facts';
import { makeStep } from '../../makeStep';
import { naturalCompare } from '../../naturalCompare';
import type { Step } from '../../types';

const common = { stage: 'prove-dead', family: 'try-start' } as const;

const byControl = ({ tag, location, start, beforeTry }: Panel['stopControls'][number]): Step[] => [
  ...(beforeTry
    ? [
        makeStep({
          ...common,
          id: `dead.try.${tag}.reset`,
          title: say('checklist.dead.try.reset', { tag }),
          detail: [say('checklist.said', { words: beforeTry })],
          ask: choice(['stops-reset'], ['stops-not-reset']),
        }),
      ]
    : []),
  makeStep({
    ...common,
    id: `dead.try.${tag}`,
    title: say('checklist.dead.try', { tag }),
    detail: [say('checklist.said', { words: start }), say('checklist.at', { location })],
    warnings: [{ signal: 'warning', says: say('checklist.warning.try-start') }],
    ask: choice(['nothing-started'], ['something-started']),
  }),
  makeStep({
    ...common,
    id: `dead.try.${tag}.off`,
    title: say('checklist.dead.try.off', { tag }),
    ask: choice(['back-to-off'], ['not-back-to-off']),
  }),
];

const withoutControl = (panel: string): Step =>
  makeStep({
    ...common,
    id: 'dead.try',
    title: say('checklist.dead.try.any', { panel }),
    warnings: [{ signal: 'warning', says: say('checklist.warning.try-start') }],
    ask: choice(['nothing-started'], ['something-started']),
  });

export const tryStart = ({ panel }: Facts): Step[] =>
  panel.stopControls.length === 0
    ? [withoutControl(panel.tag)]
    : [...panel.stopControls].sort((a, b) => naturalCompare(a.tag, b.tag)).flatMap(byControl);
