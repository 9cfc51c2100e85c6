/** Two panels of a site that describe one outside device differently. */
import type { Isolator, Panel } from '../../panel/panelSchema';
import { say } from '../../panel/says';
import type { Finding } from '../../rules/finding';

// What a device is, whichever panel looks at it. In sight, and what it also feeds, depend on who looks.
const itself = ({ kind, location, opens, loadBreak, suitableForIsolation, lock }: Isolator): string =>
  JSON.stringify({ kind, location, opens, loadBreak, suitableForIsolation, lock });

/** Devices inside an enclosure are named anew in every panel; only those outside are compared. */
export const sameTagDiffers = (panel: Panel, others: readonly Panel[]): Finding[] =>
  panel.isolators
    .filter((isolator) => !isolator.inPanel)
    .flatMap((isolator) =>
      others
        .filter((other) =>
          other.isolators.some(
            (one) => one.tag === isolator.tag && !one.inPanel && itself(one) !== itself(isolator),
          ),
        )
        .map((other) => ({
          rule: 'isolation.same-tag-differs',
          harm: 'tells',
          where: { isolator: isolator.tag },
          says: say('isolation.same-tag-differs', { isolator: isolator.tag, panel: other.tag }),
          because: [],
        })),
    );
