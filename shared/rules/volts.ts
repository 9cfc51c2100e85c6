/** The range of volts a supply can have, and whether the file states it. */
import type { Group, Supply } from '../panel/panelSchema';

export interface Volts {
  nominalV: number;
  /** Low and high end; both nominal while the tolerance is not stated. */
  minV: number;
  maxV: number;
  /** False: the ends are only nominal, so what passes here is not yet proven. */
  known: boolean;
  /** The field that would make them known. */
  tolerancePath: string;
}

function volts(supply: Supply, nominalV: number): Volts {
  const { minPct, maxPct } = supply.tolerance ?? { minPct: 0, maxPct: 0 };
  return {
    nominalV,
    minV: nominalV * (1 + minPct / 100),
    maxV: nominalV * (1 + maxPct / 100),
    known: supply.tolerance !== undefined,
    tolerancePath: `supplies.${supply.tag}.tolerance`,
  };
}

/** Volts between the supply's poles (three-phase: between lines). */
export const supplyVolts = (supply: Supply): Volts => volts(supply, supply.V);

/** Volts between a group's common and the supply's other pole: to neutral where one phase of a supply with N is used. */
export function groupVolts(supply: Supply, group: Group): Volts {
  const toNeutral =
    supply.kind === 'ac3' &&
    group.phase !== undefined &&
    'L3' in supply.terminals &&
    supply.terminals.N !== undefined;
  return volts(supply, toNeutral ? supply.V / Math.sqrt(3) : supply.V);
}

/** IEC 61558-1 (IEV "safety extra-low voltage"): at most 50 V AC r.m.s. or 120 V ripple-free DC. */
export function isExtraLow(supply: Supply): boolean {
  if (supply.extraLow === 'none') return false;
  return supply.V <= (supply.kind === 'dc' ? 120 : 50);
}
