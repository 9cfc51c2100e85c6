/** The resistor across an input that settles its leakage and its sensor's least load at once, and whether all bear it. */
import { ohmAgainstCapacitance } from '../../electrical/acInput';
import { bleederAtMost, leakageBleeder, loadBleeder, type Bleeder } from '../../electrical/bleeder';
import { drawnmA } from '../../electrical/inputLoop';
import type { Quantity, Remedy, StepSeed } from '../finding';
import { say } from '../../panel/says';
import { cableLoopOhm } from '../cableOhms';
import { quantity } from '../rule';
import { drawsOf, offOhm } from './draws';
import { fittedDevices, worstDropV, worstLeakmA } from './fieldDevices';
import type { InputPlace } from './inputPlace';
import { limitsOf, type Limits } from './limits';
import { leastLoad } from './leastLoad';
import { cableReactance, offState } from './offState';
import { onState } from './onState';
import { solveInput } from './solveInput';

/** What the input takes itself at its off volts, mA; 0 where nobody knows. */
function inputmA({ io }: InputPlace, limits: Limits): number {
  if (io.kind === 'opto-input') return limits.offmA;
  const ohm = offOhm(io);
  return ohm === undefined ? 0 : (limits.offV / ohm) * 1000;
}

/** Across a long AC cable: alone by its reactance, with a leakage beside it by both currents added. */
function capacitanceOhm(at: InputPlace, limits: Limits): number {
  const cable = cableReactance(at);
  const reactance = 'is' in cable ? cable.is : Infinity;
  if (reactance === Infinity) return Infinity;
  const { maxV } = at.volts;
  const taken = inputmA(at, limits);
  const leakmA = worstLeakmA(at);
  if (leakmA > 0) {
    const restmA = leakmA + (maxV / reactance) * 1000 - taken;
    return restmA > 0 ? (limits.offV / restmA) * 1000 : Infinity;
  }
  const together = ohmAgainstCapacitance(maxV, limits.offV, reactance);
  const beside = 1 / together - taken / 1000 / limits.offV;
  return beside > 0 ? 1 / beside : Infinity;
}

/** The greatest resistance that keeps the input off, ohm; Infinity where it is off without one. */
function offNeed(at: InputPlace, limits: Limits): number {
  const bare = offState(at, { leakage: true, capacitance: true }, Infinity);
  if ('is' in bare && bare.is.state === 'off') return Infinity;
  const made = leakageBleeder({
    offV: limits.offV,
    leakmA: worstLeakmA(at),
    inputmA: inputmA(at, limits),
    highestV: at.volts.maxV,
  });
  return Math.min(made?.atMostOhm ?? Infinity, capacitanceOhm(at, limits));
}

/** The greatest resistance that gives a two-wire sensor its least current, ohm: at the volts left when that current flows. */
function loadNeed(at: InputPlace): number {
  const load = leastLoad(at, Infinity);
  if (!('is' in load) || load.is.mA >= load.is.minmA) return Infinity;
  const { minmA } = load.is;
  const cableOhm = at.point.cable ? cableLoopOhm(at.point.cable) : 0;
  const lowestV = at.volts.minV - worstDropV(at) - (minmA / 1000) * cableOhm;
  const inputmA = Math.min(...drawsOf(at.io, 'max').models.map((draw) => drawnmA(draw, lowestV)));
  const made = loadBleeder({ lowestV, minmA, inputmA, highestV: at.volts.maxV });
  return made?.atMostOhm ?? Infinity;
}

/** What the devices must carry with the resistor fitted, mA: no drop, no cable, the supply at its highest. */
export function greatestmA(at: InputPlace, bleederOhm: number | undefined): number {
  const conditions = { V: at.volts.maxV, bleederOhm, dropV: 0, noCable: true };
  return Math.max(
    ...drawsOf(at.io, 'min').models.map((draw) => solveInput(at, { ...conditions, draw }).loopmA),
  );
}

export const carriedmA = (at: InputPlace): number =>
  Math.min(
    ...fittedDevices(at).map(({ device }) => ('maxmA' in device ? (device.maxmA ?? Infinity) : Infinity)),
  );

/** The resistor, or undefined where none is needed. */
export function bleederFor(at: InputPlace): Bleeder | undefined {
  const limits = limitsOf(at);
  if (!limits) return undefined;
  const atMost = Math.min(offNeed(at, limits), loadNeed(at));
  return atMost < Infinity ? bleederAtMost(atMost, at.volts.maxV) : undefined;
}

/** What keeps the resistor from being fitted, as the last word of the remedy's key; undefined where it can be. */
function obstacle(at: InputPlace, { ohm, W }: Bleeder): 'heat' | 'sensor' | 'on' | undefined {
  if (W === undefined) return 'heat';
  if (greatestmA(at, ohm) > carriedmA(at)) return 'sensor';
  const on = onState(at, ohm);
  return 'is' in on && on.is.state !== 'on' ? 'on' : undefined;
}

export interface Offer {
  because: Quantity[];
  remedy?: Remedy;
  addsSteps?: StepSeed[];
}

/** A resistor as remedy with its step; or, where it cannot be fitted, another sensor or input. */
export function offerBleeder(at: InputPlace): Offer {
  const bleeder = bleederFor(at);
  if (!bleeder) return { because: [] };
  const { atMostOhm, ohm, heatW, W = 0 } = bleeder;
  const because = [
    quantity('bleeder-most', atMostOhm, 'ohm', 'Ohm'),
    quantity('bleeder-heat', heatW, 'W', 'V²/R'),
  ];
  const against = obstacle(at, bleeder);
  if (against !== undefined)
    return {
      because,
      remedy: { says: say(`finding.remedy.bleeder.${against}`, { ohm }), values: { ohm } },
    };
  return {
    because,
    remedy: { says: say('finding.remedy.bleeder', { ohm, W }), values: { ohm, W } },
    addsSteps: [{ family: 'fit-bleeder', where: at.where, params: { ohm, W } }],
  };
}
