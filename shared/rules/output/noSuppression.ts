/** A coil that nothing quiets: its spike burns contacts and breaks down transistors. */
import { diodeWantedTimes, rcMicrofarad, rcOhm, varistorLeastV } from '../../electrical/suppressorSizes';
import type { PointPlace } from '../context';
import type { Remedy } from '../finding';
import { settleOnSite } from '../settleOnSite';
import { found, missing, quantity, titleOf, type Outcome, type RuleAt } from '../rule';
import { currentOf, inCircuits, isCoil, loadsA, type Circuit } from './circuits';
import type { DrawnLoad } from './drawnLoads';
import { atOutput } from './outputPlace';

const id = 'output.no-suppression';

/** DC coils always; AC coils only where a semiconductor switches them (wiring.md). A motor on AC brings its own means. */
function coilsThatNeedOne(circuit: Circuit): DrawnLoad[] {
  if (currentOf(circuit) === 'dc') return circuit.loads.filter(isCoil);
  if (circuit.switchedBy === 'relay') return [];
  return circuit.loads.filter((load) => isCoil(load) && load.load !== 'motor');
}

function remedyFor(circuit: Circuit): Remedy {
  const { maxV, nominalV } = circuit.volts;
  const A = loadsA(circuit);
  if (currentOf(circuit) === 'dc') {
    const values = { V: diodeWantedTimes * maxV, A, standOffV: maxV };
    return { says: { key: 'remedy.output.no-suppression.dc', params: values }, values };
  }
  const ohm = rcOhm(nominalV);
  const uF = rcMicrofarad(A);
  const movV = varistorLeastV(nominalV, maxV);
  const values = { lowOhm: ohm.low, highOhm: ohm.high, lowUF: uF.low, highUF: uF.high, movV };
  return { says: { key: 'remedy.output.no-suppression.ac', params: values }, values };
}

function judge(circuit: Circuit, { where, point }: PointPlace): Outcome[] {
  const coils = coilsThatNeedOne(circuit);
  if (coils.length === 0) return [];
  const { suppressor, suppressorPath, builtIn } = circuit;
  const fitted = suppressor !== undefined && suppressor.kind !== 'none';
  const inside = builtIn !== undefined && builtIn !== 'none';
  if (fitted || inside || coils.every(({ suppressed }) => suppressed === true)) return ['ok'];
  if (suppressor === undefined) return [missing(suppressorPath)];
  const [coil] = coils;
  return [
    found(id, {
      harm: 'damages',
      where,
      variant: currentOf(circuit),
      params: { load: coil?.tag ?? point.address },
      because: [
        quantity('supply-high', circuit.volts.maxV, 'V', `supplies.${circuit.supply.tag}.V, tolerance`),
        quantity('load-current', loadsA(circuit), 'A', `${coil?.path}.A`),
      ],
      remedy: remedyFor(circuit),
      addsSteps: settleOnSite(id, where),
    }),
  ];
}

export const noSuppression: RuleAt<'point'> = {
  id,
  title: titleOf(id),
  basis: 'common practice; reference §8',
  appliesTo: 'point',
  check: (place, context) =>
    atOutput(place, (at) => inCircuits(at, context, (circuit) => judge(circuit, place))),
};
