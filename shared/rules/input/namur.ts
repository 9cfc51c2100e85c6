/** A NAMUR sensor speaks in milliamperes at 8.2 V: a plain input does not understand it. */
import { say } from '../../panel/says';
import { found, titleOf, type RuleAt } from '../rule';
import { fittedDevices } from './fieldDevices';
import { atInput } from './inputPlace';

const id = 'input.namur';

export const namur: RuleAt<'point'> = {
  id,
  title: titleOf(id),
  basis: 'IEC 60947-5-6: 8.2 V through 1 kΩ, below 1.2 mA off, above 2.1 mA on',
  appliesTo: 'point',
  check: (place, context) =>
    atInput(place, context, (at) => {
      const sensor = fittedDevices(at).find(({ device }) => device.kind === 'namur');
      if (!sensor) return [];
      return [
        found(id, {
          harm: 'fails',
          where: at.where,
          params: { device: sensor.device.tag ?? at.point.address },
          remedy: { says: say(`finding.${id}.remedy`) },
        }),
      ];
    }),
};
