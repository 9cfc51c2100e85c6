/** An input whose device has switched must read as on: never on, or in the range where nobody can say. */
import { say } from '../../panel/says';
import { found, missing, quantity, titleOf, type Outcome, type RuleAt } from '../rule';
import { offerBleeder } from './bleederFor';
import { branches } from './fieldDevices';
import { atLoop, type InputPlace } from './inputPlace';
import { offState } from './offState';
import { neededV, onState, type Known, type Reading } from './onState';

const basis = 'IEC 61131-2 table 7; the loop solved at the low supply, cable at 70 °C';

const where = ({ where: place, point }: InputPlace, { V }: Reading) => ({
  harm: 'fails' as const,
  where: place,
  params: { terminal: point.terminal, V },
});

function whileOn(id: string, at: InputPlace, reading: Reading): Outcome {
  const least = neededV(at);
  return found(id, {
    ...where(at, reading),
    because: [
      ...reading.because(),
      ...(least === undefined ? [] : [quantity('supply-needed', least, 'V', 'solved loop')]),
    ],
    ...(least !== undefined && {
      remedy: { says: say('finding.remedy.on', { V: least }), values: { V: least } },
    }),
  });
}

/** Leakage and cable together; where one alone explains it, its own rule says so instead. */
function whileOff(id: string, at: InputPlace, reading: Reading): Outcome {
  const { because, ...offer } = offerBleeder(at);
  return found(id, {
    ...where(at, reading),
    variant: 'open',
    because: [...reading.because(), ...because],
    ...offer,
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
          known(onState(at), ['off'], (reading) => whileOn('input.never-on', at, reading)),
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
      known(offState(at), ['on'], (reading) => whileOff('input.never-off', at, reading)),
    ]),
};

export const undefinedRange: RuleAt<'point'> = {
  id: 'input.undefined',
  title: titleOf('input.undefined'),
  basis: 'IEC 61131-2 table 7: between off and on the state is undefined',
  appliesTo: 'point',
  check: (place, context) =>
    atLoop(place, context, (at) => [
      known(onState(at), ['undefined'], (reading) => whileOn('input.undefined', at, reading)),
      known(offState(at), ['undefined'], (reading) => whileOff('input.undefined', at, reading)),
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
            because: reading.because(),
            remedy: { says: say('finding.input.two-wire-in-series.remedy') },
          }),
        ),
      ];
    }),
};
