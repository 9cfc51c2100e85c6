/** A small healthy panel with one output, in parts that a test can change one at a time. */
import type { DeviceOf, Suppressor } from '../../../shared/panel/device';
import type { DigitalOutput, ModuleIo } from '../../../shared/panel/moduleIo';
import type { Group, Panel, Point, Supply } from '../../../shared/panel/panelSchema';
import { acSupply, cable, dcSupply, group, inputPoint, module, panelOf } from './inputPanel';

/** 24 V DC, 0.5 A, switches plus. */
export const sourcing = (more: Partial<DigitalOutput> = {}): DigitalOutput => ({
  kind: 'digital-output',
  technology: 'sourcing',
  Vmin: 19.2,
  Vmax: 30,
  pointA: 0.5,
  groupA: 4,
  inrush: { A: 2, ms: 20 },
  leakmA: 0.1,
  onDropV: 0.5,
  minLoadmA: 1,
  suppression: 'none',
  ...more,
});
export const triac = (more: Partial<DigitalOutput> = {}): DigitalOutput =>
  sourcing({
    technology: 'triac',
    Vmin: 20,
    Vmax: 264,
    leakmA: 2,
    onDropV: 1.5,
    minLoadmA: 30,
    inrush: { A: 10, ms: 20 },
    ...more,
  });
export const relay = (more: Partial<DigitalOutput> = {}): DigitalOutput =>
  sourcing({
    technology: 'relay',
    Vmin: 5,
    Vmax: 264,
    pointA: 5,
    groupA: 10,
    inrush: { A: 15, ms: 20 },
    leakmA: 0,
    onDropV: 0,
    minLoadmA: 10,
    contact: ['B300', 'R300'],
    ...more,
  });

/** A 24 V DC valve coil of 0.25 A. */
export const coil = (more: Partial<DeviceOf<'load'>> = {}): DeviceOf<'load'> => ({
  kind: 'load',
  tag: 'Y1',
  load: 'solenoid',
  V: 24,
  current: 'dc',
  A: 0.25,
  pickUpPct: 80,
  dropOutPct: 10,
  polarised: false,
  ...more,
});
/** A 230 V AC contactor coil: 0.1 A held, 0.6 A pulling in. */
export const acCoil = (more: Partial<DeviceOf<'load'>> = {}): DeviceOf<'load'> =>
  coil({
    tag: 'K1',
    load: 'coil',
    V: 230,
    current: 'ac',
    A: 0.1,
    inrushA: 0.6,
    inrushMs: 15,
    pickUpPct: 85,
    dropOutPct: 15,
    ...more,
  });
export const heater = (more: Partial<DeviceOf<'load'>> = {}): DeviceOf<'load'> => {
  const { pickUpPct: _, ...rest } = coil({ tag: 'E1', load: 'resistive' });
  return { ...rest, ...more };
};
export const diode = (more: Partial<Suppressor> = {}): Suppressor => ({
  kind: 'diode',
  at: 'load',
  V: 400,
  A: 1,
  reversed: false,
  ...more,
});
export const rc = (more: Partial<Suppressor> = {}): Suppressor => ({
  kind: 'rc',
  at: 'load',
  V: 275,
  ohm: 150,
  uF: 0.1,
  ...more,
});

/** A relay of 25 A on 230 V AC, driven by 3 to 32 V DC. */
export const solidState = (
  more: Partial<Omit<DeviceOf<'ssr-control'>, 'rating' | 'load'>> = {},
  rating: Partial<DeviceOf<'ssr-control'>['rating']> = {},
  load: Partial<DeviceOf<'ssr-control'>['load']> = {},
): DeviceOf<'ssr-control'> => ({
  kind: 'ssr-control',
  tag: 'K9',
  Vmin: 4,
  Vmax: 32,
  mA: 12,
  polarised: true,
  reversed: false,
  ...more,
  rating: {
    V: 280,
    current: 'ac',
    A: 25,
    polarised: false,
    dropV: 1.5,
    leakmA: 1,
    heatSink: true,
    ...rating,
  },
  load: { supply: 'S2', V: 230, current: 'ac', A: 4, load: 'resistive', ...load },
});
export const dcRelay = (load: Partial<DeviceOf<'ssr-control'>['load']> = {}): DeviceOf<'ssr-control'> =>
  solidState(
    {},
    { V: 60, current: 'dc', polarised: true },
    { supply: 'S1', V: 24, current: 'dc', reversed: false, ...load },
  );

export const outputPoint = (more: Partial<Point> = {}): Point =>
  inputPoint({
    address: 'DO.01',
    terminal: 'DO:1',
    description: 'An output',
    device: coil(),
    suppressor: diode(),
    cable: cable({ grouped: 1, cores: 2 }),
    conductors: [
      { role: 'signal', wire: 'W1', colour: 'BU', terminal: 'DO:1' },
      { role: 'minus', wire: 'W1-', colour: 'BU', terminal: 'X3:1' },
    ],
    ...more,
  });

export const outputGroup = (more: Partial<Group> = {}): Group =>
  group({
    module: 'DO',
    terminal: 'DO:C',
    common: 'positive',
    fuse: { tag: 'F1', A: 2, kind: 'gG' },
    ...more,
  });

export const outputPanel = (
  io: ModuleIo = sourcing(),
  point: Partial<Point> = {},
  parts: { supply?: Supply; group?: Partial<Group>; more?: Partial<Panel>; beside?: Point[] } = {},
): Panel =>
  panelOf({
    supplies: [parts.supply ?? dcSupply(), acSupply({ tag: 'S2', terminals: { L: 'X2:1', N: 'X2:2' } })],
    modules: [
      module(io, {
        tag: 'DO',
        terminals: ['DO:1', 'DO:C'],
        terminalRange: { minMm2: 0.2, maxMm2: 2.5, torqueNm: 0.5 },
      }),
    ],
    groups: [outputGroup(parts.group)],
    points: [outputPoint(point), ...(parts.beside ?? [])],
    ...parts.more,
  });

/** The same on 230 V AC. */
export const acPanel = (
  io: ModuleIo = triac(),
  point: Partial<Point> = {},
  parts: { supply?: Supply; group?: Partial<Group>; more?: Partial<Panel>; beside?: Point[] } = {},
): Panel =>
  outputPanel(
    io,
    { device: acCoil(), suppressor: rc(), ...point },
    { ...parts, supply: parts.supply ?? acSupply(), group: { common: 'line', ...parts.group } },
  );
