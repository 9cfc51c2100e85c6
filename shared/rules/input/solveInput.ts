/** One input on one supply voltage with one model of what it draws. */
import { ledRmsmA } from '../../electrical/acInput';
import { parallel } from '../../electrical/bleeder';
import { solveInputLoop, type Draw, type Solved } from '../../electrical/inputLoop';
import { cableLoopOhm } from '../cableOhms';
import { sensormA, worstDropV } from './fieldDevices';
import { isAc, type InputPlace } from './inputPlace';

export interface Conditions {
  V: number;
  draw: Draw;
  bleederOhm?: number | undefined;
  /** What the closed devices keep; the worst of the point's branches unless said otherwise. */
  dropV?: number;
  /** Cable left out: for the greatest current, or where none is stated. */
  noCable?: boolean;
}

/** What the LED inside an input carries, else what the input draws: what its limits are compared with. */
export const sensed = ({ ledmA, mA }: Solved): number => ledmA ?? mA;

/** LEDs on AC conduct a part of each half-wave only. */
function withRmsLed(solved: Solved, draw: Draw, openV: number, sourceOhm: number): Solved {
  if (draw.kind !== 'led') return solved;
  const { seriesOhm, parallelOhm, Vf } = draw;
  const ohm = seriesOhm + sourceOhm;
  const threshold = Vf * (parallelOhm === undefined ? 1 : 1 + ohm / parallelOhm);
  return { ...solved, ledmA: ledRmsmA(openV, ohm, threshold) };
}

export function solveInput(at: InputPlace, conditions: Conditions): Solved {
  const { V, draw, bleederOhm, noCable = false } = conditions;
  const cableOhm = noCable || !at.point.cable ? 0 : cableLoopOhm(at.point.cable);
  const dropV = (conditions.dropV ?? worstDropV(at)) + (sensormA(at) / 1000) * (cableOhm / 2);
  const solved = solveInputLoop({ V, dropV, cableOhm, bleederOhm, draw });
  if (!isAc(at)) return solved;
  const share = bleederOhm === undefined ? 1 : bleederOhm / (bleederOhm + cableOhm);
  return withRmsLed(solved, draw, Math.max(0, V - dropV) * share, parallel(cableOhm, bleederOhm ?? Infinity));
}
