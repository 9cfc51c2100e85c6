/** What is wrong with one suppressor in one circuit, and which of its data are missing to tell. */
import {
  diodeLeastTimes,
  diodeWantedTimes,
  rcMicrofarad,
  rcOhm,
  standOffLeastV,
  varistorLeastV,
  type Range,
} from '../../electrical/suppressorSizes';
import type { Suppressor } from '../../panel/device';
import type { Quantity } from '../finding';
import { quantity } from '../rule';
import { currentOf, loadsA, type Circuit } from './circuits';

export interface Fault {
  variant: string;
  params: Record<string, number>;
  because: Quantity[];
}
interface Verdict {
  faults: Fault[];
  /** Fields of the suppressor that nobody has stated. */
  lacks: string[];
}
type Field = 'V' | 'A' | 'ohm' | 'uF';

/** Compares one datum of the suppressor with what it must be. */
function compare(
  circuit: Circuit,
  suppressor: Suppressor,
  field: Field,
  variant: string,
  { low, high }: Range,
): Verdict {
  const value = suppressor[field];
  if (value === undefined) return { faults: [], lacks: [field] };
  if (value >= low * (1 - 1e-9) && value <= high * (1 + 1e-9)) return { faults: [], lacks: [] };
  const unit = { V: 'V', A: 'A', ohm: 'ohm', uF: 'µF' }[field];
  const because = [
    quantity('suppressor-value', value, unit, `${circuit.suppressorPath}.${field}`),
    quantity('suppressor-least', low, unit, 'reference §8'),
    ...(high < Infinity ? [quantity('suppressor-most', high, unit, 'reference §8')] : []),
  ];
  const most: Record<string, number> = high < Infinity ? { high } : {};
  return { faults: [{ variant, params: { value, low, ...most }, because }], lacks: [] };
}

const together = (...verdicts: Verdict[]): Verdict => ({
  faults: verdicts.flatMap(({ faults }) => faults),
  lacks: verdicts.flatMap(({ lacks }) => lacks),
});
const atLeast = (low: number): Range => ({ low, high: Infinity });
const only = (variant: string, V: number): Verdict => ({
  faults: [{ variant, params: { V }, because: [] }],
  lacks: [],
});

/** Across the contact a plain diode blocks the spike's own direction: it does nothing. */
function ofDiode(circuit: Circuit, suppressor: Suppressor): Verdict {
  const { maxV, nominalV } = circuit.volts;
  if (currentOf(circuit) === 'ac') return only('diode-on-ac', nominalV);
  if (suppressor.at === 'contact') return only('diode-at-contact', nominalV);
  const rating = compare(circuit, suppressor, 'V', 'diode-volts', atLeast(diodeLeastTimes * maxV));
  const current = compare(circuit, suppressor, 'A', 'diode-amps', atLeast(loadsA(circuit)));
  const advised = rating.faults.map((fault) => ({
    ...fault,
    params: { ...fault.params, wanted: diodeWantedTimes * maxV },
  }));
  return together({ ...rating, faults: advised }, current);
}

function ofRc(circuit: Circuit, suppressor: Suppressor): Verdict {
  const { nominalV, maxV } = circuit.volts;
  return together(
    compare(circuit, suppressor, 'V', 'rc-volts', atLeast(maxV)),
    compare(circuit, suppressor, 'ohm', 'rc-ohm', rcOhm(nominalV)),
    compare(circuit, suppressor, 'uF', 'rc-farad', rcMicrofarad(loadsA(circuit))),
  );
}

/** Judges one suppressor; none is judged where nothing is fitted. */
export function suppressorFaults(circuit: Circuit, suppressor: Suppressor): Verdict {
  const { maxV, nominalV } = circuit.volts;
  const current = currentOf(circuit);
  switch (suppressor.kind) {
    case 'diode':
      return ofDiode(circuit, suppressor);
    case 'zener':
      // A zener alone conducts forwards like any diode.
      if (current === 'ac') return only('diode-on-ac', nominalV);
      return compare(circuit, suppressor, 'V', 'stand-off', atLeast(standOffLeastV(maxV, current)));
    case 'tvs':
      return compare(circuit, suppressor, 'V', 'stand-off', atLeast(standOffLeastV(maxV, current)));
    case 'mov': {
      const least = current === 'dc' ? maxV : varistorLeastV(nominalV, maxV);
      return compare(circuit, suppressor, 'V', 'varistor', atLeast(least));
    }
    case 'rc':
      return ofRc(circuit, suppressor);
    case 'none':
      return { faults: [], lacks: [] };
  }
}
