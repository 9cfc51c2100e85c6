/** The common on the pole that the sensor needs to switch against it: nothing can flow. */
import type { DeviceOf } from '../../panel/device';
import { say } from '../../panel/says';
import { found, titleOf, type Outcome, type RuleAt } from '../rule';
import { fittedDevices } from './fieldDevices';
import { atInput, isAc } from './inputPlace';

type Sensor = DeviceOf<'npn' | 'pnp'>['kind'];

/** Twin rules: one kind of transistor against the one pole it cannot work with. */
const wrongSide = (
  id: 'input.npn-on-sinking' | 'input.pnp-on-sourcing',
  sensor: Sensor,
  common: 'positive' | 'negative',
): RuleAt<'point'> => ({
  id,
  title: titleOf(id),
  basis: 'IEC 61131-2 (current-sinking inputs), IEC 60947-5-2 (NPN switches 0 V, PNP switches plus)',
  appliesTo: 'point',
  check: (place, context) =>
    atInput(place, context, (at): Outcome[] => {
      if (isAc(at)) return [];
      const sensors = fittedDevices(at).filter(({ device }) => device.kind === sensor);
      if (sensors.length === 0) return [];
      if (at.group.common !== common) return ['ok'];
      const { terminal, tag } = at.group;
      const device = sensors[0]?.device.tag ?? at.point.address;
      return [
        found(id, {
          harm: 'fails',
          where: at.where,
          params: { device, common: terminal, group: tag },
          remedy: { says: say(`finding.${id}.remedy`, { device, group: tag }) },
        }),
      ];
    }),
});

export const npnOnSinking = wrongSide('input.npn-on-sinking', 'npn', 'negative');
export const pnpOnSourcing = wrongSide('input.pnp-on-sourcing', 'pnp', 'positive');
