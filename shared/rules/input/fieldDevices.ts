/** The devices between a supply and an input: which of them can conduct, what they keep, what they let through. */
import type { Device } from '../../panel/device';
import { isAc, type InputPlace } from './inputPlace';

/** A device with its path in the panel file. */
export interface Fitted {
  device: Device;
  path: string;
}

// Every input rule asks for them: put together once a point.
const known = new WeakMap<InputPlace['point'], { strings: Fitted[][]; all: Fitted[] }>();

function reckon({ point, path }: Pick<InputPlace, 'point' | 'path'>): Fitted[][] {
  const series = (point.series ?? []).map((device, n) => ({ device, path: `${path}.series.${n}` }));
  const parallel = (point.parallel ?? []).map((device, n) => [{ device, path: `${path}.parallel.${n}` }]);
  return [[{ device: point.device, path: `${path}.device` }, ...series], ...parallel];
}

function fitted(at: Pick<InputPlace, 'point' | 'path'>) {
  const reckoned = known.get(at.point);
  if (reckoned) return reckoned;
  const strings = reckon(at);
  const made = { strings, all: strings.flat() };
  known.set(at.point, made);
  return made;
}

/** The strings that can switch the input on: the point's device with those in series, and each one in parallel. */
export const branches = (at: Pick<InputPlace, 'point' | 'path'>): Fitted[][] => fitted(at).strings;

export const fittedDevices = (at: Pick<InputPlace, 'point' | 'path'>): Fitted[] => fitted(at).all;

/** Current into the terminal: the common is at 0 V (IEC 61131-2 calls such an input sinking). */
export const isSinking = ({ group }: Pick<InputPlace, 'group'>): boolean => group.common === 'negative';

/** `unknown`: no switch at all, so nobody can say what it does at an input. */
export function conducts({ device }: Fitted, at: InputPlace): 'yes' | 'no' | 'unknown' {
  const dc = !isAc(at);
  switch (device.kind) {
    case 'contact':
    case 'ssr-output':
      return 'yes';
    case 'two-wire':
      return (device.current === 'dc') === dc ? 'yes' : 'no';
    case 'npn':
      return dc && at.group.common === 'positive' ? 'yes' : 'no';
    case 'pnp':
      return dc && at.group.common === 'negative' ? 'yes' : 'no';
    case 'push-pull':
      return dc ? 'yes' : 'no';
    case 'namur':
      return 'no';
    default:
      return 'unknown';
  }
}

/** True where the only LED of the input stands the wrong way round for its common. */
export const ledReversed = ({ io, group }: InputPlace): boolean =>
  !(io.kind === 'digital-input' && io.bridge === true) &&
  ((io.polarity === 'positive-only' && group.common === 'positive') ||
    (io.polarity === 'negative-only' && group.common === 'negative'));

const sum = (numbers: number[]) => numbers.reduce((total, each) => total + each, 0);

export const dropOf = ({ device }: Fitted): number => ('dropV' in device ? device.dropV : 0);
/** A push-pull sensor that is off pulls the input to the other pole: nothing leaks into it. */
export const leakOf = ({ device }: Fitted): number =>
  'leakmA' in device && device.kind !== 'push-pull' ? device.leakmA : 0;
const ownCurrent = ({ device }: Fitted): number => ('supplymA' in device ? device.supplymA : 0);

/** The branch that keeps most volts: each of the branches must be able to switch the input on. */
export const worstDropV = (at: InputPlace): number =>
  Math.max(...branches(at).map((branch) => sum(branch.map(dropOf))));

/** What three-wire sensors draw for themselves through the supply core of the cable. */
export const sensormA = (at: InputPlace): number => sum(fittedDevices(at).map(ownCurrent));

/** One device of a string may be off while the others are on, so its leakage passes; strings side by side add up. */
export const worstLeakmA = (at: InputPlace): number =>
  sum(
    branches(at).map((branch) =>
      Math.max(...branch.map((fitted) => (conducts(fitted, at) === 'yes' ? leakOf(fitted) : 0))),
    ),
  );
