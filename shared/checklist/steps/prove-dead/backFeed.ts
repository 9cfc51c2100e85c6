/** Where voltage could come back through a load, a contact or induction: earth and short, or cover. */
import { say } from '../../../panel/says';
import { choice } from '../../asks';
import type { Facts } from '../../facts';
import { makeStep } from '../../makeStep';
import type { Step } from '../../types';
import { hasForeignVoltage } from '../wire/readInWire';

export const backFeed = ({ points }: Facts): Step[] =>
  points
    .filter(({ point }) => hasForeignVoltage(point))
    .map(({ point: { address, terminal } }) =>
      makeStep({
        id: `dead.backfeed.${address}`,
        stage: 'prove-dead',
        family: 'back-feed',
        title: say('checklist.dead.backfeed', { terminal }),
        detail: [say('checklist.dead.backfeed.log')],
        warnings: [{ signal: 'warning', says: say('checklist.warning.back-feed', { terminal }) }],
        where: { point: address, terminal },
        ask: choice(['earthed-and-shorted', 'covered'], ['not-earthed']),
      }),
    );
