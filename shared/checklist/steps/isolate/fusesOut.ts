/** The fuse of each worked group comes out: the last gap between a supply and the terminals. */
import { say } from '../../../panel/says';
import { choice } from '../../asks';
import type { Facts } from '../../facts';
import { makeStep } from '../../makeStep';
import type { Step } from '../../types';

export const fusesOut = ({ groups }: Facts): Step[] =>
  groups.flatMap(({ tag, fuse }) =>
    fuse
      ? [
          makeStep({
            id: `isolate.fuse.${tag}`,
            stage: 'isolate',
            family: 'fuses-out',
            title: say(fuse.kind === 'breaker' ? 'checklist.isolate.breaker-off' : 'checklist.isolate.fuse', {
              fuse: fuse.tag ?? tag,
              group: tag,
            }),
            where: { group: tag },
            ask: choice(['fuse-out'], ['fuse-in']),
          }),
        ]
      : [],
  );
