/** A sensor made for one kind of current on a supply of the other. */
import type { Device } from '../../panel/device';
import { say } from '../../panel/says';
import { found, quantity, titleOf, type RuleAt } from '../rule';
import { fittedDevices } from './fieldDevices';
import { atInput, isAc } from './inputPlace';

function madeFor(device: Device): 'ac' | 'dc' | undefined {
  if (device.kind === 'two-wire') return device.current;
  return device.kind === 'npn' || device.kind === 'pnp' || device.kind === 'push-pull' ? 'dc' : undefined;
}

const onOther = (
  id: 'input.dc-sensor-on-ac' | 'input.ac-sensor-on-dc',
  made: 'ac' | 'dc',
): RuleAt<'point'> => ({
  id,
  title: titleOf(id),
  basis: "the sensor's own current",
  appliesTo: 'point',
  check: (place, context) =>
    atInput(place, context, (at) => {
      const sensors = fittedDevices(at).filter(({ device }) => madeFor(device) === made);
      const [sensor] = sensors;
      if (!sensor) return [];
      if (isAc(at) === (made === 'ac')) return ['ok'];
      return [
        found(id, {
          harm: 'damages',
          where: at.where,
          params: { device: sensor.device.tag ?? at.point.address, supply: at.supply.tag },
          because: [quantity('supply-high', at.volts.maxV, 'V', `supplies.${at.supply.tag}.V`)],
          remedy: { says: say(`finding.${id}.remedy`) },
        }),
      ];
    }),
});

export const dcSensorOnAc = onOther('input.dc-sensor-on-ac', 'dc');
export const acSensorOnDc = onOther('input.ac-sensor-on-dc', 'ac');
