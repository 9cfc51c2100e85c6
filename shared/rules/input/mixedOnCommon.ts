/** NPN and PNP sensors on one common: whichever pole it is on, one kind cannot work. */
import { say } from '../../panel/says';
import { found, titleOf, type RuleAt } from '../rule';

const id = 'input.mixed-on-common';

export const mixedOnCommon: RuleAt<'group'> = {
  id,
  title: titleOf(id),
  basis: 'IEC 60947-5-2 (NPN switches 0 V, PNP switches plus)',
  appliesTo: 'group',
  check: ({ where, group, module, points }) => {
    if (module?.io.kind !== 'digital-input' && module?.io.kind !== 'opto-input') return [];
    const first = (kind: 'npn' | 'pnp') =>
      points
        .map(({ point }) => point)
        .filter(({ device, series = [], parallel = [] }) =>
          [device, ...series, ...parallel].some((one) => one.kind === kind),
        )
        .map(({ address }) => address)
        .sort();
    const npn = first('npn');
    const pnp = first('pnp');
    if (npn.length + pnp.length === 0) return [];
    if (npn.length === 0 || pnp.length === 0) return ['ok'];
    return [
      found(id, {
        harm: 'fails',
        where,
        params: { common: group.terminal, npn: npn.join(', '), pnp: pnp.join(', ') },
        remedy: { says: say(`finding.${id}.remedy`) },
      }),
    ];
  },
};
