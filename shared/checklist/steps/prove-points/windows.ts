/** The volts to expect at a terminal when a point is on and off, each with its sum. */
import type { Device } from '../../../panel/device';
import type { Supply } from '../../../panel/panelSchema';
import { say, type Text } from '../../../panel/says';
import type { PointFacts } from '../../facts';
import { inThousandths } from '../../inThousandths';
import { supplyLimits } from '../../supplyLimits';

export interface Window {
  low?: number;
  high?: number;
  why?: Text;
}

/** Volts a closed field device keeps for itself, at most. */
const dropOf = (device: Device): number => ('dropV' in device ? device.dropV : 0);

const totalDrop = ({ point }: PointFacts): number =>
  [point.device, ...(point.series ?? [])].reduce((sum, device) => sum + dropOf(device), 0);

/**
 * Lowest: supply at its low limit, less what device or output and cable keep; highest: supply at its high limit.
 * A cable of unknown resistance or an unstated drop leaves no low limit: a sum with a hole in it is none.
 */
function switchedOn(
  supply: Supply | undefined,
  drop: number | undefined,
  cable: number | undefined,
  why: string,
): Window {
  const limits = supply && supplyLimits(supply);
  if (!limits) return {};
  if (drop === undefined || cable === undefined) return { high: limits.high, why: limits.why };
  return {
    low: inThousandths(Math.max(0, limits.low - drop - cable)),
    high: limits.high,
    why: say(why, {
      V: supply.V,
      factor: 1 + (supply.tolerance?.minPct ?? 0) / 100,
      drop,
      cable: inThousandths(cable),
    }),
  };
}

export const inputOn = (worked: PointFacts, cable: number | undefined): Window =>
  switchedOn(worked.supply, totalDrop(worked), cable, 'checklist.why.input-on');

/** At most the module's own off voltage, either way round; without it no limit. */
export function inputOff(offV: number | undefined): Window {
  if (offV === undefined) return {};
  const high = inThousandths(offV);
  return { low: -high, high, why: say('checklist.why.input-off', { V: high }) };
}

// Default drop-out of a coil: 10 % DC, 15 % AC of its rated volts (wiring.md, from memory).
const dropOutPct = (supply: Supply) => (supply.kind === 'dc' ? 10 : 15);

/** At the load. */
export function outputOn({ supply, module }: PointFacts, cable: number | undefined): Window {
  const { io } = module;
  // Closed relay contacts keep next to nothing; a transistor or triac that states no drop keeps nobody knows what.
  const drop = io.kind !== 'digital-output' || io.technology === 'relay' ? 0 : io.onDropV;
  return switchedOn(supply, drop, cable, 'checklist.why.output-on');
}

/** Off, a load must see less than holds it in, either way round. */
export function outputOff({ supply, point }: PointFacts): Window {
  const { device } = point;
  if (!supply || device.kind !== 'load') return {};
  const percent = device.dropOutPct ?? dropOutPct(supply);
  const high = inThousandths((device.V * percent) / 100);
  return { low: -high, high, why: say('checklist.why.output-off', { V: device.V, percent }) };
}
