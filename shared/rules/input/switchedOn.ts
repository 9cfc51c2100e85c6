/** An input whose device has switched must read as on: never on, or in the range where nobody can say. */
import { say } from '../../panel/says';
import { found, missing, quantity, titleOf, type Outcome, type RuleAt } from '../rule';
import { branches } from './fieldDevices';
import { atLoop, type InputPlace } from './inputPlace';
import { offState } from './offState';
import { neededV, onState, type Known, type Reading } from './onState';

const basis = 'IEC 61131-2 table 7; the loop solved at the low supply, cable at 70 °C';

/** `variant` tells which of the two positions of the device is meant. */
function finding(id: string, at: InputPlace, reading: Reading, variant?: 'open'): Outcome {
  const least = variant === undefined ? neededV(at) : undefined;
  return found(id, {
    harm: 'fails',
    where: at.where,
    ...(variant !== undefined && { variant }),
    params: { terminal: at.point.terminal, V: reading.V },
    because: [
      ...reading.because,
      ...(least === undefined ? [] : [quantity('supply-needed', least, 'V', 'solved loop')]),
    ],
    ...(least !== undefined && {
      remedy: { says: say('finding.remedy.on', { V: least }), values: { V: least } },
    }),
  });
}

const known = (
  reading: Known<Reading>,
  states: readonly Reading['state'][],
  wrong: (reading: Reading) => Outcome,
): Outcome => {
  if ('missing' in reading) return missing(reading.missing);
  return states.includes(reading.is.state) ? wrong(reading.is) : 'ok';
};

export const neverOn: RuleAt<'point'> = {
  id: 'input.never-on',
  title: titleOf('input.never-on'),
  basis,
  appliesTo: 'point',
  check: (place, context) =>
    place.module
      ? atLoop(place, context, (at) => [
          known(onState(at), ['off'], (reading) => finding('input.never-on', at, reading)),
        ])
      : // A group or module that the panel does not have: nobody can say what this point is.
        [missing(`${place.path}.group`)],
};

export const neverOff: RuleAt<'point'> = {
  id: 'input.never-off',
  title: titleOf('input.never-off'),
  basis: 'IEC 61131-2 table 7; leakage and cable capacitance at the high supply',
  appliesTo: 'point',
  check: (place, context) =>
    atLoop(place, context, (at) => [
      known(offState(at), ['on'], (reading) => finding('input.never-off', at, reading, 'open')),
    ]),
};

export const undefinedRange: RuleAt<'point'> = {
  id: 'input.undefined',
  title: titleOf('input.undefined'),
  basis: 'IEC 61131-2 table 7: between off and on the state is undefined',
  appliesTo: 'point',
  check: (place, context) =>
    atLoop(place, context, (at) => [
      known(onState(at), ['undefined'], (reading) => finding('input.undefined', at, reading)),
      known(offState(at), ['undefined'], (reading) => finding('input.undefined', at, reading, 'open')),
    ]),
};

/** Two two-wire sensors in one string keep their volts twice. */
export const twoWireInSeries: RuleAt<'point'> = {
  id: 'input.two-wire-in-series',
  title: titleOf('input.two-wire-in-series'),
  basis: 'IEC 60947-5-2: each sensor keeps its own drop',
  appliesTo: 'point',
  check: (place, context) =>
    atLoop(place, context, (at) => {
      const [string = []] = branches(at);
      const count = string.filter(({ device }) => device.kind === 'two-wire').length;
      if (count < 2) return [];
      return [
        known(onState(at), ['off', 'undefined'], (reading) =>
          found('input.two-wire-in-series', {
            harm: 'fails',
            where: at.where,
            params: { count, V: reading.V },
            because: reading.because,
            remedy: { says: say('finding.input.two-wire-in-series.remedy') },
          }),
        ),
      ];
    }),
};
