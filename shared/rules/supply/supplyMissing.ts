/** A common that nobody gave a supply. */
import { settleOnSite } from '../settleOnSite';
import { found, titleOf, type RuleAt } from '../rule';

const id = 'supply.missing';

export const supplyMissing: RuleAt<'group'> = {
  id,
  title: titleOf(id),
  basis: 'groups.*.supply',
  appliesTo: 'group',
  check: ({ where, path, group, supply }) =>
    supply
      ? ['ok']
      : [
          found(id, {
            harm: 'doubt',
            where,
            ...(group.supply !== undefined && { variant: 'unknown' }),
            params: { common: group.terminal, field: `${path}.supply`, supply: group.supply ?? '' },
            addsSteps: settleOnSite(id, where),
          }),
        ],
};
