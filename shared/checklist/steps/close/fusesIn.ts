/** Group fuses go back one by one, only after their supply has read right. */
import type { Group } from '../../../panel/panelSchema';
import { say } from '../../../panel/says';
import { choice } from '../../asks';
import { makeStep } from '../../makeStep';
import type { Stage, Step } from '../../types';

export const fusesIn = (groups: readonly Group[], stage: Stage): Step[] =>
  groups.flatMap(({ tag, fuse }) =>
    fuse
      ? [
          makeStep({
            id: `close.fuse.${tag}`,
            stage,
            family: 'fuses-in',
            title: say(fuse.kind === 'breaker' ? 'checklist.close.breaker' : 'checklist.close.fuse', {
              fuse: fuse.tag ?? tag,
              A: fuse.A,
              group: tag,
            }),
            where: { group: tag },
            ask: choice(['fuse-in'], ['fuse-out']),
            everyRound: true,
          }),
        ]
      : [],
  );
