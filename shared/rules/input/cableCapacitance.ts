/** On AC a long cable lets current through although the contact is open. */
import { found, missing, titleOf, type RuleAt } from '../rule';
import { offerBleeder } from './bleederFor';
import { atLoop, isAc } from './inputPlace';
import { offState } from './offState';

const id = 'input.cable-capacitance';

export const cableCapacitance: RuleAt<'point'> = {
  id,
  title: titleOf(id),
  basis: 'V·R/√(R² + X²) with X = 1/(2πf·C·l), at the high supply',
  appliesTo: 'point',
  check: (place, context) =>
    atLoop(place, context, (at) => {
      if (!isAc(at)) return [];
      const reading = offState(at, { leakage: false, capacitance: true });
      if ('missing' in reading) return [missing(reading.missing)];
      if (reading.is.state === 'off') return ['ok'];
      const { because, remedy, addsSteps } = offerBleeder(at);
      return [
        found(id, {
          harm: 'fails',
          where: at.where,
          params: { terminal: at.point.terminal, m: at.point.cable?.lengthM ?? 0, V: reading.is.V },
          because: [...reading.is.because(), ...because],
          ...(remedy && { remedy }),
          ...(addsSteps && { addsSteps }),
        }),
      ];
    }),
};
