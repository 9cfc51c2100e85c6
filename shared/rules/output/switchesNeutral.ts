/** An output in the neutral leaves its load at full voltage to earth when it is off. */
import { found, quantity, titleOf, type RuleAt } from '../rule';
import { atOutput } from './outputPlace';

const id = 'output.switches-neutral';

/** Only where the neutral is earthed: on an unearthed supply both conductors are alike (IEC 60204-1 9.4.3). */
export const switchesNeutral: RuleAt<'point'> = {
  id,
  title: titleOf(id),
  basis: 'IEC 60204-1 9.4.3',
  appliesTo: 'point',
  check: (place) =>
    atOutput(place, ({ group, supply, volts }) => {
      if (supply.kind === 'dc') return [];
      if (group.group.common !== 'neutral' || !supply.earthed) return ['ok'];
      return [
        found(id, {
          harm: 'hurts',
          where: place.where,
          params: { supply: supply.tag, terminal: place.point.terminal },
          because: [quantity('supply-high', volts.maxV, 'V AC', `supplies.${supply.tag}.V`)],
          remedy: { says: { key: 'remedy.output.switches-neutral', params: { group: group.group.tag } } },
        }),
      ];
    }),
};
