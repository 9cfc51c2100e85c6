/** What an input reads when its device has switched, at the supply's low limit. */
import type { InputState } from '../../electrical/inputState';
import type { Solved } from '../../electrical/inputLoop';
import type { Quantity } from '../finding';
import { cableLoopOhm } from '../cableOhms';
import { quantity } from '../rule';
import { drawsOf } from './draws';
import { conducts, fittedDevices, ledReversed, worstDropV } from './fieldDevices';
import type { InputPlace } from './inputPlace';
import { limitsOf } from './limits';
import { sensed, solveInput } from './solveInput';

export interface Reading {
  state: InputState;
  V: number;
  /** Of an optocoupler its LED's. */
  mA: number;
  /** The sum, put together only for a finding. */
  because: () => Quantity[];
}
export type Known<T> = { is: T } | { missing: string };

const rank: Record<InputState, number> = { off: 0, undefined: 1, on: 2 };

const dark = (at: InputPlace): Reading => ({
  state: 'off',
  V: 0,
  mA: 0,
  because: () => [quantity('supply-low', at.volts.minV, 'V', at.volts.tolerancePath)],
});

function because(at: InputPlace, solved: Solved): Quantity[] {
  const { volts, point, path, io } = at;
  return [
    quantity('supply-low', volts.minV, 'V', volts.tolerancePath),
    quantity('device-drop', worstDropV(at), 'V', `${path}.device.dropV`),
    ...(point.cable
      ? [quantity('cable-resistance', cableLoopOhm(point.cable), 'ohm', 'IEC 60228 / ASTM B258 at 70 °C')]
      : []),
    quantity('input-volts', solved.V, 'V', 'solved loop'),
    quantity(io.kind === 'opto-input' ? 'led-current' : 'input-current', sensed(solved), 'mA', 'solved loop'),
  ];
}

/** The device that is no switch, if there is one. */
export const notASwitch = (at: InputPlace): string | undefined =>
  fittedDevices(at).find((fitted) => conducts(fitted, at) === 'unknown')?.path;

const isBlocked = (at: InputPlace): boolean =>
  ledReversed(at) || fittedDevices(at).some((fitted) => conducts(fitted, at) === 'no');

/**
 * The worst reading that the stated data allow. Where something is not stated the answer stands only if it does not
 * hang on it: already failing without the cable and with the least current, or passing with the most.
 */
function reckon(at: InputPlace, bleederOhm: number | undefined): Known<Reading> {
  const { volts, point, path, io, ioPath } = at;
  const strange = notASwitch(at);
  if (strange !== undefined) return { missing: strange };
  if (isBlocked(at)) return { is: dark(at) };
  const limits = limitsOf(at);
  if (!limits) return { missing: `${ioPath}.thresholds` };
  const { models, lacks, unbounded } = drawsOf(io, 'max');
  const readings = models
    .map((draw): Reading => {
      const solved = solveInput(at, { V: volts.minV, draw, bleederOhm });
      return {
        state: limits.state(solved.V, sensed(solved)),
        V: solved.V,
        mA: sensed(solved),
        because: () => [...because(at, solved), ...limits.on],
      };
    })
    .sort((a, b) => rank[a.state] - rank[b.state]);
  const [worst] = readings;
  const best = readings.at(-1);
  if (!worst || !best) return { missing: ioPath };
  // A custom input of unknown current: with none at all its volts may already be too low.
  if (unbounded && best.V >= limits.onV) return { missing: `${ioPath}.${lacks ?? ''}` };
  if (best.state === 'on' && worst.state !== 'on' && lacks !== undefined)
    return { missing: `${ioPath}.${lacks}` };
  if (worst.state === 'on' && !point.cable) return { missing: `${path}.cable` };
  if (worst.state === 'on' && !volts.known) return { missing: volts.tolerancePath };
  return { is: worst };
}

const known = new WeakMap<InputPlace, Known<Reading>>();

/** As wired, or with another resistor across the input. */
export function onState(at: InputPlace, bleederOhm?: number): Known<Reading> {
  if (bleederOhm !== undefined) return reckon(at, bleederOhm);
  const reading = known.get(at) ?? reckon(at, at.point.bleeder?.ohm);
  known.set(at, reading);
  return reading;
}

/** Volts the supply must keep at its low limit so that the input is on, with this cable and these devices. */
export function neededV(at: InputPlace): number | undefined {
  const limits = limitsOf(at);
  const [draw] = drawsOf(at.io, 'max').models.slice(-1);
  if (!limits || !draw) return undefined;
  const cableOhm = at.point.cable ? cableLoopOhm(at.point.cable) : 0;
  const mA =
    draw.kind === 'constant-current'
      ? draw.mA
      : draw.kind === 'resistive'
        ? (limits.onV / draw.ohm) * 1000
        : ledmA(at, draw.Vf);
  const beside = at.point.bleeder ? (limits.onV / at.point.bleeder.ohm) * 1000 : 0;
  return limits.onV + worstDropV(at) + ((mA + beside) / 1000) * cableOhm;
}

const ledmA = ({ io }: InputPlace, Vf: number): number =>
  io.kind === 'opto-input' ? io.onmA + (io.parallelOhm === undefined ? 0 : (Vf / io.parallelOhm) * 1000) : 0;
