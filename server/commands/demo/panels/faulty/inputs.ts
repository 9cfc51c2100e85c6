/** The inputs of HQ-OP9: sensors on the wrong pole, leaks, long AC cables, and rows that contradict each other. */
import type { DigitalInput } from '../../../../../shared/panel/moduleIo';
import type { Group, Module, Panel, Point } from '../../../../../shared/panel/panelSchema';
import { contact, face, input24, inputPoint, pnp, terminalRange, twoWire } from '../../panelParts';

const hall = 'Old pump hall';

const card = (tag: string, slot: number, points: number, io: Module['io'], description: string): Module => ({
  tag,
  slot: String(slot),
  description,
  pluggable: true,
  terminals: face(tag, 1, points, `${tag}:C`),
  terminalRange,
  io,
});
const common = (
  tag: string,
  module: string,
  supply: string | undefined,
  pole: Group['common'],
  more: Partial<Group> = {},
): Group => ({ tag, module, terminal: `${module}:C`, ...(supply && { supply }), common: pole, ...more });

const bothWays: DigitalInput = { ...input24, polarity: 'either' };
/** Wants 34 V to read as on (IEC 61131-2, 48 V type 1). */
const input48: DigitalInput = { ...input24, V: 48, type: 1, maxV: 60, polarity: 'either' };
const input120: DigitalInput = {
  kind: 'digital-input',
  V: 120,
  current: 'ac',
  type: 1,
  inputOhm: 60_000,
  characteristic: 'resistive',
  maxV: 140,
  bridge: true,
  polarity: 'either',
};

export const inputModules: Panel['modules'] = [
  card('DI1', 1, 8, input24, '8 inputs, 24 V DC'),
  card('DI2', 2, 4, bothWays, '4 inputs, 24 V DC'),
  card('DI3', 3, 2, input24, '2 inputs, 24 V DC'),
  card(
    'OB4',
    4,
    1,
    {
      kind: 'opto-input',
      seriesOhm: 1000,
      seriesW: 0.25,
      Vf: { min: 1.1, max: 1.5 },
      onmA: 5,
      offmA: 0.5,
      maxmA: 20,
      reverseV: 6,
      polarity: 'either',
      ctr: { minPct: 5, loadOhm: 1000, logicV: 5, vceSat: 0.2, agePct: 50 },
    },
    'Home-made optocoupler board',
  ),
  card('DI5', 5, 3, input120, '3 inputs, 120 V AC'),
  card('DI6', 6, 2, bothWays, '2 inputs, 24 V DC'),
  card('DI7', 7, 1, bothWays, '1 input, 24 V DC'),
  card('DI8', 8, 1, input48, '1 input, 48 V DC'),
  card('DI9', 9, 1, bothWays, '1 input, 24 V DC'),
  card('DI10', 10, 1, bothWays, '1 input, 24 V DC'),
  card('DI11', 11, 1, bothWays, '1 input, 24 V DC'),
  card('DI12', 12, 1, bothWays, '1 input, 24 V DC'),
];

export const inputGroups: Panel['groups'] = [
  common('G1', 'DI1', 'S24', 'negative', { fuse: { tag: 'F21', A: 1, kind: 'miniature-T' } }),
  common('G2', 'DI2', 'S24', 'positive', { fuse: { tag: 'F22', A: 1, kind: 'miniature-T' } }),
  common('G3', 'DI3', 'S24', 'positive', { fuse: { tag: 'F23', A: 1, kind: 'miniature-T' } }),
  common('G4', 'OB4', 'S24', 'negative'),
  common('G5', 'DI5', 'S120', 'line'),
  common('G6A', 'DI6', 'S24', 'negative'),
  common('G6B', 'DI6', 'S24B', 'negative'),
  common('G7', 'DI7', 'S24C', 'negative', { linkedTo: ['G11'] }),
  common('G8', 'DI8', 'S24', 'negative'),
  common('G9', 'DI9', 'S230', 'line'),
  common('G10', 'DI10', undefined, 'negative'),
  common('G11', 'DI11', 'S24L', 'negative'),
  common('G12', 'DI12', 'S24D', 'negative'),
];

type Row = [description: string, device: Point['device'], lengthM: number, more?: Partial<Point>];
const rows = (module: string, group: string, list: Row[]): Point[] =>
  list.map(([description, device, lengthM, more], index) => ({
    ...inputPoint({ module, number: index + 1, group, description, device, lengthM }),
    ...more,
  }));
const npn: Point['device'] = { ...pnp('B1', hall), kind: 'npn' };

const onCard1 = rows('DI1', 'G1', [
  ['Sludge valve open', npn, 25],
  ['Sludge valve shut', pnp('B2', hall), 25],
  ['Wet well high', { ...twoWire('B3', 'Wet well'), leakmA: 1.9 }, 60],
  ['Wet well low', { ...twoWire('B4', 'Wet well'), minmA: 8 }, 60],
  [
    'Both hatches shut',
    { ...twoWire('B5', 'Hatch 1'), dropV: 8 },
    40,
    { series: [{ ...twoWire('B5A', 'Hatch 2'), dropV: 8 }] },
  ],
  ['Gas detector healthy', { kind: 'namur', tag: 'B6', location: 'Wet well' }, 45],
  ['Pump 1 thermostat', { ...twoWire('B7', 'Pump 1'), current: 'ac' }, 30],
  ['Pump 1 runs', { kind: 'ssr-output', tag: 'B8', location: 'Pump 1', dropV: 19, leakmA: 0.1 }, 30],
]);

const onAc = (): Point[] =>
  rows('DI5', 'G5', [
    ['Packaging line asks for water', contact('S51', 'Packaging line'), 400],
    [
      'Packaging line valve open',
      { ...twoWire('B52', 'Packaging line'), current: 'ac', leakmA: 0.75, minmA: 1, dropV: 6 },
      160,
    ],
    ['Packaging line runs', pnp('B53', 'Packaging line'), 60],
  ]).map((point) => ({ ...point, cable: point.cable && { ...point.cable, insulationV: 450 } }));

/** Rows that somebody copied and did not finish: one address, one terminal, one wire number twice. */
const copied = (): Point[] => {
  const [hatch] = rows('DI2', 'G2', [['Hatch 3 shut', contact('S24', 'Hatch 3'), 20]]);
  return hatch ? [{ ...hatch, address: 'DI2.02', terminal: 'DI2:2', wire: 'DI2-2' }] : [];
};

export const inputPoints = (): Point[] => [
  ...onCard1,
  ...rows('DI2', 'G2', [
    ['Valve 3 open', pnp('B21', hall), 20],
    ['Hatch 3 shut', contact('S22', 'Hatch 3'), 20, { otherSupply: 'S120' }],
    ['Spare', contact('S23', hall), 5, { spare: true }],
  ]),
  ...copied(),
  ...rows('DI3', 'G3', [['Screen blocked', contact('S31', 'Screen'), 22]]),
  ...rows('OB4', 'G4', [['Float in the old sump', contact('S41', 'Old sump'), 35]]),
  ...onAc(),
  ...rows('DI6', 'G6A', [['Alarm reset', contact('S61', 'Door of HQ-OP9'), 2]]),
  ...rows('DI6', 'G6B', [['Alarm test', contact('S62', 'Door of HQ-OP9'), 2]]).map((point) => ({
    ...point,
    address: 'DI6.02',
    terminal: 'DI6:2',
    wire: 'DI6-2',
  })),
  ...rows('DI7', 'G7', [['Charger fault', contact('S71', hall), 12]]),
  ...rows('DI8', 'G8', [['Flow in the rising main', contact('S81', 'Rising main'), 50]]),
  ...rows('DI9', 'G9', [['Pump 2 runs', contact('S91', 'Pump 2'), 30]]),
  ...rows('DI10', 'G10', [['Chlorine room door', contact('S101', 'Chlorine room'), 30]]),
  ...rows('DI11', 'G11', [['Panel door open', contact('S111', 'Door of HQ-OP9'), 2]]),
  ...rows('DI12', 'G12', [['Building alarm', contact('S121', 'Control room'), 80]]),
];
