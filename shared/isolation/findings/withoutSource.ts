/** Supplies whose energy comes from nowhere the file knows. */
import type { Supply } from '../../panel/panelSchema';
import { say } from '../../panel/says';
import { sourcelessCircles } from '../sourcelessCircles';
import type { IsolationCheck } from './context';

function fromNowhere(supply: Supply, known: ReadonlySet<string>): boolean {
  return supply.feeds.length === 0 || supply.feeds.some((feed) => !known.has(feed.from));
}

export const noFeed: IsolationCheck = ({ panel }) => {
  const known = new Set([...panel.sources, ...panel.supplies].map((one) => one.tag));
  return panel.supplies
    .filter((supply) => fromNowhere(supply, known))
    .map((supply) => ({
      rule: 'isolation.no-feed',
      harm: 'hurts',
      where: { supply: supply.tag },
      says: say('isolation.no-feed', { supply: supply.tag }),
      because: [
        { name: 'isolation.quantity.volts', value: supply.V, unit: 'V', basis: `supplies.${supply.tag}.V` },
      ],
      remedy: { says: say('isolation.remedy.no-feed', { supply: supply.tag }) },
    }));
};

export const derivedLoop: IsolationCheck = ({ panel }) =>
  sourcelessCircles(panel).map((circle) => ({
    rule: 'isolation.derived-loop',
    harm: 'hurts',
    where: { supply: circle[0] ?? '' },
    says: say('isolation.derived-loop', { supplies: circle.join(', ') }),
    because: [],
    remedy: { says: say('isolation.remedy.derived-loop') },
  }));
