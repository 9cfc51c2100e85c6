/** Loads are stopped by their own controls, so that no isolator has to break a running motor. */
import { say } from '../../../panel/says';
import { choice } from '../../asks';
import type { Facts } from '../../facts';
import { makeStep } from '../../makeStep';
import { naturalCompare } from '../../naturalCompare';
import type { Step } from '../../types';

export const stopLoads = ({ panel }: Facts): Step[] =>
  [...panel.stopControls]
    .sort((a, b) => naturalCompare(a.location, b.location) || naturalCompare(a.tag, b.tag))
    .map(({ tag, location, stop }) =>
      makeStep({
        id: `isolate.stop.${tag}`,
        stage: 'isolate',
        family: 'stop-loads',
        title: say('checklist.isolate.stop', { tag }),
        detail: [say('checklist.said', { words: stop }), say('checklist.at', { location })],
        ask: choice(['standing-still'], ['still-turning']),
      }),
    );
