/** The outputs of HQ-OP9: triacs on DC, coils without diodes, loads that the wire cannot carry. */
import type { DeviceOf, Suppressor } from '../../../../../shared/panel/device';
import type { DigitalOutput } from '../../../../../shared/panel/moduleIo';
import type { Group, Module, Panel, Point } from '../../../../../shared/panel/panelSchema';
import { coil24, diode, face, lamp24, onDc, output24, outputPoint, terminalRange } from '../../panelParts';

const hall = 'Old pump hall';
const onAc = { role: 'neutral', colour: 'BU', signal: 'RD' } as const;

const triac: DigitalOutput = {
  ...output24,
  technology: 'triac',
  Vmin: 20,
  Vmax: 264,
  leakmA: 5,
  onDropV: 1.5,
  minLoadmA: 30,
};
const relay: DigitalOutput = {
  ...output24,
  technology: 'relay',
  Vmin: 5,
  Vmax: 264,
  pointA: 16,
  groupA: 16,
  inrush: { A: 30, ms: 20 },
  leakmA: 0,
  onDropV: 0,
  minLoadmA: 10,
  contact: ['B300', 'R300'],
};
const card = (
  tag: string,
  slot: number,
  io: DigitalOutput,
  terminals: string[],
  more: Partial<Module> = {},
) => ({
  tag,
  slot: String(slot),
  description: `Output card in slot ${slot}`,
  pluggable: true,
  terminals,
  terminalRange,
  io,
  ...more,
});

export const outputModules: Panel['modules'] = [
  card('TO1', 21, triac, face('TO1', 1, 1, 'TO1:C')),
  card('TO2', 22, triac, face('TO2', 1, 1, 'TO2:C')),
  card('DO3', 23, output24, face('DO3', 1, 1, 'DO3:C')),
  card('RO4', 24, relay, ['RO4:1', 'RO4:2', 'RO4:C1', 'RO4:3', 'RO4:C2'], { commonInsulationV: 50 }),
  card('DO5', 25, { ...output24, groupA: 1.5 }, face('DO5', 1, 8, 'DO5:C')),
  card('DO6', 26, { ...output24, technology: 'sinking' }, face('DO6', 1, 1, 'DO6:C')),
  card('RO7', 27, relay, ['RO7:1', 'RO7:C1', 'RO7:2', 'RO7:C2'], { commonInsulationV: 250 }),
];

const group = (
  tag: string,
  module: string,
  supply: string,
  common: Group['common'],
  more: Partial<Group> = {},
): Group => ({ tag, module, terminal: `${module}:C`, supply, common, ...more });

export const outputGroups: Panel['groups'] = [
  group('G21', 'TO1', 'S24', 'positive', { fuse: { tag: 'F31', A: 1, kind: 'miniature-T' } }),
  group('G22', 'TO2', 'S230', 'line', { fuse: { tag: 'F32', A: 1, kind: 'miniature-T' } }),
  group('G23', 'DO3', 'S230', 'line', { fuse: { tag: 'F33', A: 1, kind: 'miniature-T' } }),
  group('G24A', 'RO4', 'S230', 'neutral', {
    terminal: 'RO4:C1',
    fuse: { tag: 'F34', A: 4, kind: 'miniature-T' },
  }),
  group('G24B', 'RO4', 'S24', 'positive', { terminal: 'RO4:C2' }),
  group('G25', 'DO5', 'S24', 'positive'),
  group('G26', 'DO6', 'S24', 'negative', { fuse: { tag: 'F36', A: 0.25, kind: 'miniature-F' } }),
  group('G27A', 'RO7', 'S400', 'line', {
    terminal: 'RO7:C1',
    phase: 'L1',
    fuse: { tag: 'F37', A: 16, kind: 'gG' },
  }),
  group('G27B', 'RO7', 'S400', 'line', {
    terminal: 'RO7:C2',
    phase: 'L2',
    fuse: { tag: 'F38', A: 4, kind: 'gG' },
  }),
];

const none: Suppressor = { kind: 'none', at: 'load' };
const acCoil = (tag: string, A: number): DeviceOf<'load'> => ({
  ...coil24(tag, hall, 'coil', A),
  V: 230,
  current: 'ac',
  inrushA: 6 * A,
  pickUpPct: 85,
  dropOutPct: 15,
});
const heater = (tag: string, location: string, A: number): DeviceOf<'load'> => ({
  kind: 'load',
  tag,
  location,
  load: 'resistive',
  V: 230,
  current: 'ac',
  A,
  polarised: false,
});
/** A filament lamp, cold ten times its current. */
const lamp = (tag: string, location: string, A: number): DeviceOf<'load'> => ({
  kind: 'load',
  tag,
  location,
  load: 'lamp',
  V: 24,
  current: 'dc',
  A,
  inrushA: 10 * A,
  inrushMs: 30,
  polarised: false,
});

/** Needs more volts than it gets, and switches DC with a triac. */
const solidState: DeviceOf<'ssr-control'> = {
  kind: 'ssr-control',
  tag: 'K57',
  location: 'Inside HQ-OP9',
  Vmin: 23,
  Vmax: 32,
  mA: 12,
  polarised: true,
  reversed: false,
  rating: { V: 280, current: 'ac', A: 25, polarised: false, dropV: 1.5, leakmA: 5 },
  load: { supply: 'S24C', V: 24, current: 'dc', A: 8, load: 'resistive' },
};

type Row = [description: string, device: Point['device'], lengthM: number, more?: Partial<Point>];
const rows = (
  module: string,
  inGroup: string,
  list: Row[],
  returns: typeof onDc | typeof onAc,
  from = 1,
): Point[] =>
  list.map(([description, device, lengthM, more], index) =>
    outputPoint(
      { module, number: from + index, group: inGroup, description, device, lengthM },
      returns,
      more,
    ),
  );

const onDo5 = (): Point[] => {
  const points = rows(
    'DO5',
    'G25',
    [
      ['Alarm beacon', { ...lamp24('H51', hall), reversed: true }, 15],
      [
        'Sludge valve',
        coil24('Y52', hall, 'solenoid', 0.6),
        25,
        { suppressor: { ...diode, reversed: false } },
      ],
      ['Stair light', lamp('H53', 'Stairs', 0.4), 90],
      [
        'Drain valve',
        coil24('Y54', hall, 'solenoid', 0.2),
        25,
        { suppressor: { ...diode, V: 50, reversed: false } },
      ],
      ['Vent valve', coil24('Y55', hall, 'solenoid', 0.2), 25, { suppressor: { ...diode, reversed: true } }],
      [
        'Far inlet valve',
        coil24('Y56', 'Intake', 'solenoid', 0.4),
        320,
        { suppressor: { ...diode, reversed: false } },
      ],
      ['Trace heating', solidState, 5],
      ['Horn relay', coil24('K58', hall, 'coil', 0.04), 3, { suppressor: none }],
    ],
    onDc,
  );
  return points.map((point) => {
    const { cable, conductors } = point;
    if (point.address === 'DO5.01' && cable) return { ...point, cable: { ...cable, size: { mm2: 6 } } };
    if (point.address !== 'DO5.08') return point;
    return { ...point, conductors: conductors?.map((one) => ({ ...one, colour: 'GNYE' })) };
  });
};

/** A sinking card: its load goes back to plus. */
const onDo6 = (): Point[] =>
  rows(
    'DO6',
    'G26',
    [['Mixer start', coil24('K61', hall, 'coil', 0.25), 12, { suppressor: { ...diode, reversed: false } }]],
    onDc,
  ).map((point) => ({
    ...point,
    conductors: point.conductors?.map((one) =>
      one.role === 'minus' ? { ...one, role: 'plus' as const } : one,
    ),
  }));

export const outputPoints = (): Point[] => [
  ...rows(
    'TO1',
    'G21',
    [
      [
        'Sampling valve',
        coil24('Y11', hall, 'solenoid', 0.2),
        15,
        { suppressor: { ...diode, reversed: false } },
      ],
    ],
    onDc,
  ),
  ...rows('TO2', 'G22', [['Chlorine pump relay', acCoil('K21', 0.02), 15, { suppressor: none }]], onAc),
  ...rows('DO3', 'G23', [['Old pump 1 contactor', acCoil('K31', 0.06), 4, { suppressor: none }]], onAc),
  ...rows(
    'RO4',
    'G24A',
    [
      ['Old pump 2 contactor', acCoil('K41', 2), 4],
      ['Old pump 3 contactor', acCoil('K42', 0.08), 4],
    ],
    onAc,
  ),
  ...rows(
    'RO4',
    'G24B',
    [['Penstock brake', coil24('Y43', 'Penstock', 'solenoid', 1.5), 30, { suppressor: none }]],
    onDc,
    3,
  ),
  ...onDo5(),
  ...onDo6(),
  ...rows('RO7', 'G27A', [['Sump heater', heater('E71', 'Old sump', 12), 30]], onAc),
  ...rows('RO7', 'G27B', [['Cabinet heater', heater('E72', 'Inside HQ-OP9', 1), 3]], onAc, 2),
];
