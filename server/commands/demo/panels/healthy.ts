/** HQ-LP1: a 24 V DC panel of the filter gallery with nothing wrong in it. */
import type { Panel, Point } from '../../../../shared/panel/panelSchema';
import {
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

const gallery = 'Filter gallery, basement';

function inputs(): Point[] {
  const filters = [1, 2, 3, 4];
  const made = [
    ...filters.flatMap((n) => [
      {
        description: `Filter ${n} inlet valve open`,
        device: pnp(`B${n}1`, `Filter ${n}`),
        lengthM: 12 + 6 * n,
      },
      {
        description: `Filter ${n} inlet valve closed`,
        device: pnp(`B${n}2`, `Filter ${n}`),
        lengthM: 12 + 6 * n,
      },
      {
        description: `Filter ${n} level high`,
        device: contact(`B${n}3`, `Filter ${n}`),
        lengthM: 14 + 6 * n,
      },
    ]),
    { description: 'Backwash tank level low', device: contact('B51', 'Backwash tank'), lengthM: 55 },
    { description: 'Backwash tank level high', device: contact('B52', 'Backwash tank'), lengthM: 55 },
    { description: 'Gallery sump wet', device: twoWire('B53', 'Gallery sump'), lengthM: 40 },
    { description: 'Valve air pressure good', device: contact('B54', 'Air preparation unit'), lengthM: 8 },
  ];
  return made.map((one, index) =>
    inputPoint({ module: 'DI1', number: index + 1, group: index < 8 ? 'G1' : 'G2', ...one }),
  );
}

function outputs(): Point[] {
  const valve = (n: number, what: string) => ({
    description: `Filter ${n} ${what}`,
    device: coil24(`Y${n}${what === 'inlet valve' ? 1 : 2}`, `Filter ${n}`, 'solenoid', 0.25),
    lengthM: 12 + 6 * n,
    more: { suppressor: diode },
  });
  const made = [
    ...[1, 2, 3].flatMap((n) => [valve(n, 'inlet valve'), valve(n, 'drain valve')]),
    { description: 'Gallery beacon', device: lamp24('H1', 'Gallery door'), lengthM: 20, more: {} },
    {
      description: 'Start request to backwash pump',
      device: coil24('K1', 'Panel HQ-LP1', 'coil', 0.04),
      lengthM: 2,
      more: { suppressor: diode },
    },
  ];
  return made.map(({ more, ...one }, index) =>
    outputPoint({ module: 'DO2', number: index + 1, group: 'G3', ...one }, onDc, more),
  );
}

export const healthyPanel: Panel = {
  format: 'coldloop-panel/1',
  tag: 'HQ-LP1',
  name: 'Filter gallery valves',
  location: gallery,
  drawing: { number: 'E-201', revision: 'B' },
  practice: 'IEC 60204-1',
  frequencyHz: 50,
  ambientC: 40,
  wiringMethod: 'B2',
  disconnect: 'Q1',
  earthTerminal: 'PE',
  sources: [
    {
      tag: 'HQ-DB1',
      kind: 'feeder',
      description: 'Way 4 of distribution board HQ-DB1',
      location: 'Pump hall',
      V: 230,
      phases: 1,
      arcFlash: { calPerCm2: 0.6, boundaryM: 0.3 },
    },
    {
      tag: 'AIR-1',
      kind: 'pneumatic',
      description: 'Valve air, 6 bar',
      location: gallery,
      isolators: ['V1'],
      dissipate: 'Open drain cock D1 on the air preparation unit',
      verify: 'Gauge G1 shows 0 bar and the exhaust is silent',
    },
  ],
  isolators: [
    isolator('Q1', { kind: 'disconnect', location: 'Door of HQ-LP1', inPanel: true }),
    innerBreaker('F1', 'Inside HQ-LP1, top rail'),
    isolator('V1', {
      kind: 'valve',
      location: 'Air preparation unit, left of HQ-LP1',
      purpose: 'motive',
    }),
  ],
  supplies: [
    {
      tag: 'S230',
      description: 'Panel supply behind the disconnect',
      kind: 'ac1',
      purpose: 'logic',
      V: 230,
      tolerance: mains,
      earthed: true,
      terminals: { L: 'X1:1', N: 'X1:2' },
      feeds: [{ from: 'HQ-DB1', through: ['Q1'] }],
      ratedA: 10,
      otherLoadA: 2,
      protectionA: 10,
      bulk: 'none',
      extraLow: 'none',
    },
    fieldSupply24,
  ],
  modules: [
    {
      tag: 'DI1',
      slot: '1',
      description: '16 inputs, 24 V DC',
      pluggable: true,
      terminals: [...face('DI1', 1, 8, 'DI1:C1'), ...face('DI1', 9, 16, 'DI1:C2')],
      terminalRange,
      io: input24,
    },
    {
      tag: 'DO2',
      slot: '2',
      description: '8 outputs, 24 V DC, 0.5 A',
      pluggable: true,
      terminals: face('DO2', 1, 8, 'DO2:C'),
      terminalRange,
      io: output24,
    },
  ],
  groups: [
    { tag: 'G1', module: 'DI1', terminal: 'DI1:C1', supply: 'S24', common: 'negative' },
    { tag: 'G2', module: 'DI1', terminal: 'DI1:C2', supply: 'S24', common: 'negative' },
    {
      tag: 'G3',
      module: 'DO2',
      terminal: 'DO2:C',
      supply: 'S24',
      common: 'positive',
      fuse: { tag: 'F31', A: 3.15, kind: 'miniature-T' },
    },
  ],
  points: [...inputs(), ...outputs()],
  stopControls: [
    {
      tag: 'S1',
      location: 'Gallery door',
      stop: 'Press the red mushroom head S1',
      start: 'Press the green button S2',
      beforeTry: 'Turn S1 to release it; set selector S3 to local',
    },
  ],
};
