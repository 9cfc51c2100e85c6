/** What an input reads at a voltage and a current. */
import type { InputLimits } from './inputTypes';

export type InputState = 'on' | 'off' | 'undefined';

// Sums of tenths miss a limit in the last digit: a millionth of a volt says nothing about a panel.
const hair = 1e-6;

/** A declared type 1 to 3: its voltage alone makes it on; off by either of the table's two limits. */
export function standardState(limits: InputLimits, V: number, mA: number): InputState {
  if (V >= limits.UH_V - hair) return 'on';
  if (V <= limits.UL2_V + hair) return 'off';
  return mA <= limits.ITmA + hair && V <= limits.UL1_V + hair ? 'off' : 'undefined';
}

export interface CustomLimits {
  UL_V: number;
  UH_V: number;
  IT_mA: number;
  IH_mA: number;
}

/** A maker's own limits: on needs volts and current, off needs one of the two. */
export function customState(limits: CustomLimits, V: number, mA: number): InputState {
  if (V >= limits.UH_V - hair && mA >= limits.IH_mA - hair) return 'on';
  return V <= limits.UL_V + hair || mA <= limits.IT_mA + hair ? 'off' : 'undefined';
}
