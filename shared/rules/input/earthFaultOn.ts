/** An input that is switched to earthed 0 V: one earth fault on its wire reads as on. */
import { found, titleOf, type RuleAt } from '../rule';
import { atInput } from './inputPlace';

const id = 'input.earth-fault-on';

export const earthFaultOn: RuleAt<'point'> = {
  id,
  title: titleOf(id),
  basis: 'IEC 60204-1 9.4.3',
  appliesTo: 'point',
  check: (place, context) =>
    atInput(place, context, ({ where, point, group, supply }) => {
      const switchesEarthed = group.common === 'positive' || group.common === 'line';
      if (!switchesEarthed) return [];
      if (!supply.earthed) return ['ok'];
      return [found(id, { harm: 'tells', where, params: { wire: point.wire, supply: supply.tag } })];
    }),
};
