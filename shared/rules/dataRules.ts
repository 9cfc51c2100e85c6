/** The rules of the data themselves. `data.missing` is made by checkWiring from what the other rules lack. */
import { duplicateAddress, duplicateTerminal, duplicateWire } from './data/duplicates';
import { spareConnected } from './data/spareConnected';
import { unusedTerminal } from './data/unusedTerminal';
import type { Rule } from './rule';

export const dataRules: readonly Rule[] = [
  duplicateAddress,
  duplicateTerminal,
  duplicateWire,
  unusedTerminal,
  spareConnected,
];
