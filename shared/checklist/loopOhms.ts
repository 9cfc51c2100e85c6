/** The resistance that a cable's two conductors should show, out and back, with the far end shorted. */
import type { Cable } from '../panel/device';
import { inThousandths } from './inThousandths';
import { ohmPerKm } from './ohmPerKm';

// Conductor resistances are tabulated at 20 °C (IEC 60228).
const coldC = 20;
// Wide enough for a warm cable and clips, narrow enough to find a loose strand (checklist.md, Check cold).
const share = 0.2;
const leastOhm = 0.5;

export interface ExpectedOhms {
  ohm: number;
  ohmPerKm: number;
  low: number;
  high: number;
}

/** Expected `2·R′·l` ± the larger of 20 % and 0.5 ohm. */
export function loopOhms(cable: Cable): ExpectedOhms {
  const perKm = ohmPerKm(cable, coldC);
  const ohm = (2 * perKm * cable.lengthM) / 1000;
  const spread = Math.max(ohm * share, leastOhm);
  return {
    ohm: inThousandths(ohm),
    ohmPerKm: perKm,
    low: inThousandths(Math.max(0, ohm - spread)),
    high: inThousandths(ohm + spread),
  };
}
