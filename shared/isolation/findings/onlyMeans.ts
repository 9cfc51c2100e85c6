/** Feeds whose only device is one that does not isolate: it opens one conductor, or it is a control device. */
import type { Isolator, Supply } from '../../panel/panelSchema';
import { say } from '../../panel/says';
import type { Finding } from '../../rules/finding';
import { countsAsIsolation, electricalKind } from '../countsAsIsolation';
import { cutsCircuit } from '../cutsCircuit';
import { isolatorsByTag } from '../isolatorsByTag';
import type { IsolationCheck, IsolationContext } from './context';

interface Passed {
  isolator: Isolator;
  supply: Supply;
}

/** Devices in feeds that nothing can cut, neither here nor anywhere upstream. */
function inUncutFeeds({ panel, allOpen }: IsolationContext): Passed[] {
  const described = isolatorsByTag(panel);
  const sources = new Set(panel.sources.map((source) => source.tag));
  return panel.supplies.flatMap((supply) =>
    supply.feeds
      .filter((feed) => sources.has(feed.from) || allOpen.supplies.has(feed.from))
      .filter(
        (feed) => !feed.through.some((tag) => cutsCircuit(panel, described.get(tag), feed.from, supply)),
      )
      .flatMap((feed) => feed.through.flatMap((tag) => described.get(tag) ?? []))
      .map((isolator) => ({ isolator, supply })),
  );
}
const finding = (rule: string, { isolator, supply }: Passed): Finding => ({
  rule,
  harm: 'hurts',
  where: { isolator: isolator.tag, supply: supply.tag },
  says: say(rule, { isolator: isolator.tag, supply: supply.tag }),
  because: [
    { name: 'isolation.quantity.volts', value: supply.V, unit: 'V', basis: `supplies.${supply.tag}.V` },
  ],
  remedy: { says: say(`isolation.remedy.${rule.slice('isolation.'.length)}`, { isolator: isolator.tag }) },
});

export const onePole: IsolationCheck = (context) =>
  inUncutFeeds(context)
    .filter(({ isolator }) => countsAsIsolation(isolator) && isolator.opens === 'one-conductor')
    .map((passed) => finding('isolation.one-pole', passed));

export const controlDevice: IsolationCheck = (context) =>
  inUncutFeeds(context)
    .filter(({ isolator }) => !countsAsIsolation(isolator) || !electricalKind(isolator))
    .map((passed) => finding('isolation.control-device-as-isolator', passed));
