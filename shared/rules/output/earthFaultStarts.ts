/** With the 0 V earthed, an output that switches the 0 V has a twin: an earth fault on its wire, which turns the load on. */
import type { StepSeed } from '../finding';
import { found, missing, quantity, titleOf, type RuleAt } from '../rule';
import { drawnLoads, isUnused, movesAnything } from './drawnLoads';
import { atOutput } from './outputPlace';

const id = 'output.earth-fault-starts';

export const earthFaultStarts: RuleAt<'point'> = {
  id,
  title: titleOf(id),
  basis: 'IEC 60204-1 9.4.3',
  appliesTo: 'point',
  check: (place) =>
    atOutput(place, ({ path, group, supply }) => {
      if (supply.kind !== 'dc') return [];
      if (group.group.common !== 'negative' || !supply.earthed) return ['ok'];
      if (drawnLoads(place).length === 0) return isUnused(place) ? [] : [missing(`${path}.device`)];
      const moves = movesAnything(place);
      const { where } = place;
      const addsSteps: StepSeed[] = [
        { family: 'earth-insulation', where },
        ...(moves ? [{ family: 'movement-warning', where }] : []),
      ];
      return [
        found(id, {
          harm: moves ? 'doubt' : 'tells',
          where,
          variant: moves ? 'moves' : 'stays',
          params: { wire: place.point.wire, supply: supply.tag },
          because: [quantity('supply-nominal', supply.V, 'V DC', `supplies.${supply.tag}.V`)],
          remedy: { says: { key: 'remedy.output.earth-fault-starts' } },
          addsSteps,
        }),
      ];
    }),
};
