/** Whether a coil still pulls in: lowest supply, less what the output, devices in series and the cable keep. */
import { pickUpPct } from '../../electrical/offState';
import { cableDropV } from '../cableOhms';
import type { PointPlace } from '../context';
import type { Quantity } from '../finding';
import { settleOnSite } from '../settleOnSite';
import { found, missing, quantity, titleOf, type Outcome, type RuleAt } from '../rule';
import { currentOf, inCircuits, loadsA, type Circuit } from './circuits';
import type { DrawnLoad } from './drawnLoads';
import { atOutput } from './outputPlace';

const id = 'output.load-underfed';

interface Part {
  V: number;
  because: Quantity[];
  lacks?: string;
}
const nothing: Part = { V: 0, because: [] };

/** A closed relay contact keeps next to nothing; a semiconductor keeps what its maker says. */
function ofSwitch({ onDropV, onDropPath, switchedBy }: Circuit): Part {
  if (onDropV !== undefined)
    return { V: onDropV, because: [quantity('output-drop', onDropV, 'V', onDropPath)] };
  return switchedBy === 'relay' ? nothing : { ...nothing, lacks: onDropPath };
}

function ofSeries({ series = [] }: PointPlace['point']): Part {
  const V = series.reduce((sum, device) => sum + ('dropV' in device ? device.dropV : 0), 0);
  return V === 0 ? nothing : { V, because: [quantity('series-drop', V, 'V', 'devices in series')] };
}

function ofCable({ point, path }: PointPlace, A: number): Part {
  if (!point.cable) return { ...nothing, lacks: `${path}.cable` };
  const V = cableDropV(point.cable, A);
  return { V, because: [quantity('cable-drop', V, 'V', `${path}.cable, copper at 70 °C`)] };
}

/** A load with a least voltage: stated, or a coil, which has a default. */
export const hasPickUp = ({ load, pickUpPct: stated }: DrawnLoad): boolean =>
  stated !== undefined || load === 'coil' || load === 'solenoid';

const neededV = ({ V, pickUpPct: stated }: DrawnLoad, circuit: Circuit): number =>
  (V * (stated ?? pickUpPct(currentOf(circuit)))) / 100;

function judge(circuit: Circuit, place: PointPlace): Outcome[] {
  const loads = circuit.loads.filter(hasPickUp);
  const [hardest] = [...loads].sort((a, b) => neededV(b, circuit) - neededV(a, circuit));
  if (!hardest) return [];
  const { volts, supply } = circuit;
  // The panel file describes no cable between a solid-state relay and its load.
  const own = circuit.side === 'point' ? [ofSeries(place.point), ofCable(place, loadsA(circuit))] : [];
  const parts = [ofSwitch(circuit), ...own];
  const V = volts.minV - parts.reduce((sum, part) => sum + part.V, 0);
  const needs = neededV(hardest, circuit);
  if (V >= needs - 1e-9) {
    const lacks = parts.find((part) => part.lacks !== undefined)?.lacks;
    return [lacks !== undefined ? missing(lacks) : volts.known ? 'ok' : missing(volts.tolerancePath)];
  }
  const basis =
    hardest.pickUpPct === undefined ? 'default pick-up, from memory' : `${hardest.path}.pickUpPct`;
  return [
    found(id, {
      harm: 'fails',
      where: place.where,
      params: { V, needsV: needs, load: hardest.tag ?? place.point.address },
      because: [
        quantity('supply-low', volts.minV, 'V', `supplies.${supply.tag}.V, tolerance`),
        ...parts.flatMap((part) => part.because),
        quantity('load-voltage', V, 'V', 'what is left'),
        quantity('pick-up', needs, 'V', basis),
      ],
      remedy: { says: { key: 'remedy.output.load-underfed', params: { lackV: needs - V } } },
      addsSteps: settleOnSite(id, place.where),
    }),
  ];
}

export const loadUnderfed: RuleAt<'point'> = {
  id,
  title: titleOf(id),
  basis: 'V_min − V_on − 2·I·R′·l against the pick-up of the load',
  appliesTo: 'point',
  check: (place, context) =>
    atOutput(place, (at) => inCircuits(at, context, (circuit) => judge(circuit, place))),
};
