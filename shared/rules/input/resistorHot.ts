/** A resistor that carries more than half its rating: an optocoupler's series resistor, or a resistor across the input. */
import { heatW } from '../../electrical/optoInput';
import { derating, ratingFor } from '../../electrical/resistorWatts';
import { say } from '../../panel/says';
import { found, missing, quantity, titleOf, type Outcome, type RuleAt } from '../rule';
import { drawsOf } from './draws';
import { ledReversed } from './fieldDevices';
import { atLoop, type InputPlace } from './inputPlace';
import { solveInput } from './solveInput';

const id = 'input.resistor-hot';

interface Resistor {
  variant: 'series' | 'bleeder';
  ohm: number;
  W: number;
  heat: number;
  path: string;
}

function judged({ where, volts }: InputPlace, { variant, ohm, W, heat, path }: Resistor): Outcome {
  // Half a milliwatt is no heat.
  if (heat <= derating * W + 5e-4) return volts.known ? 'ok' : missing(volts.tolerancePath);
  const enough = ratingFor(heat);
  return found(id, {
    harm: 'damages',
    where,
    variant,
    params: { heat, W },
    because: [
      quantity('supply-high', volts.maxV, 'V', volts.tolerancePath),
      quantity('resistor', ohm, 'ohm', path),
      quantity('heat', heat, 'W', variant === 'series' ? 'I²·R' : 'V²/R'),
      quantity('half-rating', derating * W, 'W', 'half the rating (common practice)'),
    ],
    ...(enough !== undefined && {
      remedy: { says: say(`finding.${id}.remedy`, { W: enough }), values: { W: enough } },
    }),
  });
}

function series(at: InputPlace): Outcome[] {
  const { io, ioPath, volts } = at;
  const [draw] = drawsOf(io, 'min').models;
  if (io.kind !== 'opto-input' || !draw || ledReversed(at)) return [];
  const solved = solveInput(at, { V: volts.maxV, draw, dropV: 0, noCable: true });
  const heat = heatW(solved.mA, io.seriesOhm);
  return [
    judged(at, { variant: 'series', ohm: io.seriesOhm, W: io.seriesW, heat, path: `${ioPath}.seriesOhm` }),
  ];
}

function bleeder(at: InputPlace): Outcome[] {
  const { point, path, volts } = at;
  if (!point.bleeder) return [];
  const { ohm, W } = point.bleeder;
  return [
    judged(at, { variant: 'bleeder', ohm, W, heat: volts.maxV ** 2 / ohm, path: `${path}.bleeder.ohm` }),
  ];
}

export const resistorHot: RuleAt<'point'> = {
  id,
  title: titleOf(id),
  basis: 'P = I²·R at most half the rating (common practice)',
  appliesTo: 'point',
  check: (place, context) => atLoop(place, context, (at) => [...series(at), ...bleeder(at)]),
};
