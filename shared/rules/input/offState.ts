/** What an input reads when its device has not switched: by the device's leakage, and on AC through the cable. */
import { cableFarad, reactanceOhm, voltsThroughCapacitance } from '../../electrical/acInput';
import { parallel } from '../../electrical/bleeder';
import { solveLeakage } from '../../electrical/inputLoop';
import type { DigitalInput, OptoInput } from '../../panel/moduleIo';
import type { Quantity } from '../finding';
import { quantity } from '../rule';
import { offOhm } from './draws';
import { ledReversed, worstLeakmA } from './fieldDevices';
import type { InputPlace } from './inputPlace';
import { limitsOf, type Limits } from './limits';
import { notASwitch, type Known, type Reading } from './onState';

/** Which causes to count. */
export interface Causes {
  leakage: boolean;
  capacitance: boolean;
}

/** Of the cable's cores against each other, ohm; Infinity on DC. */
export function cableReactance({ point, path, frequencyHz, supply }: InputPlace): Known<number> {
  if (supply.kind === 'dc') return { is: Infinity };
  const { cable } = point;
  if (!cable) return { missing: `${path}.cable` };
  if (cable.pFperM === undefined) return { missing: `${path}.cable.pFperM` };
  return { is: reactanceOhm(frequencyHz, cableFarad(cable.pFperM, cable.lengthM)) };
}

function because(at: InputPlace, leakmA: number, reactance: number, limits: Limits): Quantity[] {
  const { io, ioPath, path, point, volts } = at;
  const ohm = io.kind === 'digital-input' ? offOhm(io) : undefined;
  return [
    ...(leakmA > 0 ? [quantity('leakage', leakmA, 'mA', `${path}.device.leakmA`)] : []),
    ...(reactance < Infinity
      ? [
          quantity('supply-high', volts.maxV, 'V', volts.tolerancePath),
          quantity('cable-reactance', reactance, 'ohm', `${path}.cable.pFperM`),
        ]
      : []),
    ...(ohm !== undefined ? [quantity('input-resistance', ohm, 'ohm', `${ioPath}.inputOhm`)] : []),
    ...(point.bleeder ? [quantity('bleeder', point.bleeder.ohm, 'ohm', `${path}.bleeder.ohm`)] : []),
    ...limits.off,
  ];
}

interface Off {
  leakmA: number;
  reactance: number;
  bleederOhm: number;
  limits: Limits;
}

type Bare = Omit<Reading, 'because'>;

/** Volts and milliamperes of an input whose resistance is known: both causes add up at most. */
function digitalOff(io: DigitalInput, at: InputPlace, off: Off): Known<Bare> {
  const { leakmA, reactance, bleederOhm, limits } = off;
  const ohm = offOhm(io);
  const throughCable = reactance === Infinity ? 0 : (at.volts.maxV / reactance) * 1000;
  if (ohm === undefined) {
    const mA = leakmA + throughCable;
    const V = mA === 0 ? 0 : Math.min(at.volts.maxV, (mA / 1000) * bleederOhm);
    if (mA <= limits.offmA || V <= limits.offV) return { is: { state: 'off', V, mA } };
    return { missing: `${at.ioPath}.inputOhm` };
  }
  const leak = solveLeakage({
    leakmA,
    highestV: at.volts.maxV,
    bleederOhm,
    draw: { kind: 'resistive', ohm },
  });
  const V = Math.min(
    at.volts.maxV,
    leak.V + voltsThroughCapacitance(at.volts.maxV, parallel(ohm, bleederOhm), reactance),
  );
  const mA = (V / ohm) * 1000;
  return { is: { state: limits.state(V, mA), V, mA } };
}

function optoOff(io: OptoInput, at: InputPlace, off: Off): Known<Bare> {
  const throughCable = off.reactance === Infinity ? 0 : (at.volts.maxV / off.reactance) * 1000;
  const { V, ledmA = 0 } = solveLeakage({
    leakmA: off.leakmA + throughCable,
    highestV: at.volts.maxV,
    bleederOhm: off.bleederOhm,
    draw: { kind: 'led', seriesOhm: io.seriesOhm, parallelOhm: io.parallelOhm, Vf: io.Vf.min },
  });
  return { is: { state: off.limits.state(V, ledmA), V, mA: ledmA } };
}

function reckon(at: InputPlace, causes: Causes, bleederOhm: number): Known<Reading> {
  const strange = notASwitch(at);
  if (strange !== undefined) return { missing: strange };
  const limits = limitsOf(at);
  if (!limits) return { missing: `${at.ioPath}.thresholds` };
  const cable = causes.capacitance ? cableReactance(at) : { is: Infinity };
  if ('missing' in cable) return cable;
  const reactance = cable.is;
  const leakmA = causes.leakage && !ledReversed(at) ? worstLeakmA(at) : 0;
  const off = { leakmA, reactance, bleederOhm, limits };
  const read = at.io.kind === 'digital-input' ? digitalOff(at.io, at, off) : optoOff(at.io, at, off);
  if ('missing' in read) return read;
  if (read.is.state === 'off' && reactance < Infinity && !at.volts.known)
    return { missing: at.volts.tolerancePath };
  const name = at.io.kind === 'opto-input' ? 'led-current' : 'input-current';
  return {
    is: {
      ...read.is,
      because: () => [
        ...because(at, leakmA, reactance, limits),
        quantity('input-volts', read.is.V, 'V', 'solved loop'),
        quantity(name, read.is.mA, 'mA', 'solved loop'),
      ],
    },
  };
}

const allCauses: Causes = { leakage: true, capacitance: true };
const known = new WeakMap<InputPlace, Known<Reading>>();

/** Reckons the reading, as wired unless said otherwise; `missing` where a number is lacking that decides. */
export function offState(at: InputPlace, causes = allCauses, bleederOhm?: number): Known<Reading> {
  const wiredOhm = at.point.bleeder?.ohm ?? Infinity;
  if (causes !== allCauses || bleederOhm !== undefined) return reckon(at, causes, bleederOhm ?? wiredOhm);
  const reading = known.get(at) ?? reckon(at, causes, wiredOhm);
  known.set(at, reading);
  return reading;
}
