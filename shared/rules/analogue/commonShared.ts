/** Inputs that are not isolated from each other tie together what their transmitters keep apart. */
import { found, missing, titleOf, type RuleAt } from '../rule';
import { settleOnSite } from '../settleOnSite';
import { atAnalogueInput, isLoop } from './analoguePlace';

const id = 'analogue.common-shared';

export const commonShared: RuleAt<'point'> = {
  id,
  title: titleOf(id),
  basis: 'common practice: sources of their own on isolated inputs, or their 0 V joined on purpose',
  appliesTo: 'point',
  check: (place) =>
    atAnalogueInput(place, ({ io, path, group }) => {
      if (io.isolated || group.points.length < 2) return ['ok'];
      const { device, otherSupply } = place.point;
      const own =
        (isLoop(io) || io.signal === '0-10V') && device.kind === 'transmitter' && device.wires === 4;
      if (!own && otherSupply === undefined) return [missing(`${path}.otherSupply`)];
      if (!own && otherSupply === 'none') return ['ok'];
      return [
        found(id, {
          harm: 'doubt',
          where: place.where,
          params: { device: device.tag ?? place.point.address, group: group.group.tag },
          remedy: { says: { key: 'remedy.analogue.common-shared' } },
          addsSteps: settleOnSite(id, place.where),
        }),
      ];
    }),
};
