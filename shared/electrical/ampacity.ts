/** What a conductor may carry for long, by the panel's practice. */
import {
  iecAmbient,
  iecBunched,
  iecElectronics,
  iecOnTray,
  iecOnWall,
  iecPower,
  necAmbient,
  necGrouped,
  nfpaSmall,
  type WiringMethod,
} from './ampacityTables';
import { areaMm2, gaugeOf, type Size } from './size';

export type Practice = 'IEC 60204-1' | 'NFPA 79';

/** The ambient temperature for which a practice prints its table, °C. */
export const tableAmbientC: Record<Practice, number> = { 'IEC 60204-1': 40, 'NFPA 79': 30 };

export interface Laid {
  practice: Practice;
  /** Default B2: multicore in conduit. */
  method?: WiringMethod | undefined;
  /** Default: the practice's own, 40 or 30 °C. */
  ambientC?: number | undefined;
  /** IEC: loaded circuits together. NFPA: current-carrying conductors together. Default one circuit. */
  grouped?: number | undefined;
  /** Inside the control enclosure NFPA 79 allows more. Default: field cable. */
  inEnclosure?: boolean | undefined;
}

// Metric sizes and gauges are compared by cross-section; this keeps rounding from losing a step.
const rounding = 1e-6;

/** The first row at or above a value: between two, the harder one. */
const atOrAbove = (rows: readonly (readonly [number, number])[], value: number): number | undefined =>
  rows.find(([limit]) => limit >= value)?.[1];

/** The last row at or below a size: between two, the lower. */
const atOrBelow = <T>(rows: readonly (readonly [number, T])[], mm2: number): T | undefined =>
  rows.findLast(([size]) => size <= mm2 * (1 + rounding))?.[1];

const groupedBy = { B1: iecBunched, B2: iecBunched, C: iecOnWall, E: iecOnTray };

function iecAmps(mm2: number, method: WiringMethod): number | undefined {
  return atOrBelow(iecPower, mm2)?.[method] ?? atOrBelow(iecElectronics, mm2);
}

function nfpaAmps(mm2: number, inEnclosure: boolean): number | undefined {
  const gauge = gaugeOf(mm2);
  const row = nfpaSmall.findLast(([awg]) => awg >= gauge - rounding)?.[1];
  return inEnclosure ? row?.enclosure : row?.cable;
}

const product = (...factors: (number | undefined)[]): number | undefined =>
  factors.reduce(
    (made, factor) => (made === undefined || factor === undefined ? undefined : made * factor),
    1,
  );

/**
 * Amperes, or undefined where the tables give nothing (too thin, too hot, too many together).
 * Between tabulated sizes the lower; above the greatest tabulated size that size's value.
 */
export function ampacity(size: Size, laid: Laid): number | undefined {
  const { practice, method = 'B2', ambientC = tableAmbientC[practice], grouped, inEnclosure = false } = laid;
  const mm2 = areaMm2(size);
  return practice === 'IEC 60204-1'
    ? product(
        iecAmps(mm2, method),
        atOrAbove(iecAmbient, ambientC),
        atOrAbove(groupedBy[method], grouped ?? 1),
      )
    : product(
        nfpaAmps(mm2, inEnclosure),
        atOrAbove(necAmbient, ambientC),
        atOrAbove(necGrouped, grouped ?? 2),
      );
}
