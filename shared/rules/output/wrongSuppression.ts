/** A suppressor of the wrong kind, in the wrong place, or rated for less than it meets. */
import type { PointPlace } from '../context';
import { found, missing, titleOf, type Outcome, type RuleAt } from '../rule';
import { settleOnSite } from '../settleOnSite';
import { currentOf, inCircuits, type Circuit } from './circuits';
import { atOutput } from './outputPlace';
import { suppressorFaults, type Fault } from './suppressorFaults';

const id = 'output.wrong-suppression';

function said(fault: Fault, { where, point }: PointPlace): Outcome {
  return found(id, {
    harm: 'damages',
    where,
    variant: fault.variant,
    params: { ...fault.params, terminal: point.terminal },
    because: fault.because,
    remedy: { says: { key: `remedy.output.wrong-suppression.${fault.variant}`, params: fault.params } },
    addsSteps: settleOnSite(id, where),
  });
}

/** A module with a diode across its output is a DC module: on AC the diode conducts every other half wave. */
function builtInDiode(circuit: Circuit): Fault[] {
  const onAc = circuit.builtIn === 'diode' && currentOf(circuit) === 'ac';
  return onAc ? [{ variant: 'diode-on-ac', params: { V: circuit.volts.nominalV }, because: [] }] : [];
}

function judge(circuit: Circuit, place: PointPlace): Outcome[] {
  const { suppressor, volts } = circuit;
  const built = builtInDiode(circuit).map((fault) => said(fault, place));
  if (!suppressor || suppressor.kind === 'none') return built;
  const { faults, lacks } = suppressorFaults(circuit, suppressor);
  const wrong = [...built, ...faults.map((fault) => said(fault, place))];
  if (wrong.length > 0) return wrong;
  const [field] = lacks;
  if (field !== undefined) return [missing(`${circuit.suppressorPath}.${field}`)];
  return [volts.known ? 'ok' : missing(volts.tolerancePath)];
}

export const wrongSuppression: RuleAt<'point'> = {
  id,
  title: titleOf(id),
  basis: "common practice and makers' manuals (reference §8)",
  appliesTo: 'point',
  check: (place, context) =>
    atOutput(place, (at) => inCircuits(at, context, (circuit) => judge(circuit, place))),
};
