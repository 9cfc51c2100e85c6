/** A hand-made panel, its plan and its dead tests: small enough to count by hand, with one of each thing that makes a step. */
import type { ChecklistInput } from '../../shared/checklist/facts';
import type { DeadTest, LockPlan, PlannedIsolator } from '../../shared/isolation/types';
import { panelSchema, type Isolator, type Panel, type Point } from '../../shared/panel/panelSchema';
import { say } from '../../shared/panel/says';

const isolator = (tag: string, more: Partial<Isolator>): Isolator => ({
  tag,
  kind: 'disconnect',
  location: 'Filter gallery',
  inPanel: false,
  inSight: true,
  operatedFrom: 'outside',
  opens: 'all-conductors',
  loadBreak: true,
  suitableForIsolation: true,
  purpose: 'control',
  lock: 'hasp',
  ...more,
});

const isolators = {
  Q1: isolator('Q1', { inPanel: true, purpose: 'both' }),
  F7: isolator('F7', {
    kind: 'breaker',
    location: 'Panel MCC-2, pump hall',
    inSight: false,
    lock: 'device-needed',
    lockDevice: 'breaker clip',
    alsoFeeds: ['Dosing room lights', 'Packing line heater'],
  }),
  F9: isolator('F9', {
    kind: 'fuse-carrier',
    inPanel: true,
    operatedFrom: 'door-open',
    loadBreak: false,
    lock: 'cannot-lock',
  }),
  V1: isolator('V1', { kind: 'valve', purpose: 'motive' }),
};

const point = (address: string, terminal: string, group: string, more: Partial<Point>): Point => ({
  address,
  terminal,
  wire: `W${address}`,
  description: `Point ${address}`,
  group,
  device: { kind: 'contact' },
  otherSupply: 'none',
  ...more,
});

export const smallPanel = (): Panel =>
  panelSchema.parse({
    format: 'coldloop-panel/1',
    tag: 'FG-01',
    name: 'Filter gallery',
    location: 'Basement, filter gallery',
    drawing: { number: 'HQ-1201', revision: 'C' },
    practice: 'IEC 60204-1',
    frequencyHz: 50,
    disconnect: 'Q1',
    earthTerminal: 'PE',
    sources: [
      {
        tag: 'MAIN',
        kind: 'feeder',
        description: 'Works feeder',
        location: 'Pump hall',
        V: 400,
        phases: 3,
        arcFlash: { calPerCm2: 1.2, boundaryM: 0.5 },
      },
      {
        tag: 'MCC-2',
        kind: 'other-panel',
        description: 'From panel MCC-2',
        location: 'Pump hall',
        V: 230,
        phases: 1,
      },
      {
        tag: 'AIR',
        kind: 'pneumatic',
        description: 'Valve air',
        location: 'Filter gallery',
        isolators: ['V1'],
        dissipate: 'Open drain D1',
        verify: 'Gauge G1 shows 0',
      },
    ],
    isolators: Object.values(isolators),
    supplies: [
      {
        tag: 'S24',
        description: '24 V field',
        kind: 'dc',
        purpose: 'field',
        V: 24,
        tolerance: { minPct: -15, maxPct: 20 },
        earthed: true,
        terminals: { plus: 'X1:1', minus: 'X1:2' },
        feeds: [{ from: 'MAIN', through: ['Q1', 'F9'] }],
        bulk: { uF: 20000, bleedOhm: 1000 },
        extraLow: 'PELV',
      },
      {
        tag: 'S230',
        description: 'Pump start circuit',
        kind: 'ac1',
        purpose: 'field',
        V: 230,
        tolerance: { minPct: -10, maxPct: 10 },
        earthed: true,
        terminals: { L: 'X3:1', N: 'X3:2' },
        feeds: [{ from: 'MCC-2', through: ['F7'] }],
        bulk: 'none',
        extraLow: 'none',
      },
    ],
    modules: [
      {
        tag: 'DI3',
        slot: '3',
        description: 'Inputs',
        pluggable: true,
        terminals: ['1', '2', '3', '9'],
        io: {
          kind: 'digital-input',
          V: 24,
          current: 'dc',
          type: 3,
          ratedmA: 2.5,
          characteristic: 'constant-current',
          polarity: 'positive-only',
        },
      },
      {
        tag: 'DO4',
        slot: '4',
        description: 'Outputs',
        terminalRange: { minMm2: 0.5, maxMm2: 2.5, torqueNm: 0.6 },
        io: { kind: 'digital-output', technology: 'sourcing', Vmin: 20, Vmax: 30, pointA: 0.5, onDropV: 0.5 },
      },
      {
        tag: 'DO5',
        slot: '5',
        description: 'Relays',
        io: { kind: 'digital-output', technology: 'relay', Vmin: 5, Vmax: 250, pointA: 2 },
      },
      {
        tag: 'AI6',
        slot: '6',
        description: 'Analogue',
        io: { kind: 'analogue-input', signal: '4-20mA', powersLoop: false, isolated: true },
      },
    ],
    groups: [
      { tag: 'G3', module: 'DI3', terminal: 'DI3:9', supply: 'S24', common: 'negative' },
      {
        tag: 'G4',
        module: 'DO4',
        terminal: 'DO4:+',
        supply: 'S24',
        common: 'positive',
        fuse: { tag: 'F41', A: 2 },
      },
      { tag: 'G5', module: 'DO5', terminal: 'DO5:C', supply: 'S230', common: 'line' },
      { tag: 'G6', module: 'AI6', terminal: 'AI6:-', supply: 'S24', common: 'negative' },
    ],
    points: [
      point('DI3.01', '1', 'G3', {
        device: { kind: 'pnp', tag: 'B1', dropV: 2.5, leakmA: 0.1, maxmA: 200, supplymA: 10 },
        conductors: [
          { role: 'signal', wire: '101', terminal: '1', colour: 'BK' },
          { role: 'plus', wire: '102', terminal: 'X1:1', colour: 'BN' },
          { role: 'minus', wire: '103', terminal: 'X1:5', colour: 'BU' },
        ],
        cable: { tag: 'C1', size: { mm2: 0.5 }, lengthM: 20 },
      }),
      point('DI3.02', '2', 'G3', {
        cable: { tag: 'C2', size: { mm2: 1.5 }, lengthM: 100, conductor: 'class5' },
      }),
      point('DO4.01', 'DO4:1', 'G4', {
        device: { kind: 'load', tag: 'Y1', load: 'solenoid', V: 24, current: 'dc', A: 0.45, polarised: true },
        cable: { size: { awg: 18 }, lengthM: 10 },
        fuse: { tag: 'F42', A: 1 },
        suppressor: { kind: 'diode', at: 'load', V: 400 },
      }),
      point('DO5.01', 'DO5:1', 'G5', {
        device: { kind: 'load', tag: 'K1', load: 'coil', V: 230, current: 'ac', A: 0.1, polarised: false },
        suppressor: { kind: 'rc', at: 'contact' },
        otherSupply: 'S24',
      }),
      point('AI6.01', 'AI6:1', 'G6', {
        device: { kind: 'transmitter', tag: 'PT1', wires: 2 },
        cable: { tag: 'C9', size: { mm2: 0.75 }, lengthM: 30, screened: true, screenEarthed: 'panel' },
      }),
    ],
    stopControls: [
      {
        tag: 'S0',
        location: 'Gallery door',
        stop: 'Press the red head',
        start: 'Press the green head',
        beforeTry: 'Pull the red head out',
      },
    ],
  });

const planned = (tag: keyof typeof isolators, more: Partial<PlannedIsolator>): PlannedIsolator => ({
  isolator: isolators[tag],
  tell: isolators[tag].alsoFeeds ?? [],
  afterDoor: false,
  currentMustBeZero: false,
  extraMeasure: false,
  ...more,
});

const smallPlan = (panel: Panel): LockPlan => ({
  isolators: [
    planned('Q1', {}),
    planned('F7', {}),
    planned('F9', { afterDoor: true, currentMustBeZero: true, extraMeasure: true }),
  ],
  weight: 1035,
  guarded: [],
  cover: [{ incomingOf: 'Q1', V: 400, maybe: false, path: ['MAIN'] }],
  otherEnergy: panel.sources.filter(({ kind }) => kind === 'pneumatic'),
  proven: true,
});

const test = (
  at: DeadTest['at'],
  tag: string,
  supply: string,
  pair: DeadTest['pair'],
  terminal: string,
  second: string,
): DeadTest => ({
  id: `dead.${tag}.${pair.replace('/', '-')}`,
  at,
  terminal,
  second,
  supply,
  pair,
  limitV: 1,
  proves: true,
});

const smallDeadTests = (): DeadTest[] => [
  test({ supply: 'S24' }, 'S24', 'S24', '+/0 V', 'X1:1', 'X1:2'),
  test({ supply: 'S24' }, 'S24', 'S24', '+/PE', 'X1:1', 'PE'),
  test({ supply: 'S24' }, 'S24', 'S24', '0 V/PE', 'X1:2', 'PE'),
  test({ supply: 'S230' }, 'S230', 'S230', 'L/N', 'X3:1', 'X3:2'),
  test({ supply: 'S230' }, 'S230', 'S230', 'L/PE', 'X3:1', 'PE'),
  test({ supply: 'S230' }, 'S230', 'S230', 'N/PE', 'X3:2', 'PE'),
  test({ group: 'G4' }, 'G4', 'S24', '+/0 V', 'DO4:+', 'X1:2'),
  test({ group: 'G5' }, 'G5', 'S230', 'L/N', 'DO5:C', 'X3:2'),
  test({ point: 'DO5.01' }, 'DO5.01', 'S24', '+/0 V', 'DO5:1', 'X1:2'),
  test({ point: 'DI3.02' }, 'DI3.02', 'S24', '+/PE', '2', 'PE'),
];

export const smallScope = ['DI3.01', 'DI3.02', 'DO4.01', 'DO5.01', 'AI6.01'] as const;

/** What the server would hand to the generator for all points of the small panel. */
export function exampleInput(panel: Panel = smallPanel()): ChecklistInput {
  return {
    panel,
    panelDigest: 'a'.repeat(64),
    ruleSet: 'example-1',
    scope: smallScope,
    findings: [
      {
        rule: 'output.earth-fault-starts',
        harm: 'doubt',
        where: { point: 'DO4.01' },
        says: say('checklist.said', { words: 'One earth fault could turn Y1 on' }),
        because: [],
        addsSteps: [
          { family: 'earth-insulation', where: { point: 'DO4.01' } },
          { family: 'movement-warning', where: { point: 'DO4.01' } },
        ],
      },
      {
        rule: 'supply.no-tolerance',
        harm: 'doubt',
        where: { supply: 'S24' },
        says: say('checklist.said', { words: 'Nobody states the limits of S24' }),
        because: [],
        addsSteps: [{ family: 'settle-doubt', where: { supply: 'S24' } }],
      },
      {
        rule: 'input.leakage',
        harm: 'fails',
        where: { point: 'DI3.02' },
        says: say('checklist.said', { words: 'Leakage keeps the input on' }),
        because: [],
        remedy: { says: say('checklist.said', { words: 'Fit a resistor' }), values: { ohm: 3300, W: 1 } },
        addsSteps: [{ family: 'fit-bleeder', where: { point: 'DI3.02' } }],
      },
    ],
    plan: smallPlan(panel),
    stillLive: [
      { terminal: 'X3:1', supply: 'S230', V: 230, maybe: false, path: ['MCC-2', 'S230'] },
      { terminal: 'DO5:1', supply: 'S230', V: 230, maybe: true, path: ['MCC-2', 'S230', 'G5'] },
      { incomingOf: 'Q1', V: 400, maybe: false, path: ['MAIN'] },
    ],
    deadTests: smallDeadTests(),
    waits: [
      { supply: 'S24', t60S: 0, t1S: 81.3 },
      { supply: 'S230', t60S: 0, t1S: 0 },
    ],
    settings: { deadLimitV: 1, permitAsked: true, ferruleScheme: 'DIN 46228-4' },
  };
}
