/** HQ-LP2: 120 V AC inputs and triac outputs whose cables run the length of the pump hall. */
import type { Panel, Point, Supply } from '../../../../shared/panel/panelSchema';
import {
  acCoil,
  cable,
  contact,
  face,
  innerBreaker,
  isolator,
  mains,
  outputPoint,
  terminalRange,
} from '../panelParts';

const hall = 'Pump hall';

function input(number: number, description: string, location: string, lengthM: number): Point {
  const wire = `AI1-${number}`;
  return {
    address: `AI1.0${number}`,
    terminal: `AI1:${number}`,
    wire,
    description,
    group: 'G1',
    conductors: [
      { role: 'signal', wire, colour: 'RD', terminal: `AI1:${number}` },
      { role: 'line', wire: `${wire}L`, colour: 'RD', terminal: `X2:AI1.${number}` },
    ],
    device: contact(`S${number}`, location),
    cable: cable(`W-AI1-${number}`, lengthM, 2, { size: { mm2: 1.5 }, insulationV: 450 }),
    otherSupply: 'none',
  };
}

function output(number: number, description: string, location: string, lengthM: number): Point {
  const device = acCoil(`K${number}`, location, 120, 0.15);
  const point = outputPoint(
    { module: 'AO2', number, group: 'G2', description, device, lengthM },
    { role: 'neutral', colour: 'BU', signal: 'RD' },
    { suppressor: { kind: 'mov', at: 'load', V: 150 } },
  );
  return {
    ...point,
    cable: cable(`W-AO2-${number}`, lengthM, 2, { size: { mm2: 1.5 }, insulationV: 450 }),
  };
}

const points = (): Point[] => [
  input(1, 'Pump 1 runs', 'Pump 1 starter', 40),
  input(2, 'Pump 1 overload tripped', 'Pump 1 starter', 40),
  input(3, 'Pump 2 runs', 'Pump 2 starter', 95),
  input(4, 'Pump 2 overload tripped', 'Pump 2 starter', 95),
  input(5, 'Pump 3 runs', 'Pump 3 starter', 150),
  input(6, 'Pump 3 overload tripped', 'Pump 3 starter', 150),
  input(7, 'Suction well low', 'Suction well', 180),
  input(8, 'Hall flooded', 'Hall floor, far end', 175),
  output(1, 'Start pump 1', 'Pump 1 starter', 40),
  output(2, 'Start pump 2', 'Pump 2 starter', 95),
  output(3, 'Start pump 3', 'Pump 3 starter', 150),
  output(4, 'Open outlet valve', 'Outlet chamber', 160),
];

const supplies: Supply[] = [
  {
    tag: 'S230',
    description: '230 V AC behind the disconnect, to control transformer T1',
    kind: 'ac1',
    purpose: 'logic',
    V: 230,
    tolerance: mains,
    earthed: true,
    terminals: { L: 'X1:1', N: 'X1:2' },
    feeds: [{ from: 'HQ-DB2', through: ['Q1'] }],
    ratedA: 6,
    otherLoadA: 1,
    protectionA: 6,
    bulk: 'none',
    extraLow: 'none',
  },
  {
    tag: 'S120',
    description: '120 V AC control from transformer T1',
    kind: 'ac1',
    purpose: 'field',
    V: 120,
    tolerance: mains,
    earthed: true,
    terminals: { L: 'X1:3', N: 'X1:4' },
    feeds: [{ from: 'S230', through: ['F1'] }],
    ratedA: 4,
    otherLoadA: 0.5,
    protectionA: 4,
    bulk: 'none',
    extraLow: 'none',
  },
];

export const longCablesPanel: Panel = {
  format: 'coldloop-panel/1',
  tag: 'HQ-LP2',
  name: 'Pump starters',
  location: hall,
  drawing: { number: 'E-202', revision: 'A' },
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
      description: 'Way 3 of distribution board HQ-DB2',
      location: hall,
      V: 230,
      phases: 1,
      arcFlash: { calPerCm2: 0.6, boundaryM: 0.3 },
    },
  ],
  isolators: [
    isolator('Q1', { kind: 'disconnect', location: 'Door of HQ-LP2', inPanel: true }),
    innerBreaker('F1', 'Inside HQ-LP2, beside T1'),
  ],
  supplies,
  modules: [
    {
      tag: 'AI1',
      slot: '1',
      description: '8 inputs, 120 V AC',
      pluggable: true,
      terminals: face('AI1', 1, 8, 'AI1:N'),
      terminalRange,
      io: {
        kind: 'digital-input',
        V: 120,
        current: 'ac',
        type: 1,
        inputOhm: 12_000,
        ratedmA: 10,
        characteristic: 'resistive',
        maxV: 140,
        bridge: true,
        polarity: 'either',
      },
    },
    {
      tag: 'AO2',
      slot: '2',
      description: '4 triac outputs',
      pluggable: true,
      terminals: face('AO2', 1, 4, 'AO2:L'),
      terminalRange,
      io: {
        kind: 'digital-output',
        technology: 'triac',
        Vmin: 80,
        Vmax: 140,
        pointA: 0.5,
        groupA: 2,
        inrush: { A: 5, ms: 20 },
        leakmA: 1.5,
        onDropV: 1.5,
        minLoadmA: 10,
        suppression: 'rc',
      },
    },
  ],
  groups: [
    { tag: 'G1', module: 'AI1', terminal: 'AI1:N', supply: 'S120', common: 'neutral' },
    {
      tag: 'G2',
      module: 'AO2',
      terminal: 'AO2:L',
      supply: 'S120',
      common: 'line',
      fuse: { tag: 'F21', A: 1.6, kind: 'miniature-T' },
    },
  ],
  points: points(),
  stopControls: [
    {
      tag: 'S0',
      location: 'Pump hall gate',
      stop: 'Press the red mushroom head S0',
      start: 'Press the green button S9',
      beforeTry: 'Turn S0 to release it; set each starter to hand',
    },
  ],
};
