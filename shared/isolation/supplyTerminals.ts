/** Where a supply is measured. */
import type { Supply } from '../panel/panelSchema';

/** Its terminals in the order of the file: plus, minus; L, N; L1, L2, L3, N. */
export const supplyTerminals = (supply: Supply): string[] =>
  Object.values<string | undefined>(supply.terminals).filter((tag) => tag !== undefined);
