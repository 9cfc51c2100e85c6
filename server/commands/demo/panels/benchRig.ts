/** HQ-BR1: a bench rig with a microcontroller, discrete optocouplers and a small relay board. */
import type { Panel, Point } from '../../../../shared/panel/panelSchema';
import {
  contact,
  coil24,
  diode,
  face,
  inputPoint,
  isolator,
  lamp24,
  mains,
  onDc,
  outputPoint,
  pnp,
  regulated,
  terminalRange,
} from '../panelParts';

const shop = 'Workshop';

const points = (): Point[] => [
  ...[
    { description: 'Sample turbidity high', device: contact('B1', 'Bench'), lengthM: 2 },
    { description: 'Test valve open', device: pnp('B2', 'Bench'), lengthM: 2 },
    { description: 'Test valve closed', device: pnp('B3', 'Bench'), lengthM: 2 },
    { description: 'Lid shut', device: contact('B4', 'Bench'), lengthM: 1 },
  ].map((one, index) => inputPoint({ module: 'OB1', number: index + 1, group: 'G1', ...one })),
  ...[
    { description: 'Test valve', device: coil24('Y1', 'Bench', 'solenoid', 0.2), lengthM: 2 },
    { description: 'Stirrer relay', device: coil24('K2', 'Bench', 'coil', 0.04), lengthM: 1 },
    { description: 'Ready lamp', device: lamp24('H3', 'Bench'), lengthM: 1 },
  ].map((one, index) =>
    outputPoint(
      { module: 'RB2', number: index + 1, group: 'G2', ...one },
      onDc,
      one.device.load === 'led' ? {} : { suppressor: diode },
    ),
  ),
];

const plug = (tag: string, location: string) =>
  isolator(tag, {
    kind: 'plug',
    location,
    purpose: 'control',
    lock: 'device-needed',
    lockDevice: 'plug cover',
  });

export const benchRigPanel: Panel = {
  format: 'coldloop-panel/1',
  tag: 'HQ-BR1',
  name: 'Bench rig',
  location: shop,
  drawing: { number: 'E-210', revision: 'A' },
  practice: 'IEC 60204-1',
  frequencyHz: 50,
  ambientC: 40,
  wiringMethod: 'B2',
  disconnect: 'P1',
  earthTerminal: 'PE',
  sources: [
    { tag: 'HQ-DB4', kind: 'feeder', description: 'Bench socket', location: shop, V: 230, phases: 1 },
    {
      tag: 'PC1',
      kind: 'other-panel',
      description: 'Programming cable from the desk computer',
      location: shop,
      V: 5,
      phases: 'dc',
    },
  ],
  isolators: [plug('P1', 'Bench socket'), plug('P2', 'Desk computer')],
  supplies: [
    {
      tag: 'S24',
      description: 'Bench supply, 24 V DC',
      kind: 'dc',
      purpose: 'field',
      V: 24,
      tolerance: regulated,
      earthed: true,
      earthFaultMonitor: false,
      terminals: { plus: 'X1:1', minus: 'X1:2' },
      feeds: [{ from: 'HQ-DB4', through: ['P1'] }],
      ratedA: 2.5,
      otherLoadA: 0.2,
      protectionA: 2,
      bulk: { uF: 1000, dischargeS: 5 },
      extraLow: 'PELV',
    },
    {
      tag: 'S5',
      description: '5 V of the microcontroller',
      kind: 'dc',
      purpose: 'logic',
      V: 5,
      tolerance: mains,
      earthed: true,
      earthFaultMonitor: false,
      terminals: { plus: 'X9:1', minus: 'X9:2' },
      feeds: [{ from: 'PC1', through: ['P2'] }],
      ratedA: 0.5,
      otherLoadA: 0.2,
      protectionA: 0.5,
      bulk: 'none',
      extraLow: 'PELV',
      mayStayLive: {
        reason: 'The microcontroller keeps its log of the test',
        guard: 'Clear lid over the microcontroller, screwed shut',
      },
    },
  ],
  modules: [
    {
      tag: 'OB1',
      slot: '1',
      description: 'Discrete optocouplers, 4 inputs',
      terminals: face('OB1', 1, 4, 'OB1:0'),
      terminalRange,
      io: {
        kind: 'opto-input',
        seriesOhm: 3300,
        seriesW: 0.5,
        Vf: { min: 1.2, max: 1.7 },
        onmA: 5,
        offmA: 0.5,
        maxmA: 20,
        reverseV: 5,
        polarity: 'positive-only',
        ctr: { minPct: 50, loadOhm: 4700, logicV: 3.3, vceSat: 0.2, agePct: 30 },
      },
    },
    {
      tag: 'RB2',
      slot: '2',
      description: 'Relay board, 3 outputs',
      terminals: face('RB2', 1, 3, 'RB2:C'),
      terminalRange,
      io: {
        kind: 'digital-output',
        technology: 'relay',
        Vmin: 5,
        Vmax: 30,
        pointA: 1,
        groupA: 2,
        inrush: { A: 3, ms: 20 },
        leakmA: 0,
        onDropV: 0,
        minLoadmA: 10,
        suppression: 'none',
        contact: ['R300'],
        dc13: { V: 24, A: 0.5 },
      },
    },
  ],
  groups: [
    { tag: 'G1', module: 'OB1', terminal: 'OB1:0', supply: 'S24', common: 'negative' },
    {
      tag: 'G2',
      module: 'RB2',
      terminal: 'RB2:C',
      supply: 'S24',
      common: 'positive',
      fuse: { tag: 'F2', A: 1, kind: 'miniature-T' },
    },
  ],
  points: points(),
  stopControls: [
    {
      tag: 'S1',
      location: 'Front of the bench',
      stop: 'Press the red button S1',
      start: 'Press the green button S2',
    },
  ],
};
