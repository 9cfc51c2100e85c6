/** An RTD input that measures its leads needs all of them; a device of another kind gives it nothing to measure. */
import { found, missing, quantity, titleOf, type RuleAt } from '../rule';
import { settleOnSite } from '../settleOnSite';
import { atAnalogueInput } from './analoguePlace';

const id = 'analogue.lead-count';

export const leadCount: RuleAt<'point'> = {
  id,
  title: titleOf(id),
  basis: "the module's stated leads (IEC 60751 connection types)",
  appliesTo: 'point',
  check: (place) =>
    atAnalogueInput(place, ({ io, ioPath, path }) => {
      if (io.signal !== 'rtd') return [];
      const { device } = place.point;
      const { where } = place;
      const about = {
        harm: 'fails' as const,
        where,
        addsSteps: settleOnSite(id, where),
        remedy: { says: { key: 'remedy.analogue.lead-count' } },
      };
      const name = device.tag ?? place.point.address;
      if (device.kind !== 'rtd') return [found(id, { ...about, variant: 'other', params: { device: name } })];
      if (io.leads === undefined) return [missing(`${ioPath}.leads`)];
      // More wires than the input takes are left off; fewer leave the measuring lead open.
      if (device.wires >= io.leads) return ['ok'];
      return [
        found(id, {
          ...about,
          variant: 'few',
          params: { device: name, wires: device.wires, leads: io.leads },
          because: [
            quantity('leads', device.wires, '', `${path}.device.wires`),
            quantity('leads-needed', io.leads, '', `${ioPath}.leads`),
          ],
        }),
      ];
    }),
};
