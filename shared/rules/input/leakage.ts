/** What an off sensor still lets through keeps the input from reading off. */
import { say } from '../../panel/says';
import { found, missing, quantity, titleOf, type Outcome, type RuleAt } from '../rule';
import { settleOnSite } from '../settleOnSite';
import { offerBleeder } from './bleederFor';
import { worstLeakmA } from './fieldDevices';
import { atLoop, isAc, type InputPlace } from './inputPlace';
import { limitsOf } from './limits';
import { offState } from './offState';

const id = 'input.leakage';

/** The leakage is above what is off for sure, and the maker's resistance that would settle it is not stated. */
function unsure(at: InputPlace, leakmA: number): Outcome {
  const { because, remedy, addsSteps = [] } = offerBleeder(at);
  const field = `${at.ioPath}.inputOhm`;
  return found(id, {
    harm: 'doubt',
    where: at.where,
    variant: 'unsure',
    params: { field, mA: leakmA },
    because: [
      quantity('leakage', leakmA, 'mA', `${at.path}.device.leakmA`),
      ...(limitsOf(at)?.off ?? []),
      ...because,
    ],
    ...(remedy && { remedy }),
    addsSteps: [...settleOnSite(id, at.where), ...addsSteps],
  });
}

function ask(at: InputPlace): Outcome[] {
  const leakmA = worstLeakmA(at);
  if (leakmA === 0) return [];
  // On DC no cable adds to it.
  const reading = isAc(at) ? offState(at, { leakage: true, capacitance: false }) : offState(at);
  if ('missing' in reading)
    return reading.missing === `${at.ioPath}.inputOhm` ? [unsure(at, leakmA)] : [missing(reading.missing)];
  if (reading.is.state === 'off') return ['ok'];
  const { because, remedy, addsSteps } = offerBleeder(at);
  return [
    found(id, {
      harm: 'fails',
      where: at.where,
      params: { terminal: at.point.terminal, mA: leakmA, V: reading.is.V },
      because: [...reading.is.because(), ...because],
      remedy: remedy ?? { says: say('finding.remedy.other-sensor') },
      ...(addsSteps && { addsSteps }),
    }),
  ];
}

export const leakage: RuleAt<'point'> = {
  id,
  title: titleOf(id),
  basis: 'IEC 61131-2 table 7 against IEC 60947-5-2 off-state current; V = I·R',
  appliesTo: 'point',
  check: (place, context) => atLoop(place, context, ask),
};
