/** Analogue loops, sensors and cables. */
import type { Device } from '../../../../shared/panel/device';
import type { AnalogueInput } from '../../../../shared/panel/moduleIo';
import type { Panel, Point } from '../../../../shared/panel/panelSchema';
import { cable, dcSupply, group, inputPoint, module, panelOf } from '../inputPanel';
import { noCable, noTolerance, without, type Case } from '../inputParts';

const input = (more: Partial<AnalogueInput> = {}): AnalogueInput => ({
  kind: 'analogue-input',
  signal: '4-20mA',
  inputOhm: 250,
  powersLoop: true,
  isolated: true,
  ...more,
});
const twoWire: Device = { kind: 'transmitter', wires: 2, minV: 12 };
const fourWire: Device = { kind: 'transmitter', wires: 4 };
const analogue = (
  io: AnalogueInput | Panel['modules'][number]['io'],
  point: Partial<Point> = {},
  more: Partial<Panel> = {},
): Panel =>
  panelOf({
    modules: [module(io, { tag: 'AI' })],
    groups: [group({ module: 'AI' })],
    points: [inputPoint({ address: 'AI.01', terminal: 'AI:1', device: twoWire, ...point })],
    ...more,
  });
const rtd = (wires: 2 | 3 | 4): Device => ({ kind: 'rtd', wires });
const couple = (type: string): Device => ({ kind: 'thermocouple', type });
const tc = input({ signal: 'thermocouple', tcType: 'K', powersLoop: false });
const volts = input({ signal: '0-10V', powersLoop: false });
const plusFrom = (terminal: string): Partial<Point> => ({
  conductors: [{ role: 'plus', wire: 'W1+', colour: 'BU', terminal }],
});
const drives = (V: number, A: number): Device => ({
  kind: 'load',
  load: 'electronic',
  V,
  current: 'dc',
  A,
  polarised: false,
});
const beside = (panel: Panel): Panel => ({
  ...panel,
  points: [...panel.points, inputPoint({ address: 'AI.02', terminal: 'AI:2', wire: 'W2', device: twoWire })],
});

export const analogueCases: Case[] = [
  // 20.4 V − 12 V = 8.4 V: 420 Ω at 20 mA. No cable length, so that the edge is the input alone.
  {
    rule: 'analogue.compliance',
    name: '420 Ω',
    panel: analogue(input({ inputOhm: 419.9 }), { cable: cable({ lengthM: 0 }) }),
    expected: 'ok',
  },
  {
    rule: 'analogue.compliance',
    name: '421 Ω',
    panel: analogue(input({ inputOhm: 421 }), { cable: cable({ lengthM: 0 }) }),
    expected: 'fails',
  },
  {
    rule: 'analogue.compliance',
    name: 'input resistance not stated',
    panel: analogue(without(input(), 'inputOhm')),
    expected: 'missing modules.AI.io.inputOhm',
  },
  {
    rule: 'analogue.compliance',
    name: 'least volts of the transmitter not stated',
    panel: analogue(input(), { device: { kind: 'transmitter', wires: 2 } }),
    expected: 'missing points.AI.01.device.minV',
  },
  {
    rule: 'analogue.compliance',
    name: 'no cable stated',
    panel: noCable(analogue(input())),
    expected: 'missing points.AI.01.cable',
  },
  {
    rule: 'analogue.compliance',
    name: 'tolerance not stated',
    panel: analogue(input(), {}, { supplies: [noTolerance(dcSupply())] }),
    expected: 'missing supplies.S1.tolerance',
  },
  {
    rule: 'analogue.compliance',
    name: 'current output of 500 Ω at most on 600 Ω',
    panel: analogue(
      { kind: 'analogue-output', signal: '4-20mA', maxLoadOhm: 500 },
      { device: drives(12, 0.02) },
    ),
    expected: 'fails',
  },
  {
    rule: 'analogue.compliance',
    name: 'voltage output of 1 kΩ at least on 1 kΩ',
    panel: analogue(
      { kind: 'analogue-output', signal: '0-10V', minLoadOhm: 1000 },
      { device: drives(10, 0.01) },
    ),
    expected: 'ok',
  },
  {
    rule: 'analogue.power-twice',
    name: 'four-wire on an input that powers the loop',
    panel: analogue(input(), { device: fourWire }),
    expected: 'damages',
  },
  {
    rule: 'analogue.power-twice',
    name: 'four-wire on a passive input',
    panel: analogue(input({ powersLoop: false }), { device: fourWire }),
    expected: 'ok',
  },
  {
    rule: 'analogue.power-twice',
    name: 'two-wire with plus from the supply as well',
    panel: analogue(input(), plusFrom('X1:1')),
    expected: 'damages',
  },
  {
    rule: 'analogue.power-twice',
    name: 'two-wire with plus from the module',
    panel: analogue(input(), plusFrom('AI:L+')),
    expected: 'ok',
  },
  {
    rule: 'analogue.power-twice',
    name: 'conductors not stated',
    panel: analogue(input()),
    expected: 'missing points.AI.01.conductors',
  },
  {
    rule: 'analogue.power-none',
    name: 'two-wire on a passive input, no plus',
    panel: analogue(input({ powersLoop: false }), { conductors: [] }),
    expected: 'fails',
  },
  {
    rule: 'analogue.power-none',
    name: 'two-wire on a passive input with plus',
    panel: analogue(input({ powersLoop: false }), plusFrom('X1:1')),
    expected: 'ok',
  },
  {
    rule: 'analogue.power-none',
    name: 'conductors not stated',
    panel: analogue(input({ powersLoop: false })),
    expected: 'missing points.AI.01.conductors',
  },
  {
    rule: 'analogue.common-shared',
    name: 'four-wire beside another, not isolated',
    panel: beside(analogue(input({ isolated: false, powersLoop: false }), { device: fourWire })),
    expected: 'doubt, ok',
  },
  {
    rule: 'analogue.common-shared',
    name: 'isolated',
    panel: beside(analogue(input({ powersLoop: false }), { device: fourWire })),
    expected: 'ok',
  },
  {
    rule: 'analogue.common-shared',
    name: 'nobody says whether another supply reaches it',
    panel: beside(analogue(input({ isolated: false }), { otherSupply: undefined })),
    expected: 'missing points.AI.01.otherSupply, ok',
  },
  {
    rule: 'analogue.lead-count',
    name: 'two wires on three leads',
    panel: analogue(input({ signal: 'rtd', leads: 3 }), { device: rtd(2) }),
    expected: 'fails',
  },
  {
    rule: 'analogue.lead-count',
    name: 'three wires on three leads',
    panel: analogue(input({ signal: 'rtd', leads: 3 }), { device: rtd(3) }),
    expected: 'ok',
  },
  {
    rule: 'analogue.lead-count',
    name: 'leads of the input not stated',
    panel: analogue(input({ signal: 'rtd' }), { device: rtd(3) }),
    expected: 'missing modules.AI.io.leads',
  },
  // IEC 60584-3: KX extends a type K, copper does not.
  {
    rule: 'analogue.cable',
    name: 'type K on KX',
    panel: analogue(tc, { device: couple('K'), cable: cable({ type: 'KX, screened' }) }),
    expected: 'ok',
  },
  {
    rule: 'analogue.cable',
    name: 'type K on copper',
    panel: analogue(tc, { device: couple('K'), cable: cable({ type: 'Copper pair' }) }),
    expected: 'fails',
  },
  {
    rule: 'analogue.cable',
    name: 'type J on an input for K',
    panel: analogue(tc, { device: couple('J'), cable: cable({ type: 'JX' }) }),
    expected: 'fails',
  },
  {
    rule: 'analogue.cable',
    name: 'cable type not stated',
    panel: analogue(tc, { device: couple('K') }),
    expected: 'missing points.AI.01.cable.type',
  },
  {
    rule: 'analogue.cable',
    name: '0–10 V over 21 m without a screen',
    panel: analogue(volts, { device: fourWire, cable: cable({ lengthM: 21, screened: false }) }),
    expected: 'fails',
  },
  {
    rule: 'analogue.cable',
    name: '0–10 V over 20 m',
    panel: analogue(volts, { device: fourWire, cable: cable({ lengthM: 20, screened: false }) }),
    expected: 'ok',
  },
  {
    rule: 'analogue.cable',
    name: '0–10 V over 30 m, screen not stated',
    panel: analogue(volts, { device: fourWire, cable: cable({ lengthM: 30 }) }),
    expected: 'missing points.AI.01.cable.screened',
  },
];
