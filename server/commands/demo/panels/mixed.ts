/** HQ-LP3: 24 V DC inputs beside a relay card whose three commons stand on three supplies, one from another panel. */
import type { Panel, Point } from '../../../../shared/panel/panelSchema';
import {
  acCoil,
  coil24,
  contact,
  diode,
  face,
  innerBreaker,
  input24,
  inputPoint,
  isolator,
  lamp24,
  mains,
  onDc,
  output24,
  outputPoint,
  pnp,
  terminalRange,
  twoWire,
  fieldSupply24,
} from '../panelParts';

const room = 'Dosing room';

/** A sensor, a dry contact, a relay output on the supply from HQ-MC2 and a 24 V valve: one job of four points. */
export const mixedScope = ['DI1.01', 'DI1.02', 'X5.21', 'DO2.01'] as const;

const inputs = (): Point[] =>
  [
    { description: 'Dosing valve open', device: pnp('B1', room), lengthM: 18 },
    { description: 'Tank T1 level low', device: contact('B2', 'Tank T1'), lengthM: 25 },
    { description: 'Dosing valve closed', device: pnp('B3', room), lengthM: 18 },
    { description: 'Tank T1 level high', device: contact('B4', 'Tank T1'), lengthM: 25 },
    { description: 'Bund wet', device: twoWire('B5', 'Bund under tank T1'), lengthM: 22 },
    { description: 'Mixer turns', device: pnp('B6', 'Mixer M1'), lengthM: 30 },
    { description: 'Eyewash flow', device: contact('B7', 'Eyewash station'), lengthM: 15 },
    { description: 'Room door shut', device: contact('B8', 'Room door'), lengthM: 12 },
  ].map((one, index) => inputPoint({ module: 'DI1', number: index + 1, group: 'G1', ...one }));

const outputs = (): Point[] =>
  [
    { description: 'Dosing valve', device: coil24('Y1', room, 'solenoid', 0.35), lengthM: 18 },
    { description: 'Flush valve', device: coil24('Y2', room, 'solenoid', 0.35), lengthM: 20 },
    { description: 'Tank T1 fill valve', device: coil24('Y3', 'Tank T1', 'solenoid', 0.35), lengthM: 26 },
    { description: 'Mixer enable relay', device: coil24('K4', 'Panel HQ-LP3', 'coil', 0.04), lengthM: 2 },
    { description: 'Room beacon', device: lamp24('H5', 'Room door'), lengthM: 12 },
    { description: 'Dosing lamp', device: lamp24('H6', 'Room door'), lengthM: 12 },
  ].map((one, index) =>
    outputPoint(
      { module: 'DO2', number: index + 1, group: 'G2', ...one },
      onDc,
      one.device.load === 'led' ? {} : { suppressor: diode },
    ),
  );

const onAc = { role: 'neutral', colour: 'BU', signal: 'RD' } as const;
// Circuits that stay live with the panel's own disconnect open are orange (IEC 60204-1).
const onForeign = { role: 'neutral', colour: 'OG', signal: 'OG' } as const;

function relays(): Point[] {
  const wired = (
    number: number,
    group: string,
    description: string,
    device: Point['device'],
    lengthM: number,
  ) => ({
    module: 'X5',
    number,
    group,
    description,
    device,
    lengthM,
  });
  const ac = { cable: { insulationV: 450 } };
  const at450 = (point: Point): Point => ({
    ...point,
    cable: point.cable && { ...point.cable, ...ac.cable },
  });
  return [
    outputPoint(
      wired(11, 'RC1', 'Alarm relay to control room', coil24('K11', 'Panel HQ-LP3', 'coil', 0.04), 2),
      onDc,
      { suppressor: diode },
    ),
    outputPoint(wired(12, 'RC1', 'Horn relay', coil24('K12', 'Panel HQ-LP3', 'coil', 0.04), 2), onDc, {
      suppressor: diode,
    }),
    at450(
      outputPoint(
        wired(21, 'RC2', 'Start permit to packaging line', acCoil('K21', 'Panel HQ-MC2', 120, 0.1), 45),
        onForeign,
      ),
    ),
    at450(
      outputPoint(
        wired(22, 'RC2', 'Product call to packaging line', acCoil('K22', 'Panel HQ-MC2', 120, 0.1), 45),
        onForeign,
      ),
    ),
    at450(
      outputPoint(
        wired(31, 'RC3', 'Dosing pump contactor', acCoil('K31', 'Panel HQ-LP3', 230, 0.06), 3),
        onAc,
      ),
    ),
    at450(
      outputPoint(wired(32, 'RC3', 'Mixer contactor', acCoil('K32', 'Panel HQ-LP3', 230, 0.06), 3), onAc),
    ),
  ];
}

const supplies: Panel['supplies'] = [
  {
    tag: 'S230',
    description: '230 V AC control behind the disconnect',
    kind: 'ac1',
    purpose: 'field',
    V: 230,
    tolerance: mains,
    earthed: true,
    terminals: { L: 'X1:1', N: 'X1:2' },
    feeds: [{ from: 'HQ-DB2', through: ['Q1'] }],
    ratedA: 10,
    otherLoadA: 2,
    protectionA: 6,
    bulk: 'none',
    extraLow: 'none',
  },
  fieldSupply24,
  {
    tag: 'S120',
    description: '120 V AC from packaging line panel HQ-MC2',
    kind: 'ac1',
    purpose: 'field',
    V: 120,
    tolerance: mains,
    earthed: true,
    terminals: { L: 'X6:1', N: 'X6:2' },
    feeds: [{ from: 'HQ-MC2', through: ['F12'] }],
    ratedA: 4,
    otherLoadA: 0.5,
    protectionA: 4,
    bulk: 'none',
    extraLow: 'none',
  },
];

const modules: Panel['modules'] = [
  {
    tag: 'DI1',
    slot: '1',
    description: '8 inputs, 24 V DC',
    pluggable: true,
    terminals: face('DI1', 1, 8, 'DI1:C'),
    terminalRange,
    io: input24,
  },
  {
    tag: 'DO2',
    slot: '2',
    description: '6 outputs, 24 V DC, 0.5 A',
    pluggable: true,
    terminals: face('DO2', 1, 6, 'DO2:C'),
    terminalRange,
    io: output24,
  },
  {
    tag: 'RO3',
    slot: '3',
    description: '6 relay outputs, three commons',
    pluggable: true,
    terminals: [
      ...face('X5', 11, 12, 'X5:C1'),
      ...face('X5', 21, 22, 'X5:C2'),
      ...face('X5', 31, 32, 'X5:C3'),
    ],
    commonInsulationV: 400,
    terminalRange,
    io: {
      kind: 'digital-output',
      technology: 'relay',
      Vmin: 5,
      Vmax: 264,
      pointA: 2,
      groupA: 4,
      inrush: { A: 10, ms: 20 },
      leakmA: 0,
      onDropV: 0,
      minLoadmA: 10,
      suppression: 'none',
      contact: ['B300', 'R300'],
      dc13: { V: 24, A: 1 },
      ac15: { V: 230, A: 1.5 },
    },
  },
];

export const mixedPanel: Panel = {
  format: 'coldloop-panel/1',
  tag: 'HQ-LP3',
  name: 'Dosing and packaging permits',
  location: room,
  drawing: { number: 'E-204', revision: 'C' },
  practice: 'IEC 60204-1',
  frequencyHz: 50,
  ambientC: 40,
  wiringMethod: 'B2',
  disconnect: 'Q1',
  earthTerminal: 'PE',
  sources: [
    {
      tag: 'HQ-DB2',
      kind: 'feeder',
      description: 'Way 2 of distribution board HQ-DB2',
      location: 'Pump hall',
      V: 230,
      phases: 1,
      arcFlash: { calPerCm2: 0.6, boundaryM: 0.3 },
    },
    {
      tag: 'HQ-MC2',
      kind: 'other-panel',
      description: 'Control transformer of packaging line panel HQ-MC2',
      location: 'Packaging line, next door',
      V: 120,
      phases: 1,
      arcFlash: { calPerCm2: 0.4, boundaryM: 0.3 },
    },
  ],
  isolators: [
    isolator('Q1', { kind: 'disconnect', location: 'Door of HQ-LP3', inPanel: true }),
    innerBreaker('F1', 'Inside HQ-LP3, top rail'),
    isolator('F12', {
      kind: 'breaker',
      location: 'Panel HQ-MC2, packaging line',
      inSight: false,
      purpose: 'control',
      lock: 'device-needed',
      lockDevice: 'breaker clip',
      alsoFeeds: ['Packaging line conveyor control'],
    }),
  ],
  supplies,
  modules,
  groups: [
    { tag: 'G1', module: 'DI1', terminal: 'DI1:C', supply: 'S24', common: 'negative' },
    {
      tag: 'G2',
      module: 'DO2',
      terminal: 'DO2:C',
      supply: 'S24',
      common: 'positive',
      fuse: { tag: 'F21', A: 3.15, kind: 'miniature-T' },
    },
    {
      tag: 'RC1',
      module: 'RO3',
      terminal: 'X5:C1',
      supply: 'S24',
      common: 'positive',
      fuse: { tag: 'F31', A: 2, kind: 'miniature-T' },
    },
    {
      tag: 'RC2',
      module: 'RO3',
      terminal: 'X5:C2',
      supply: 'S120',
      common: 'line',
      fuse: { tag: 'F32', A: 2, kind: 'miniature-T' },
    },
    {
      tag: 'RC3',
      module: 'RO3',
      terminal: 'X5:C3',
      supply: 'S230',
      common: 'line',
      fuse: { tag: 'F33', A: 2, kind: 'miniature-T' },
    },
  ],
  points: [...inputs(), ...outputs(), ...relays()],
  stopControls: [
    {
      tag: 'S1',
      location: 'Room door',
      stop: 'Press the red mushroom head S1',
      start: 'Press the green button S2',
      beforeTry: 'Turn S1 to release it; set selector S3 to local',
    },
  ],
};
