/** A triac stops conducting only when its current passes zero: on DC it never does. */
import { found, quantity, titleOf, type RuleAt } from '../rule';
import { atOutput } from './outputPlace';

const id = 'output.triac-on-dc';

export const triacOnDc: RuleAt<'point'> = {
  id,
  title: titleOf(id),
  basis: 'a triac turns off at the zero crossing of its current, which DC does not have',
  appliesTo: 'point',
  check: (place) =>
    atOutput(place, ({ io, supply, module }) => {
      if (io.technology !== 'triac') return [];
      if (supply.kind !== 'dc') return ['ok'];
      return [
        found(id, {
          harm: 'hurts',
          where: place.where,
          params: { module: module.tag, supply: supply.tag, V: supply.V },
          because: [quantity('supply-nominal', supply.V, 'V DC', `supplies.${supply.tag}.V`)],
          remedy: { says: { key: 'remedy.output.triac-on-dc' } },
        }),
      ];
    }),
};
