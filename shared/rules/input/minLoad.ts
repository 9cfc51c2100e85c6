/** A two-wire sensor lives on the current of its load: too little, and it drops out. */
import { say } from '../../panel/says';
import { found, missing, titleOf, type RuleAt } from '../rule';
import { offerBleeder } from './bleederFor';
import { conducts, fittedDevices, ledReversed } from './fieldDevices';
import { atLoop } from './inputPlace';
import { askedmA, leastLoad } from './leastLoad';

const id = 'input.min-load';

export const minLoad: RuleAt<'point'> = {
  id,
  title: titleOf(id),
  basis: 'IEC 60947-5-2: minimum operational current, as the maker states it',
  appliesTo: 'point',
  check: (place, context) =>
    atLoop(place, context, (at) => {
      const blocked = ledReversed(at) || fittedDevices(at).some((one) => conducts(one, at) === 'no');
      if (askedmA(at) === 0 || blocked) return [];
      const load = leastLoad(at);
      if ('missing' in load) return [missing(load.missing)];
      const { mA, minmA, because } = load.is;
      if (mA >= minmA) return ['ok'];
      const offer = offerBleeder(at);
      return [
        found(id, {
          harm: 'fails',
          where: at.where,
          params: { device: at.point.device.tag ?? at.point.address, mA, minmA },
          because: [...because, ...offer.because],
          remedy: offer.remedy ?? { says: say('finding.remedy.other-sensor') },
          ...(offer.addsSteps && { addsSteps: offer.addsSteps }),
        }),
      ];
    }),
};
