/** Inputs whose device has switched. */
import { cable, dcInput, inputPanel, optoInput } from '../inputPanel';
import { noTolerance, without, noCable, bare, opto, type Case } from '../inputParts';

export const onCases: Case[] = [
  // On at the low supply: 24 V − 15 % = 20.4 V. No cable length, so that the edge is the drop alone.
  ...(
    [
      ['leaves 11 V for a type 3', 9.4, 'ok'],
      ['leaves 10.9 V: undefined, not off', 9.5, 'ok'],
      ['leaves 5.1 V: undefined, not off', 15.3, 'ok'],
      // 4.9 V draw 1.63 mA, which is more than IT min: off by volts.
      ['leaves 4.9 V', 15.5, 'fails'],
    ] as const
  ).map(([name, dropV, expected]): Case => ({
    rule: 'input.never-on',
    name,
    panel: inputPanel(bare, {
      device: { kind: 'ssr-output', dropV, leakmA: 0 },
      cable: cable({ lengthM: 0 }),
    }),
    expected,
  })),
  ...(
    [
      ['leaves 11 V', 9.4, 'ok'],
      ['leaves 10.9 V', 9.5, 'fails, ok'],
      ['leaves 4.9 V: off, not undefined', 15.5, 'ok'],
    ] as const
  ).map(([name, dropV, expected]): Case => ({
    rule: 'input.undefined',
    name,
    panel: inputPanel(bare, {
      device: { kind: 'ssr-output', dropV, leakmA: 0 },
      cable: cable({ lengthM: 0 }),
    }),
    expected,
  })),
  {
    rule: 'input.never-on',
    name: 'NAMUR never conducts enough',
    panel: inputPanel(bare, { device: { kind: 'namur' } }),
    expected: 'fails',
  },
  {
    rule: 'input.never-on',
    name: 'no cable stated',
    panel: noCable(inputPanel()),
    expected: 'missing points.DI.01.cable',
  },
  {
    rule: 'input.never-on',
    name: 'no tolerance stated',
    panel: inputPanel(bare, {}, noTolerance()),
    expected: 'missing supplies.S1.tolerance',
  },
  {
    rule: 'input.never-on',
    name: 'no cable, and already too low without one',
    panel: noCable(inputPanel(bare, { device: { kind: 'ssr-output', dropV: 16, leakmA: 0 } })),
    expected: 'fails',
  },
  {
    rule: 'input.never-on',
    name: 'custom without thresholds',
    panel: inputPanel(dcInput({ type: 'custom' })),
    expected: 'missing modules.DI.io.thresholds',
  },
  {
    rule: 'input.never-on',
    name: 'a type that the table does not hold at 12 V',
    panel: inputPanel(dcInput({ V: 12 })),
    expected: 'missing modules.DI.io.thresholds',
  },
  {
    rule: 'input.never-on',
    name: 'custom: 20 V but 6.5 mA of the 7 asked for is undefined, not off',
    panel: inputPanel(dcInput({ type: 'custom', thresholds: { UL_V: 5, UH_V: 15, IT_mA: 1, IH_mA: 7 } })),
    expected: 'ok',
  },
  {
    rule: 'input.undefined',
    name: 'custom: 20 V but less than the 7 mA asked for',
    panel: inputPanel(dcInput({ type: 'custom', thresholds: { UL_V: 5, UH_V: 15, IT_mA: 1, IH_mA: 7 } })),
    expected: 'fails, ok',
  },
  {
    rule: 'input.never-on',
    name: 'custom, nothing stated of its current',
    panel: inputPanel(
      without(dcInput({ type: 'custom', thresholds: { UL_V: 5, UH_V: 15, IT_mA: 1, IH_mA: 2 } }), 'inputOhm'),
    ),
    expected: 'missing modules.DI.io.inputOhm',
  },
  {
    rule: 'input.never-on',
    name: 'type 3 of unknown current on 30 m: on even with the most it may draw',
    panel: inputPanel(without(without(bare, 'inputOhm'), 'characteristic')),
    expected: 'ok',
  },
  {
    rule: 'input.undefined',
    name: 'type 3 of unknown current on 12 km: it hangs on the current',
    panel: inputPanel(without(without(bare, 'inputOhm'), 'characteristic'), {
      cable: cable({ lengthM: 12_000 }),
    }),
    expected: 'missing modules.DI.io.inputOhm, ok',
  },
  {
    rule: 'input.never-on',
    name: 'a load is no switch',
    panel: inputPanel(bare, {
      device: { kind: 'load', load: 'lamp', V: 24, current: 'dc', A: 0.1, polarised: false },
    }),
    expected: 'missing points.DI.01.device',
  },
  {
    rule: 'input.never-on',
    name: 'a group that does not exist',
    panel: inputPanel(bare, { group: 'G9' }),
    expected: 'missing points.DI.01.group',
  },
  {
    rule: 'input.never-on',
    name: 'spare and empty',
    panel: noCable(inputPanel(bare, { spare: true, conductors: [] })),
    expected: 'nothing',
  },
  { rule: 'input.never-on', name: 'opto: 8.58 mA for 4', panel: inputPanel(opto), expected: 'ok' },
  // (20.4 − 1.5) / (2200 + 30·2·26·1.1965/1000) = 8.583 mA.
  {
    rule: 'input.undefined',
    name: 'opto asking for 8.59 mA',
    panel: inputPanel(optoInput({ onmA: 8.59 })),
    expected: 'fails, ok',
  },
  {
    rule: 'input.undefined',
    name: 'opto asking for 8.58 mA',
    panel: inputPanel(optoInput({ onmA: 8.58 })),
    expected: 'ok',
  },
  {
    rule: 'input.never-on',
    name: 'opto off up to 8.59 mA',
    panel: inputPanel(optoInput({ onmA: 9, offmA: 8.59 })),
    expected: 'fails',
  },
];
