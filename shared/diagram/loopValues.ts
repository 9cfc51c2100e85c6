/** What the loop of a DC input computes to, on and off, at the supply's stated volts: to read beside a meter, not a limit. */
import { conductorResistance } from '../electrical/conductorResistance';
import { solveInputLoop, solveLeakage, type Draw } from '../electrical/inputLoop';
import type { Cable, Device } from '../panel/device';
import type { ModuleIo } from '../panel/moduleIo';
import type { LoopFacts } from './loopFacts';

export interface LoopValue {
  V: number;
  mA: number;
}
export interface LoopValues {
  supplyV: number;
  on?: LoopValue;
  off?: LoopValue;
}

/** 20 °C: a reading on site, not the worst case of the wiring rules. */
const atC = 20;

function drawOf(io: ModuleIo): Draw | undefined {
  if (io.kind === 'opto-input')
    return {
      kind: 'led',
      seriesOhm: io.seriesOhm,
      parallelOhm: io.parallelOhm,
      Vf: (io.Vf.min + io.Vf.max) / 2,
    };
  if (io.kind !== 'digital-input') return undefined;
  if (io.characteristic === 'constant-current')
    return io.ratedmA === undefined ? undefined : { kind: 'constant-current', mA: io.ratedmA };
  return io.inputOhm === undefined ? undefined : { kind: 'resistive', ohm: io.inputOhm };
}

const cableOhm = ({ size, conductor, lengthM }: Cable): number =>
  (2 * lengthM * conductorResistance(size, conductor ?? 'class5', atC)) / 1000;

/** Volts that the closed device keeps and milliamperes that it lets past when open; undefined: the file does not tell. */
function keptBy(device: Device): { dropV: number; leakmA: number } | undefined {
  if (device.kind === 'contact') return { dropV: 0, leakmA: 0 };
  return 'dropV' in device && 'leakmA' in device ? device : undefined;
}

/**
 * Nothing is assumed: without cable, device data or the input's own resistance or current there is no value.
 * @returns volts at the input's terminals and milliamperes it draws.
 */
export function loopValues({ point, module, supply, dc }: LoopFacts): LoopValues | undefined {
  const draw = module && drawOf(module.io);
  const kept = [point.device, ...(point.series ?? [])].map(keptBy);
  const known = kept.every((each) => each !== undefined);
  if (!draw || !supply || !dc || !point.cable || !known || point.parallel) return undefined;
  const bleederOhm = point.bleeder?.ohm;
  const dropV = kept.reduce((sum, each) => sum + each.dropV, 0);
  // Devices in series let past no more than the tightest of them.
  const leakmA = Math.min(...kept.map((each) => each.leakmA));
  const on = solveInputLoop({ V: supply.V, dropV, cableOhm: cableOhm(point.cable), bleederOhm, draw });
  const off =
    draw.kind === 'constant-current'
      ? undefined
      : solveLeakage({ leakmA, highestV: supply.V, bleederOhm, draw });
  return { supplyV: supply.V, on, ...(off ? { off } : {}) };
}

/** As a meter would show it: three figures. */
export const figures = (value: number): number => Number(value.toPrecision(3));
