/** What the conductor of a point's cable may carry, laid as the panel file says. */
import { ampacity } from '../../electrical/ampacity';
import { smallConductorCap } from '../../electrical/smallConductorCap';
import type { Cable } from '../../panel/device';
import type { Panel } from '../../panel/panelSchema';
import type { PointPlace, RuleContext } from '../context';
import { missing, type Outcome } from '../rule';

// Twenty loaded circuits together is the last row of the bunching table (IEC 60364-5-52 B.52.17).
const worstGrouped = 20;

export interface Carries {
  A: number;
  /** The same with as many loaded circuits beside it as the tables know. */
  worstA: number;
  /** The field that would make `A` certain; absent when it is. */
  lacks?: string;
}

function amps(cable: Cable, panel: Panel, grouped: number): number {
  const { practice, wiringMethod, ambientC } = panel;
  return ampacity(cable.size, { practice, method: wiringMethod, ambientC, grouped }) ?? 0;
}

/** Amps; 0 where the tables allow nothing. How many loaded circuits lie together is never assumed. */
export function carries({ point, path }: PointPlace, { panel }: RuleContext): Carries | Outcome {
  const { cable } = point;
  if (!cable) return missing(`${path}.cable`);
  if (cable.grouped !== undefined) {
    const A = amps(cable, panel, cable.grouped);
    return { A, worstA: A };
  }
  return {
    A: amps(cable, panel, 1),
    worstA: amps(cable, panel, worstGrouped),
    lacks: `${path}.cable.grouped`,
  };
}

/** The greatest fuse for a small conductor in NFPA practice, A (NEC 240.4(D)); Infinity elsewhere. */
export const fuseCapA = (cable: Cable, { panel }: RuleContext): number =>
  panel.practice === 'NFPA 79' ? (smallConductorCap(cable.size)?.fuseA ?? Infinity) : Infinity;

export const isCarries = (value: Carries | Outcome): value is Carries =>
  typeof value === 'object' && 'worstA' in value;
