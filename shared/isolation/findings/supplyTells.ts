/** What people must know about supplies and the terminals they reach. */
import type { Point } from '../../panel/panelSchema';
import { say } from '../../panel/says';
import type { Finding } from '../../rules/finding';
import { foreignSupplies } from '../foreignSupplies';
import { waitOf } from '../waits';
import type { IsolationCheck, IsolationContext } from './context';

function foreignAt({ panel, disconnectOpen }: IsolationContext, point: Point): Finding[] {
  const foreign = foreignSupplies(point).filter((tag) => tag !== null);
  if (foreign.length === 0) return [];
  const own = panel.groups.find((group) => group.tag === point.group)?.supply;
  const colours = panel.practice === 'NFPA 79' ? 'nfpa' : 'iec';
  return foreign
    .filter((tag) => tag !== own)
    .map((tag) => {
      const volts = panel.supplies.find((supply) => supply.tag === tag)?.V;
      const stays = disconnectOpen.supplies.has(tag);
      return {
        rule: 'isolation.foreign-voltage',
        harm: 'tells',
        where: { point: point.address, supply: tag, terminal: point.terminal },
        says: say(stays ? `isolation.foreign-voltage.stays.${colours}` : 'isolation.foreign-voltage', {
          terminal: point.terminal,
          supply: tag,
        }),
        because:
          volts === undefined
            ? []
            : [
                {
                  name: 'isolation.quantity.volts',
                  value: volts,
                  unit: 'V',
                  basis: `supplies.${tag}.V`,
                },
              ],
      };
    });
}

export const foreignVoltage: IsolationCheck = (context) =>
  context.panel.points.flatMap((point) => foreignAt(context, point));

export const storedUnknown: IsolationCheck = ({ panel, workedSupplies }) =>
  panel.supplies.flatMap((supply) => {
    const wait = workedSupplies.has(supply.tag) ? waitOf(panel, supply) : null;
    if (wait === null || supply.bulk === 'none') return [];
    if (wait.t60S !== null || wait.statedS !== undefined) return [];
    return [
      {
        rule: 'isolation.stored-unknown',
        harm: 'tells' as const,
        where: { supply: supply.tag },
        says: say('isolation.stored-unknown', { supply: supply.tag }),
        because: [
          {
            name: 'isolation.quantity.capacitance',
            value: supply.bulk.uF,
            unit: 'µF',
            basis: `supplies.${supply.tag}.bulk.uF`,
          },
        ],
      },
    ];
  });

export const redundantFeed: IsolationCheck = ({ panel }) =>
  panel.supplies
    .filter((supply) => supply.feeds.length > 1)
    .map((supply) => ({
      rule: 'isolation.redundant-feed',
      harm: 'tells',
      where: { supply: supply.tag },
      says: say('isolation.redundant-feed', { supply: supply.tag, feeds: supply.feeds.length }),
      because: [
        {
          name: 'isolation.quantity.feeds',
          value: supply.feeds.length,
          unit: '',
          basis: `supplies.${supply.tag}.feeds`,
        },
      ],
    }));

export const ups: IsolationCheck = ({ panel }) =>
  panel.sources
    .filter((source) => source.kind === 'battery')
    .map((source) => ({
      rule: 'isolation.ups',
      harm: 'tells',
      where: { source: source.tag },
      says: say('isolation.ups', { source: source.tag, location: source.location }),
      because: [],
    }));
