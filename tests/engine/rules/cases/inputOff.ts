/** Inputs whose device is off, and the least load of sensors. */
import { acInput, acSupply, cable, dcInput, inputPanel } from '../inputPanel';
import { twoWire, noTolerance, without, noCable, bare, opto, type Case } from '../inputParts';

export const offCases: Case[] = [
  // Off: 3 kΩ holds 1.667 mA below 5 V.
  ...(
    [
      ['1.66 mA leave 4.98 V', 1.66, 'ok'],
      ['1.67 mA leave 5.01 V, and exceed 1.5 mA', 1.67, 'fails'],
    ] as const
  ).map(([name, leakmA, expected]): Case => ({
    rule: 'input.leakage',
    name,
    panel: inputPanel(bare, { device: twoWire({ leakmA }) }),
    expected,
  })),
  {
    rule: 'input.leakage',
    name: '10 kΩ: 1.09 mA leave 10.9 V, off by current',
    panel: inputPanel(dcInput({ inputOhm: 10_000 }), { device: twoWire({ leakmA: 1.09 }) }),
    expected: 'ok',
  },
  {
    rule: 'input.leakage',
    name: '10 kΩ: 1.11 mA leave 11.1 V, more than UL₁',
    panel: inputPanel(dcInput({ inputOhm: 10_000 }), { device: twoWire({ leakmA: 1.11 }) }),
    expected: 'fails',
  },
  {
    rule: 'input.leakage',
    name: 'resistance unknown, 1.5 mA',
    panel: inputPanel(without(dcInput({ characteristic: 'constant-current', ratedmA: 3 }), 'inputOhm'), {
      device: twoWire({ leakmA: 1.5 }),
    }),
    expected: 'ok',
  },
  {
    rule: 'input.leakage',
    name: 'resistance unknown, 1.51 mA',
    panel: inputPanel(without(dcInput({ characteristic: 'constant-current', ratedmA: 3 }), 'inputOhm'), {
      device: twoWire({ leakmA: 1.51 }),
    }),
    expected: 'doubt',
  },
  { rule: 'input.leakage', name: 'a contact leaks nothing', panel: inputPanel(), expected: 'nothing' },
  {
    rule: 'input.leakage',
    name: 'two in parallel add up',
    panel: inputPanel(bare, { device: twoWire({ leakmA: 0.9 }), parallel: [twoWire({ leakmA: 0.9 })] }),
    expected: 'fails',
  },
  {
    rule: 'input.leakage',
    name: 'two in series do not',
    panel: inputPanel(bare, { device: twoWire({ leakmA: 0.9 }), series: [twoWire({ leakmA: 0.9 })] }),
    expected: 'ok',
  },
  {
    rule: 'input.leakage',
    name: 'opto: 0.5 mA is off',
    panel: inputPanel(opto, { device: twoWire({ leakmA: 0.5 }) }),
    expected: 'ok',
  },
  {
    rule: 'input.leakage',
    name: 'opto: 0.51 mA is not',
    panel: inputPanel(opto, { device: twoWire({ leakmA: 0.51 }) }),
    expected: 'fails',
  },
  {
    rule: 'input.never-off',
    name: '4 mA leave 12 V: on',
    panel: inputPanel(bare, { device: twoWire({ leakmA: 4 }) }),
    expected: 'fails',
  },
  {
    rule: 'input.never-off',
    name: '3.6 mA leave 10.8 V: undefined',
    panel: inputPanel(bare, { device: twoWire({ leakmA: 3.6 }) }),
    expected: 'ok',
  },
  {
    rule: 'input.never-off',
    name: 'resistance unknown',
    panel: inputPanel(without(dcInput({ characteristic: 'constant-current', ratedmA: 3 }), 'inputOhm'), {
      device: twoWire({ leakmA: 2 }),
    }),
    expected: 'missing modules.DI.io.inputOhm',
  },
  {
    rule: 'input.undefined',
    name: '3.6 mA leave 10.8 V',
    panel: inputPanel(bare, { device: twoWire({ leakmA: 3.6 }) }),
    expected: 'fails, ok',
  },

  // 230 V + 10 %, 40 kΩ of type 1: off to 2 mA, 80 V. 253·R/√(R² + X²) = 80 V at X = 120.0 kΩ: 26.52 nF, 221.03 m of 120 pF/m.
  {
    rule: 'input.cable-capacitance',
    name: '221 m',
    panel: inputPanel(acInput(), { cable: cable({ lengthM: 221 }) }, acSupply()),
    expected: 'ok',
  },
  {
    rule: 'input.cable-capacitance',
    name: '222 m',
    panel: inputPanel(acInput(), { cable: cable({ lengthM: 222 }) }, acSupply()),
    expected: 'fails',
  },
  {
    rule: 'input.cable-capacitance',
    name: 'capacitance not stated',
    panel: inputPanel(acInput(), { cable: without(cable(), 'pFperM') }, acSupply()),
    expected: 'missing points.DI.01.cable.pFperM',
  },
  {
    rule: 'input.cable-capacitance',
    name: 'no cable stated',
    panel: noCable(inputPanel(acInput(), {}, acSupply())),
    expected: 'missing points.DI.01.cable',
  },
  {
    rule: 'input.cable-capacitance',
    name: 'no tolerance stated',
    panel: inputPanel(acInput(), {}, noTolerance(acSupply())),
    expected: 'missing supplies.S1.tolerance',
  },
  { rule: 'input.cable-capacitance', name: 'DC', panel: inputPanel(), expected: 'nothing' },

  // Least load: 20.4 V − 4 V over 3 kΩ and 1.87 Ω of cable are 5.46 mA.
  {
    rule: 'input.min-load',
    name: 'asks for 5.46 mA',
    panel: inputPanel(bare, { device: twoWire({ minmA: 5.46 }) }),
    expected: 'ok',
  },
  {
    rule: 'input.min-load',
    name: 'asks for 5.47 mA',
    panel: inputPanel(bare, { device: twoWire({ minmA: 5.47 }) }),
    expected: 'fails',
  },
  {
    rule: 'input.min-load',
    name: 'type 3 of unknown current: 2 mA are sure',
    panel: inputPanel(without(without(bare, 'inputOhm'), 'characteristic'), {
      device: twoWire({ minmA: 2 }),
    }),
    expected: 'ok',
  },
  {
    rule: 'input.min-load',
    name: 'type 3 of unknown current: 2.1 mA are not',
    panel: inputPanel(without(without(bare, 'inputOhm'), 'characteristic'), {
      device: twoWire({ minmA: 2.1 }),
    }),
    expected: 'missing modules.DI.io.inputOhm',
  },
  { rule: 'input.min-load', name: 'a contact needs none', panel: inputPanel(), expected: 'nothing' },

  // 20.4 V − 2 · 4.7 V = 11.0 V without a cable's length.
  {
    rule: 'input.two-wire-in-series',
    name: 'two that keep 4.7 V each',
    panel: inputPanel(bare, {
      device: twoWire({ dropV: 4.7 }),
      series: [twoWire({ dropV: 4.7 })],
      cable: cable({ lengthM: 0 }),
    }),
    expected: 'ok',
  },
  {
    rule: 'input.two-wire-in-series',
    name: 'two that keep 4.8 V each',
    panel: inputPanel(bare, {
      device: twoWire({ dropV: 4.8 }),
      series: [twoWire({ dropV: 4.8 })],
      cable: cable({ lengthM: 0 }),
    }),
    expected: 'fails',
  },
  {
    rule: 'input.two-wire-in-series',
    name: 'no cable stated',
    panel: noCable(inputPanel(bare, { device: twoWire(), series: [twoWire()] })),
    expected: 'missing points.DI.01.cable',
  },
  {
    rule: 'input.two-wire-in-series',
    name: 'one',
    panel: inputPanel(bare, { device: twoWire() }),
    expected: 'nothing',
  },
];
