/** A control supply without earth and without a monitor: its first earth fault goes unseen, its second may start something. */
import { say } from '../../panel/says';
import { settleOnSite } from '../settleOnSite';
import { found, titleOf, type RuleAt } from '../rule';

const id = 'supply.unearthed-control';

export const unearthedControl: RuleAt<'supply'> = {
  id,
  title: titleOf(id),
  basis: 'IEC 60204-1 9.4.3',
  appliesTo: 'supply',
  check: ({ where, supply, groups, relayLoads }) => {
    if (groups.length + relayLoads.length === 0) return [];
    if (supply.earthed || supply.earthFaultMonitor === true) return ['ok'];
    return [
      found(id, {
        harm: 'doubt',
        where,
        params: { supply: supply.tag },
        remedy: { says: say(`finding.${id}.remedy`) },
        addsSteps: settleOnSite(id, where),
      }),
    ];
  },
};
