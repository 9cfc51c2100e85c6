/** Emergency stops and interlocks are proved before anything may be commanded. */
import { say } from '../../../panel/says';
import { choice } from '../../asks';
import type { Facts } from '../../facts';
import { makeStep } from '../../makeStep';
import { naturalCompare } from '../../naturalCompare';
import type { Step } from '../../types';

export const emergencyStops = ({ panel }: Facts): Step[] =>
  [...panel.stopControls]
    .sort((a, b) => naturalCompare(a.location, b.location) || naturalCompare(a.tag, b.tag))
    .map(({ tag, location, stop }) =>
      makeStep({
        id: `prove.stop.${tag}`,
        stage: 'prove-points',
        family: 'emergency-stops',
        title: say('checklist.prove.stop', { tag }),
        detail: [say('checklist.said', { words: stop }), say('checklist.at', { location })],
        ask: choice(['stop-acts'], ['stop-fails']),
        everyRound: true,
      }),
    );
