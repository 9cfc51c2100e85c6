/** A small healthy panel with one input, in parts that a test can change one at a time. */
import type { Cable } from '../../../shared/panel/device';
import type { DigitalInput, ModuleIo, OptoInput } from '../../../shared/panel/moduleIo';
import type { Group, Module, Panel, Point, Supply } from '../../../shared/panel/panelSchema';
import { ruleContext, type RuleContext } from '../../../shared/rules/context';
import { atInput, type InputPlace } from '../../../shared/rules/input/inputPlace';

export const dcSupply = (more: Partial<Supply> = {}): Supply => ({
  tag: 'S1',
  description: 'Field supply',
  kind: 'dc',
  purpose: 'field',
  V: 24,
  tolerance: { minPct: -15, maxPct: 20 },
  earthed: true,
  terminals: { plus: 'X1:1', minus: 'X1:2' },
  feeds: [],
  ratedA: 10,
  otherLoadA: 0,
  protectionA: 4,
  bulk: 'none',
  extraLow: 'PELV',
  ...more,
});

export const acSupply = (more: Partial<Supply> = {}): Supply =>
  dcSupply({
    kind: 'ac1',
    V: 230,
    tolerance: { minPct: -10, maxPct: 10 },
    terminals: { L: 'X1:1', N: 'X1:2' },
    extraLow: 'none',
    ...more,
  });

/** 24 V DC, type 3, 3 kΩ: 0 V to 11 V for 3.6 mA and more. */
export const dcInput = (more: Partial<DigitalInput> = {}): DigitalInput => ({
  kind: 'digital-input',
  V: 24,
  current: 'dc',
  type: 3,
  inputOhm: 3000,
  characteristic: 'resistive',
  maxV: 30,
  reverseV: 40,
  polarity: 'either',
  ...more,
});

/** 230 V AC, type 1, 40 kΩ. */
export const acInput = (more: Partial<DigitalInput> = {}): DigitalInput =>
  dcInput({ V: 230, current: 'ac', type: 1, inputOhm: 40_000, maxV: 264, ...more });

export const optoInput = (more: Partial<OptoInput> = {}): OptoInput => ({
  kind: 'opto-input',
  seriesOhm: 2200,
  seriesW: 1,
  Vf: { min: 1.1, max: 1.5 },
  onmA: 4,
  offmA: 0.5,
  maxmA: 20,
  reverseV: 6,
  polarity: 'either',
  ...more,
});

export const cable = (more: Partial<Cable> = {}): Cable => ({
  size: { mm2: 0.75 },
  lengthM: 30,
  conductor: 'class5',
  cores: 2,
  grouped: 1,
  pFperM: 120,
  insulationV: 300,
  ...more,
});

const signalCore = { role: 'signal', wire: 'W1', colour: 'BK', terminal: 'DI:1' } as const;

export const inputPoint = (more: Partial<Point> = {}): Point => ({
  address: 'DI.01',
  terminal: 'DI:1',
  wire: 'W1',
  description: 'An input',
  group: 'G1',
  device: { kind: 'contact' },
  cable: cable(),
  otherSupply: 'none',
  ...more,
});

export const group = (more: Partial<Group> = {}): Group => ({
  tag: 'G1',
  module: 'DI',
  terminal: 'DI:C',
  supply: 'S1',
  common: 'negative',
  ...more,
});

export const module = (io: ModuleIo, more: Partial<Module> = {}): Module => ({
  tag: 'DI',
  slot: '1',
  description: 'A module',
  terminals: ['DI:1', 'DI:C'],
  terminalRange: { minMm2: 0.2, maxMm2: 2.5 },
  io,
  ...more,
});

export const panelOf = (parts: Partial<Panel> = {}): Panel => ({
  format: 'coldloop-panel/1',
  tag: 'P1',
  name: 'Test panel',
  location: 'Bench',
  drawing: { number: 'T-1', revision: 'A' },
  practice: 'IEC 60204-1',
  frequencyHz: 50,
  disconnect: null,
  earthTerminal: 'PE',
  sources: [],
  isolators: [],
  supplies: [dcSupply()],
  modules: [module(dcInput())],
  groups: [group()],
  points: [inputPoint()],
  stopControls: [],
  ...parts,
});

/** A panel with one input point: its device, cable and bleeder, its module, its supply. */
export const inputPanel = (
  io: ModuleIo = dcInput(),
  point: Partial<Point> = {},
  supply: Supply = dcSupply(),
  common: Group['common'] = supply.kind === 'dc' ? 'negative' : 'line',
): Panel =>
  panelOf({
    supplies: [supply],
    modules: [module(io)],
    groups: [group({ common })],
    points: [inputPoint({ conductors: [signalCore], ...point })],
  });

/** The first input of a panel as its rules see it. */
export function inputAt(panel: Panel): { at: InputPlace; context: RuleContext } {
  const context = ruleContext(panel);
  const found: InputPlace[] = [];
  for (const place of context.places.point)
    atInput(place, context, (at) => {
      found.push(at);
      return [];
    });
  const [at] = found;
  if (!at) throw new Error('no input in this panel');
  return { at, context };
}
