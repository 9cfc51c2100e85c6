/** The greatest fuse that NEC 240.4(D) lets protect a small copper conductor. */
import { areaMm2, gaugeOf, type Size } from './size';

export interface SmallConductorCap {
  /** Greatest rating of the overcurrent device, A. */
  fuseA: number;
  /** Greatest continuous load with that device, A; only 18 and 16 AWG have one. */
  continuousA?: number;
}

/** NEC 240.4(D), copper, by AWG. */
const caps: readonly (readonly [number, SmallConductorCap])[] = [
  [18, { fuseA: 7, continuousA: 5.6 }],
  [16, { fuseA: 10, continuousA: 8 }],
  [14, { fuseA: 15 }],
  [12, { fuseA: 20 }],
  [10, { fuseA: 30 }],
];

// Keeps a gauge that was reckoned back from mm² from losing its row to rounding.
const rounding = 1e-6;

/** The cap of a size, of the next thinner gauge between two; undefined below 18 AWG and above 10 AWG, where it says nothing. */
export function smallConductorCap(size: Size): SmallConductorCap | undefined {
  const gauge = 'awg' in size ? size.awg : gaugeOf(areaMm2(size));
  if (gauge <= 10 - 1 + rounding) return undefined;
  return caps.findLast(([awg]) => awg >= gauge - rounding)?.[1];
}
