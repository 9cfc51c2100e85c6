/** What the cable keeps of the voltage, where the load itself states no least voltage. */
import { steadyA, drawnLoads } from '../output/drawnLoads';
import { hasPickUp } from '../output/loadUnderfed';
import { atOutput } from '../output/outputPlace';
import { cableDropV } from '../cableOhms';
import { settleOnSite } from '../settleOnSite';
import { found, missing, quantity, titleOf, type RuleAt } from '../rule';

const id = 'wire.drop';

/** Share of the nominal voltage from the supply to the load (IEC 60204-1 12.5, from memory). */
const mostShare = 0.05;

export const drop: RuleAt<'point'> = {
  id,
  title: titleOf(id),
  basis: 'IEC 60204-1 12.5: at most 5 % of the nominal voltage',
  appliesTo: 'point',
  check: (place) =>
    atOutput(place, ({ path, volts, supply }) => {
      const loads = drawnLoads(place);
      const unbounded = loads.some((load) => load.load !== 'control' && !hasPickUp(load));
      const A = steadyA(place);
      if (!unbounded || A === undefined) return [];
      const { cable } = place.point;
      if (!cable) return [missing(`${path}.cable`)];
      const V = cableDropV(cable, A);
      const limitV = mostShare * volts.nominalV;
      if (V <= limitV * (1 + 1e-9)) return ['ok'];
      return [
        found(id, {
          harm: 'fails',
          where: place.where,
          params: { V, limitV, A, m: cable.lengthM },
          because: [
            quantity('load-current', A, 'A', `${path}.device.A`),
            quantity('cable-drop', V, 'V', `${path}.cable, copper at 70 °C`),
            quantity('supply-nominal', volts.nominalV, 'V', `supplies.${supply.tag}.V`),
            quantity('drop-share', (100 * V) / volts.nominalV, '%', 'IEC 60204-1 12.5: at most 5 %'),
          ],
          remedy: {
            says: { key: 'remedy.wire.drop', params: { m: (cable.lengthM * limitV) / V } },
            values: { m: (cable.lengthM * limitV) / V },
          },
          addsSteps: settleOnSite(id, place.where),
        }),
      ];
    }),
};
