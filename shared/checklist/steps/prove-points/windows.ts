/** The volts to expect at a terminal when a point is on and off, each with its sum. */
import type { Device } from '../../../panel/device';
import type { DigitalInput } from '../../../panel/moduleIo';
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

/** Lowest: supply at its low limit, less what device and cable keep. Highest: supply at its high limit. */
export function inputOn(worked: PointFacts, cableDropV: number): Window {
  const limits = worked.supply && supplyLimits(worked.supply);
  if (!limits || !worked.supply) return {};
  const drop = totalDrop(worked);
  return {
    low: inThousandths(Math.max(0, limits.low - drop - cableDropV)),
    high: limits.high,
    why: say('checklist.why.input-on', {
      V: worked.supply.V,
      factor: 1 + (worked.supply.tolerance?.minPct ?? 0) / 100,
      drop,
      cable: cableDropV,
    }),
  };
}

/** At most the module's own off voltage, either way round; without it no limit. */
export function inputOff(io: DigitalInput, offV: number | undefined): Window {
  const high = io.thresholds?.UL_V ?? offV;
  return high === undefined ? {} : { low: -high, high, why: say('checklist.why.input-off', { V: high }) };
}

// Default drop-out of a coil: 10 % DC, 15 % AC of its rated volts (wiring.md, from memory).
const dropOutPct = (supply: Supply) => (supply.kind === 'dc' ? 10 : 15);

/** At the load: the supply's low limit less the output's own drop and the cable's. */
export function outputOn({ supply, module }: PointFacts, cableDropV: number): Window {
  const limits = supply && supplyLimits(supply);
  if (!limits || !supply) return {};
  const drop = module.io.kind === 'digital-output' ? (module.io.onDropV ?? 0) : 0;
  return {
    low: inThousandths(Math.max(0, limits.low - drop - cableDropV)),
    high: limits.high,
    why: say('checklist.why.output-on', {
      V: supply.V,
      factor: 1 + (supply.tolerance?.minPct ?? 0) / 100,
      drop,
      cable: cableDropV,
    }),
  };
}

/** Off, a load must see less than holds it in, either way round. */
export function outputOff({ supply, point }: PointFacts): Window {
  const { device } = point;
  if (!supply || device.kind !== 'load') return {};
  const percent = device.dropOutPct ?? dropOutPct(supply);
  const high = inThousandths((device.V * percent) / 100);
  return { low: -high, high, why: say('checklist.why.output-off', { V: device.V, percent }) };
}
