/** What inputs, sensors and resistors carry; saturation; earth faults. */
import { dcSupply, inputPanel, optoInput } from '../inputPanel';
import {
  twoWire,
  noTolerance,
  without,
  noCable,
  unknownSupply,
  bare,
  ctr,
  opto,
  type Case,
} from '../inputParts';

export const currentCases: Case[] = [
  // (28.8 − 1.1) / 2200 = 12.59 mA.
  {
    rule: 'input.overcurrent',
    name: 'LED of 12.6 mA',
    panel: inputPanel(optoInput({ maxmA: 12.6 })),
    expected: 'ok',
  },
  {
    rule: 'input.overcurrent',
    name: 'LED of 12.5 mA',
    panel: inputPanel(optoInput({ maxmA: 12.5 })),
    expected: 'damages',
  },
  {
    rule: 'input.overcurrent',
    name: 'no tolerance stated',
    panel: inputPanel(opto, {}, noTolerance()),
    expected: 'missing supplies.S1.tolerance',
  },
  // 28.8 V over 3 kΩ: 9.6 mA.
  {
    rule: 'input.overcurrent',
    name: 'sensor of 9.6 mA',
    panel: inputPanel(bare, { device: twoWire({ maxmA: 9.61 }) }),
    expected: 'ok',
  },
  {
    rule: 'input.overcurrent',
    name: 'sensor of 9.5 mA',
    panel: inputPanel(bare, { device: twoWire({ maxmA: 9.5 }) }),
    expected: 'damages',
  },
  {
    rule: 'input.overcurrent',
    name: 'sensor of 10 mA, input of unknown current (up to 15 mA)',
    panel: inputPanel(without(without(bare, 'inputOhm'), 'characteristic'), {
      device: twoWire({ maxmA: 10 }),
    }),
    expected: 'missing modules.DI.io.inputOhm',
  },

  // 12.59 mA in 2200 Ω are 0.3488 W: twice that is 0.698 W.
  {
    rule: 'input.resistor-hot',
    name: 'series resistor of 0.7 W',
    panel: inputPanel(optoInput({ seriesW: 0.7 })),
    expected: 'ok',
  },
  {
    rule: 'input.resistor-hot',
    name: 'series resistor of 0.69 W',
    panel: inputPanel(optoInput({ seriesW: 0.69 })),
    expected: 'damages',
  },
  {
    rule: 'input.resistor-hot',
    name: 'no tolerance stated',
    panel: inputPanel(opto, {}, noTolerance()),
    expected: 'missing supplies.S1.tolerance',
  },
  // 28.8² / 1659 = 0.49997 W.
  {
    rule: 'input.resistor-hot',
    name: '1659 Ω, 1 W across the input',
    panel: inputPanel(bare, { bleeder: { ohm: 1659, W: 1 } }),
    expected: 'ok',
  },
  {
    rule: 'input.resistor-hot',
    name: '1600 Ω, 1 W across the input',
    panel: inputPanel(bare, { bleeder: { ohm: 1600, W: 1 } }),
    expected: 'damages',
  },

  // 8.583 mA · 0.5 · 0.5 = 2.146 mA; (5 − 0.4) / R.
  {
    rule: 'input.not-saturated',
    name: 'asks for 2.14 mA',
    panel: inputPanel(optoInput({ ctr: { ...ctr, loadOhm: 2150 } })),
    expected: 'ok',
  },
  {
    rule: 'input.not-saturated',
    name: 'asks for 2.16 mA',
    panel: inputPanel(optoInput({ ctr: { ...ctr, loadOhm: 2130 } })),
    expected: 'fails',
  },
  {
    rule: 'input.not-saturated',
    name: 'saturation volts not stated, enough even for 0 V',
    panel: inputPanel(optoInput({ ctr: without({ ...ctr, loadOhm: 2400 }, 'vceSat') })),
    expected: 'ok',
  },
  {
    rule: 'input.not-saturated',
    name: 'saturation volts not stated, and they decide',
    panel: inputPanel(optoInput({ ctr: without({ ...ctr, loadOhm: 2200 }, 'vceSat') })),
    expected: 'missing modules.DI.io.ctr.vceSat',
  },
  {
    rule: 'input.not-saturated',
    name: 'no cable stated',
    panel: noCable(inputPanel(optoInput({ ctr }))),
    expected: 'missing points.DI.01.cable',
  },

  {
    rule: 'input.earth-fault-on',
    name: 'common at plus, 0 V earthed',
    panel: inputPanel(bare, {}, dcSupply(), 'positive'),
    expected: 'tells',
  },
  {
    rule: 'input.earth-fault-on',
    name: 'common at plus, unearthed',
    panel: inputPanel(bare, {}, dcSupply({ earthed: false }), 'positive'),
    expected: 'ok',
  },
  { rule: 'input.earth-fault-on', name: 'common at 0 V', panel: inputPanel(), expected: 'nothing' },
  {
    rule: 'input.earth-fault-on',
    name: 'supply unknown',
    panel: unknownSupply(inputPanel(bare, {}, dcSupply(), 'positive')),
    expected: 'missing groups.G1.supply',
  },
];
