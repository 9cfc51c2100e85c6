/** Whether a supply is extra-low or low voltage, by its volts alone, and how much insulation its neighbour needs. */
import type { Supply } from '../../panel/panelSchema';

/** IEC 61140 / IEC 60449 band I: at most 50 V AC or 120 V DC. Extra-low by volts, whether SELV, PELV or neither. */
export const isBandOne = ({ kind, V }: Supply): boolean => V <= (kind === 'dc' ? 120 : 50);

export interface Mixed {
  low: Supply;
  high: Supply;
}

/** One supply of each band, the high one the highest; undefined where all are of one band. */
export function mixedBands(supplies: readonly Supply[]): Mixed | undefined {
  const [low] = supplies.filter(isBandOne);
  const high = supplies
    .filter((supply) => !isBandOne(supply))
    .reduce<Supply | undefined>((most, supply) => (most && most.V >= supply.V ? most : supply), undefined);
  return low && high ? { low, high } : undefined;
}
