/** The parts that the demo panels repeat: isolators, 24 V cards, field cables and what hangs on them. */
import type { Cable, DeviceOf, Suppressor } from '../../../shared/panel/device';
import type { DigitalInput, DigitalOutput } from '../../../shared/panel/moduleIo';
import type { Isolator, Point, Supply } from '../../../shared/panel/panelSchema';

export const isolator = (
  tag: string,
  more: Pick<Isolator, 'kind' | 'location'> & Partial<Isolator>,
): Isolator => ({
  tag,
  inPanel: false,
  inSight: true,
  operatedFrom: 'outside',
  opens: 'all-conductors',
  loadBreak: true,
  suitableForIsolation: true,
  purpose: 'both',
  lock: 'hasp',
  ...more,
});

/** A breaker behind the door: it protects, and the disconnect isolates. */
export const innerBreaker = (tag: string, location: string): Isolator =>
  isolator(tag, {
    kind: 'breaker',
    location,
    inPanel: true,
    operatedFrom: 'door-open',
    purpose: 'control',
    lock: 'device-needed',
    lockDevice: 'breaker clip',
  });

export const regulated: NonNullable<Supply['tolerance']> = { minPct: -5, maxPct: 5 };
export const mains: NonNullable<Supply['tolerance']> = { minPct: -10, maxPct: 10 };

export const input24: DigitalInput = {
  kind: 'digital-input',
  V: 24,
  current: 'dc',
  type: 3,
  inputOhm: 9600,
  ratedmA: 2.5,
  characteristic: 'constant-current',
  maxV: 30,
  reverseV: 30,
  bridge: false,
  polarity: 'positive-only',
};

export const output24: DigitalOutput = {
  kind: 'digital-output',
  technology: 'sourcing',
  Vmin: 19.2,
  Vmax: 28.8,
  pointA: 0.5,
  groupA: 4,
  inrush: { A: 1.5, ms: 20 },
  leakmA: 0.1,
  onDropV: 0.3,
  minLoadmA: 1,
  suppression: 'none',
};

export const terminalRange = { minMm2: 0.2, maxMm2: 2.5, torqueNm: 0.5 };

/** Terminals of one card, in order on its face. */
export const face = (module: string, from: number, to: number, common: string): string[] => [
  ...Array.from({ length: to - from + 1 }, (_, index) => `${module}:${from + index}`),
  common,
];

export const cable = (tag: string, lengthM: number, cores: number, more: Partial<Cable> = {}): Cable => ({
  tag,
  size: { mm2: 0.75 },
  lengthM,
  conductor: 'class5',
  screened: false,
  screenEarthed: 'none',
  cores,
  grouped: 1,
  pFperM: 120,
  insulationV: 300,
  type: 'Control cable, numbered cores',
  ...more,
});

export const pnp = (tag: string, location: string): DeviceOf<'pnp'> => ({
  kind: 'pnp',
  tag,
  location,
  dropV: 1.5,
  leakmA: 0.1,
  maxmA: 200,
  supplymA: 10,
});

export const contact = (tag: string, location: string): DeviceOf<'contact'> => ({
  kind: 'contact',
  tag,
  location,
});

export const twoWire = (tag: string, location: string): DeviceOf<'two-wire'> => ({
  kind: 'two-wire',
  tag,
  location,
  current: 'dc',
  dropV: 4,
  leakmA: 0.4,
  minmA: 2,
  maxmA: 100,
});

/** A 24 V DC coil: of a valve (solenoid) or of a relay (coil). */
export const coil24 = (
  tag: string,
  location: string,
  load: 'solenoid' | 'coil',
  A: number,
): DeviceOf<'load'> => ({
  kind: 'load',
  tag,
  location,
  load,
  V: 24,
  current: 'dc',
  A,
  inrushA: A,
  inrushMs: 20,
  LRms: 15,
  pickUpPct: 80,
  dropOutPct: 10,
  polarised: false,
  suppressed: false,
});

/** The coil of a contactor on AC: six times its holding current while it pulls in. */
export const acCoil = (tag: string, location: string, V: number, A: number): DeviceOf<'load'> => ({
  kind: 'load',
  tag,
  location,
  load: 'coil',
  V,
  current: 'ac',
  A,
  inrushA: 6 * A,
  inrushMs: 20,
  pickUpPct: 85,
  dropOutPct: 15,
  polarised: false,
  suppressed: false,
});

export const lamp24 = (tag: string, location: string): DeviceOf<'load'> => ({
  kind: 'load',
  tag,
  location,
  load: 'led',
  V: 24,
  current: 'dc',
  A: 0.03,
  inrushA: 0.1,
  inrushMs: 2,
  pickUpPct: 70,
  dropOutPct: 10,
  polarised: true,
  reversed: false,
  suppressed: true,
});

export const diode: Suppressor = { kind: 'diode', at: 'load', V: 400, A: 1, reversed: false };

interface Wired {
  module: string;
  number: number;
  group: string;
  description: string;
  device: Point['device'];
  lengthM: number;
}

const address = (module: string, number: number): string =>
  `${module}.${number < 10 ? `0${number}` : number}`;

/** An input on 24 V: its signal core, its plus core, and for a three-wire sensor its minus core. */
export function inputPoint({ module, number, group, description, device, lengthM }: Wired): Point {
  const wire = `${module}-${number}`;
  const threeWire = device.kind === 'pnp' || device.kind === 'push-pull';
  // A sensor's own cable has the cores of IEC 60947-5-2: brown plus, black switched, blue minus.
  const colours = threeWire
    ? { plus: 'BN', signal: 'BK', minus: 'BU' }
    : { plus: 'BN', signal: 'BU', minus: 'BU' };
  const core = (role: 'plus' | 'minus', strip: string) => ({
    role,
    wire: `${wire}${strip}`,
    colour: colours[role],
    terminal: `X2:${module}.${number}${strip}`,
  });
  return {
    address: address(module, number),
    terminal: `${module}:${number}`,
    wire,
    description,
    group,
    conductors: [
      { role: 'signal', wire, colour: colours.signal, terminal: `${module}:${number}` },
      core('plus', '+'),
      ...(threeWire ? [core('minus', '-')] : []),
    ],
    device,
    cable: cable(`W-${module}-${number}`, lengthM, threeWire ? 3 : 2),
    otherSupply: 'none',
  };
}

/** The return strip beside a card: X3 for cards by name, X7 for a card whose terminals are a strip already. */
const returnTerminal = (module: string, number: number): string =>
  module.startsWith('X') ? `X7:${number}` : `X3:${module}.${number}`;

/** An output with its load: the switched core and the return core, in the colour of its circuit. */
export function outputPoint(
  { module, number, group, description, device, lengthM }: Wired,
  returns: { role: 'minus' | 'neutral'; colour: string; signal: string },
  more: Partial<Point> = {},
): Point {
  const wire = `${module}-${number}`;
  return {
    address: address(module, number),
    terminal: `${module}:${number}`,
    wire,
    description,
    group,
    conductors: [
      { role: 'signal', wire, colour: returns.signal, terminal: `${module}:${number}` },
      {
        role: returns.role,
        wire: `${wire}R`,
        colour: returns.colour,
        terminal: returnTerminal(module, number),
      },
    ],
    device,
    cable: cable(`W-${module}-${number}`, lengthM, 2),
    otherSupply: 'none',
    ...more,
  };
}

export const onDc = { role: 'minus', colour: 'BU', signal: 'BU' } as const;

/** The usual 24 V of a panel: made from its 230 V behind F1, earthed at 0 V. */
export const fieldSupply24: Supply = {
  tag: 'S24',
  description: '24 V DC field supply',
  kind: 'dc',
  purpose: 'field',
  V: 24,
  tolerance: regulated,
  earthed: true,
  earthFaultMonitor: false,
  terminals: { plus: 'X1:3', minus: 'X1:4' },
  feeds: [{ from: 'S230', through: ['F1'] }],
  ratedA: 10,
  otherLoadA: 0.5,
  protectionA: 4,
  bulk: { uF: 2200, bleedOhm: 1000 },
  extraLow: 'PELV',
};
