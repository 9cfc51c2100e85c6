/** More current than the LED of an input, or the sensor before it, can carry: at the high supply, nothing in its way. */
import { say } from '../../panel/says';
import { found, missing, quantity, titleOf, type Outcome, type RuleAt } from '../rule';
import { carriedmA, greatestmA } from './bleederFor';
import { drawsOf } from './draws';
import { ledReversed } from './fieldDevices';
import { atLoop, type InputPlace } from './inputPlace';
import { solveInput } from './solveInput';

const id = 'input.overcurrent';

const high = ({ volts }: InputPlace) => quantity('supply-high', volts.maxV, 'V', volts.tolerancePath);

/** Passing at nominal volts proves nothing while the high limit is not stated. */
const passed = ({ volts }: InputPlace): Outcome => (volts.known ? 'ok' : missing(volts.tolerancePath));

function led(at: InputPlace): Outcome[] {
  const { io, ioPath, where, volts } = at;
  if (io.kind !== 'opto-input') return [];
  const [draw] = drawsOf(io, 'min').models;
  if (!draw) return [];
  const { ledmA = 0 } = solveInput(at, { V: volts.maxV, draw, dropV: 0, noCable: true });
  if (ledmA <= io.maxmA) return [passed(at)];
  // The least series resistor that keeps the current, the module's own one counted.
  const addOhm = Math.ceil((io.seriesOhm * ledmA) / io.maxmA - io.seriesOhm);
  return [
    found(id, {
      harm: 'damages',
      where,
      params: { mA: ledmA, maxmA: io.maxmA },
      because: [
        high(at),
        quantity('led-forward', io.Vf.min, 'V', `${ioPath}.Vf.min`),
        quantity('series-resistor', io.seriesOhm, 'ohm', `${ioPath}.seriesOhm`),
        quantity('led-current', ledmA, 'mA', 'solved loop'),
        quantity('led-most', io.maxmA, 'mA', `${ioPath}.maxmA`),
      ],
      remedy: { says: say(`finding.${id}.remedy`, { ohm: addOhm }), values: { ohm: addOhm } },
    }),
  ];
}

function sensor(at: InputPlace): Outcome[] {
  const carried = carriedmA(at);
  if (carried === Infinity) return [];
  const { lacks, unbounded } = drawsOf(at.io, 'min');
  const mA = greatestmA(at, at.point.bleeder?.ohm);
  const bleedermA = at.point.bleeder ? (at.volts.maxV / at.point.bleeder.ohm) * 1000 : 0;
  // With what is known, or with what the resistor alone takes, it is too much; or the input's share decides.
  if (mA > carried && (lacks === undefined || bleedermA > carried))
    return [
      found(id, {
        harm: 'damages',
        where: at.where,
        variant: 'sensor',
        params: { mA, maxmA: carried },
        because: [
          high(at),
          quantity('sensor-current', mA, 'mA', 'solved loop'),
          quantity('sensor-most', carried, 'mA', `${at.path}.device.maxmA`),
        ],
        remedy: { says: say('finding.remedy.other-sensor') },
      }),
    ];
  return mA > carried || unbounded === true ? [missing(`${at.ioPath}.${lacks ?? ''}`)] : [passed(at)];
}

export const overcurrent: RuleAt<'point'> = {
  id,
  title: titleOf(id),
  basis: "the LED's and the sensor's greatest current",
  appliesTo: 'point',
  check: (place, context) =>
    atLoop(place, context, (at) => (ledReversed(at) ? [] : [...led(at), ...sensor(at)])),
};
