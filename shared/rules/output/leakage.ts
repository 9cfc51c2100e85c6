/** The current that still flows through a circuit whose output is off. */
import { capacitorLeakmA } from '../../electrical/offState';
import type { Quantity } from '../finding';
import { missing, quantity, type Outcome } from '../rule';
import { currentOf, type Circuit } from './circuits';

interface Leak {
  mA: number;
  because: Quantity[];
}

/** Through the switch itself. An open relay contact leaks nothing, but an RC built in across it does on AC. */
function ofSwitch(circuit: Circuit): Leak | Outcome {
  const { leakmA, leakPath, switchedBy, builtIn, builtInPath } = circuit;
  if (leakmA !== undefined) return { mA: leakmA, because: [quantity('leakage', leakmA, 'mA', leakPath)] };
  if (switchedBy !== 'relay') return missing(leakPath);
  if (currentOf(circuit) === 'dc') return { mA: 0, because: [] };
  if (builtIn === undefined) return missing(builtInPath);
  return builtIn === 'rc' ? missing(leakPath) : { mA: 0, because: [] };
}

/** Through an RC that the drawing puts across the contact: 2πfCU at the high supply. On DC it blocks. */
function ofContactRc(circuit: Circuit, frequencyHz: number): Leak | Outcome {
  const { suppressor, suppressorPath, volts } = circuit;
  const across = suppressor?.kind === 'rc' && suppressor.at === 'contact' && currentOf(circuit) === 'ac';
  if (!across) return { mA: 0, because: [] };
  if (suppressor.uF === undefined) return missing(`${suppressorPath}.uF`);
  const mA = capacitorLeakmA(suppressor.uF, volts.maxV, frequencyHz);
  return {
    mA,
    because: [
      quantity('capacitor', suppressor.uF, 'µF', `${suppressorPath}.uF`),
      quantity('capacitor-leakage', mA, 'mA', '2πfCU'),
    ],
  };
}

const isLeak = (part: Leak | Outcome): part is Leak => typeof part === 'object' && 'mA' in part;

/** All leakages of a circuit added up, in mA; or the datum that is missing for the sum. */
export function leakageOf(circuit: Circuit, frequencyHz: number): Leak | Outcome {
  const parts = [ofSwitch(circuit), ofContactRc(circuit, frequencyHz)];
  const lacking = parts.find((part) => !isLeak(part));
  if (lacking !== undefined) return lacking;
  const leaks = parts.filter(isLeak);
  return {
    mA: leaks.reduce((sum, leak) => sum + leak.mA, 0),
    because: leaks.flatMap((leak) => leak.because),
  };
}
