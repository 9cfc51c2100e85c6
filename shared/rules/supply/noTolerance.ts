/** A supply without stated limits: nothing that hangs on its ends can be proven. */
import { settleOnSite } from '../settleOnSite';
import { found, titleOf, type RuleAt } from '../rule';

const id = 'supply.no-tolerance';

export const noTolerance: RuleAt<'supply'> = {
  id,
  title: titleOf(id),
  basis:
    'supplies.*.tolerance; IEC 61131-2 gives −15 % and +20 % for DC, −15 % and +10 % for AC (from memory)',
  appliesTo: 'supply',
  check: ({ where, path, supply }) =>
    supply.tolerance
      ? ['ok']
      : [
          found(id, {
            harm: 'doubt',
            where,
            params: { supply: supply.tag, field: `${path}.tolerance` },
            addsSteps: settleOnSite(id, where),
          }),
        ],
};
