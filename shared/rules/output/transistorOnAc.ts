/** A transistor output passes current one way: on AC the other half wave goes through it backwards. */
import { settleOnSite } from '../settleOnSite';
import { found, quantity, titleOf, type RuleAt } from '../rule';
import { atOutput } from './outputPlace';

const id = 'output.transistor-on-ac';

export const transistorOnAc: RuleAt<'point'> = {
  id,
  title: titleOf(id),
  basis: 'a sinking or sourcing transistor output is a DC output (IEC 61131-2)',
  appliesTo: 'point',
  check: (place) =>
    atOutput(place, ({ io, supply, module }) => {
      if (io.technology !== 'sinking' && io.technology !== 'sourcing') return [];
      if (supply.kind === 'dc') return ['ok'];
      return [
        found(id, {
          harm: 'damages',
          where: place.where,
          params: { module: module.tag, supply: supply.tag, V: supply.V },
          because: [quantity('supply-nominal', supply.V, 'V AC', `supplies.${supply.tag}.V`)],
          remedy: { says: { key: 'remedy.output.transistor-on-ac' } },
          addsSteps: settleOnSite(id, place.where),
        }),
      ];
    }),
};
