/** How HQ-OP9 is fed: ways that open one conductor, ways nobody wrote down, and a battery that outlives the mains. */
import type { Panel, Supply } from '../../../../../shared/panel/panelSchema';
import { innerBreaker, isolator, mains, regulated } from '../../panelParts';

export const sources: Panel['sources'] = [
  {
    tag: 'HQ-DB3',
    kind: 'feeder',
    description: 'Way 7 of distribution board HQ-DB3',
    location: 'Old pump hall',
    V: 400,
    phases: 3,
    arcFlash: { calPerCm2: 1.1, boundaryM: 0.5 },
  },
  {
    tag: 'HQ-MC2',
    kind: 'other-panel',
    description: 'Control transformer of packaging line panel HQ-MC2',
    location: 'Packaging line, next door',
    V: 120,
    phases: 1,
  },
  {
    tag: 'BAT-1',
    kind: 'battery',
    description: 'Battery of the alarm circuits, 24 V',
    location: 'Shelf above HQ-OP9',
    V: 24,
    phases: 'dc',
  },
  {
    tag: 'AIR-2',
    kind: 'pneumatic',
    description: 'Air for the sludge valves, 6 bar',
    location: 'Old pump hall',
  },
];

export const isolators: Panel['isolators'] = [
  isolator('Q1', { kind: 'disconnect', location: 'Door of HQ-OP9', inPanel: true }),
  innerBreaker('F1', 'Inside HQ-OP9, top rail'),
  innerBreaker('F2', 'Inside HQ-OP9, top rail'),
  innerBreaker('F3', 'Inside HQ-OP9, top rail'),
  isolator('F9', {
    kind: 'fuse-carrier',
    location: 'Battery shelf above HQ-OP9',
    purpose: 'control',
    lock: 'cannot-lock',
  }),
  isolator('F12', {
    kind: 'breaker',
    location: 'Packaging line panel',
    inSight: false,
    loadBreak: false,
    purpose: 'control',
  }),
  isolator('F8', {
    kind: 'fuse-carrier',
    location: 'Inside HQ-OP9, bottom rail',
    inPanel: true,
    opens: 'one-conductor',
    purpose: 'control',
  }),
  isolator('K0', {
    kind: 'contactor',
    location: 'Inside HQ-OP9, bottom rail',
    inPanel: true,
    suitableForIsolation: false,
    purpose: 'control',
    lock: 'cannot-lock',
  }),
];

const mainSupplies: Supply[] = [
  {
    tag: 'S400',
    description: '400 V three-phase behind the disconnect',
    kind: 'ac3',
    purpose: 'field',
    V: 400,
    tolerance: mains,
    earthed: true,
    terminals: { L1: 'X1:1', L2: 'X1:2', L3: 'X1:3', N: 'X1:4' },
    feeds: [{ from: 'HQ-DB3', through: ['Q1'] }],
    ratedA: 25,
    otherLoadA: 4,
    protectionA: 25,
    bulk: 'none',
    extraLow: 'none',
  },
  {
    tag: 'S230',
    description: '230 V AC control',
    kind: 'ac1',
    purpose: 'field',
    V: 230,
    tolerance: mains,
    earthed: true,
    terminals: { L: 'X1:5', N: 'X1:6' },
    feeds: [{ from: 'S400', through: [] }],
    ratedA: 10,
    otherLoadA: 2,
    protectionA: 10,
    bulk: 'none',
    extraLow: 'none',
  },
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

type Told = Pick<Supply, 'tag' | 'description' | 'feeds' | 'terminals'> & Partial<Supply>;
const dc24 = (told: Told): Supply => ({
  kind: 'dc',
  purpose: 'field',
  V: 24,
  tolerance: regulated,
  earthed: true,
  earthFaultMonitor: false,
  ratedA: 10,
  otherLoadA: 0.5,
  bulk: 'none',
  extraLow: 'PELV',
  ...told,
});

const dcSupplies: Supply[] = [
  dc24({
    tag: 'S24',
    description: '24 V DC field supply',
    terminals: { plus: 'X2:1', minus: 'X2:2' },
    feeds: [{ from: 'S230', through: ['F1'] }],
    ratedA: 2.5,
    bulk: { uF: 4700 },
  }),
  {
    tag: 'S24B',
    description: '24 V DC with battery, alarm circuits',
    kind: 'dc',
    purpose: 'field',
    V: 24,
    earthed: false,
    terminals: { plus: 'X2:3', minus: 'X2:4' },
    feeds: [
      { from: 'S230', through: ['F2'] },
      { from: 'BAT-1', through: ['F9'] },
    ],
    ratedA: 5,
    otherLoadA: 0.2,
    protectionA: 4,
    bulk: 'none',
    extraLow: 'PELV',
  },
  dc24({
    tag: 'S24C',
    description: 'Old unregulated 24 V charger',
    tolerance: { minPct: -25, maxPct: 30 },
    terminals: { plus: 'X2:5', minus: 'X2:6' },
    feeds: [{ from: 'S230', through: ['F3'] }],
    protectionA: 4,
  }),
  dc24({
    tag: 'S24L',
    description: '24 V DC of the controller',
    purpose: 'logic',
    terminals: { plus: 'X2:7', minus: 'X2:8' },
    feeds: [{ from: 'S230', through: ['F1'] }],
    protectionA: 4,
  }),
];

/** Supplies that no isolator makes dead; they may stay on behind their covers when nobody works on them. */
const left = (tag: string, description: string, number: number, feeds: Supply['feeds']): Supply =>
  dc24({
    tag,
    description,
    terminals: { plus: `X7:${number}`, minus: `X7:${number + 1}` },
    feeds,
    protectionA: 2,
    mayStayLive: { reason: 'Alarms of the building', guard: 'Screwed cover over X7' },
  });

export const supplies: Panel['supplies'] = [
  ...mainSupplies,
  ...dcSupplies,
  left('S24D', '24 V DC of the building alarm, origin not traced', 1, []),
  left('S24E', '24 V DC common alarm, first half', 3, [{ from: 'S24F', through: [] }]),
  left('S24F', '24 V DC common alarm, second half', 5, [{ from: 'S24E', through: [] }]),
  left('S24G', '24 V DC behind a single fuse', 7, [{ from: 'HQ-DB3', through: ['F8'] }]),
  left('S24H', '24 V DC behind the alarm contactor', 9, [{ from: 'HQ-DB3', through: ['K0'] }]),
];
