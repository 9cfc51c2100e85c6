/** Supplies: missing, of the wrong kind or level, overloaded. */
import {
  acInput,
  acSupply,
  dcInput,
  dcSupply,
  group,
  inputPanel,
  inputPoint,
  module,
  panelOf,
} from '../inputPanel';
import { noTolerance, unknownSupply, without, type Case } from '../inputParts';
import { output, load, outputPanel, three } from '../supplyParts';

export const supplyCases: Case[] = [
  { rule: 'supply.missing', name: 'none named', panel: unknownSupply(inputPanel()), expected: 'doubt' },
  {
    rule: 'supply.missing',
    name: 'one that does not exist',
    panel: panelOf({ groups: [group({ supply: 'S9' })] }),
    expected: 'doubt',
  },
  { rule: 'supply.missing', name: 'named', panel: inputPanel(), expected: 'ok' },

  {
    rule: 'supply.logic-feeds-field',
    name: 'logic',
    panel: inputPanel(dcInput(), {}, dcSupply({ purpose: 'logic' })),
    expected: 'fails',
  },
  { rule: 'supply.logic-feeds-field', name: 'field', panel: inputPanel(), expected: 'ok' },
  {
    rule: 'supply.logic-feeds-field',
    name: 'supply unknown',
    panel: unknownSupply(inputPanel()),
    expected: 'missing groups.G1.supply',
  },

  {
    rule: 'supply.kind',
    name: 'AC on a DC input',
    panel: inputPanel(dcInput(), {}, acSupply()),
    expected: 'damages',
  },
  { rule: 'supply.kind', name: 'DC on an AC input', panel: inputPanel(acInput()), expected: 'damages' },
  { rule: 'supply.kind', name: 'DC on a DC input', panel: inputPanel(), expected: 'ok' },
  {
    rule: 'supply.kind',
    name: 'AC on a relay',
    panel: panelOf({
      supplies: [acSupply()],
      modules: [module(output({ technology: 'relay' }))],
      groups: [group({ common: 'line' })],
    }),
    expected: 'ok',
  },
  {
    rule: 'supply.kind',
    name: 'a common at line on DC',
    panel: inputPanel(dcInput(), {}, dcSupply(), 'line'),
    expected: 'damages',
  },
  {
    rule: 'supply.kind',
    name: 'supply unknown',
    panel: unknownSupply(inputPanel()),
    expected: 'missing groups.G1.supply',
  },

  // 24 V + 20 % = 28.8 V, − 15 % = 20.4 V.
  {
    rule: 'supply.level-high',
    name: 'the input stands 28.8 V',
    panel: inputPanel(dcInput({ maxV: 28.8 })),
    expected: 'ok',
  },
  {
    rule: 'supply.level-high',
    name: 'the input stands 28.7 V',
    panel: inputPanel(dcInput({ maxV: 28.7 })),
    expected: 'damages',
  },
  {
    rule: 'supply.level-high',
    name: 'not stated: a type 3 stands its range, 30 V',
    panel: inputPanel(without(dcInput(), 'maxV')),
    expected: 'ok',
  },
  {
    rule: 'supply.level-high',
    name: 'not stated, 48 V on it',
    panel: inputPanel(without(dcInput(), 'maxV'), {}, dcSupply({ V: 48 })),
    expected: 'damages',
  },
  {
    rule: 'supply.level-high',
    name: 'custom, not stated',
    panel: inputPanel(without(dcInput({ type: 'custom' }), 'maxV')),
    expected: 'missing modules.DI.io.maxV',
  },
  {
    rule: 'supply.level-high',
    name: '253 V on 230 V type 1 (1.1 times)',
    panel: inputPanel(without(acInput(), 'maxV'), {}, acSupply()),
    expected: 'ok',
  },
  {
    rule: 'supply.level-high',
    name: 'no tolerance',
    panel: inputPanel(dcInput(), {}, noTolerance()),
    expected: 'missing supplies.S1.tolerance',
  },
  {
    rule: 'supply.level-high',
    name: 'an output that stands 28.7 V',
    panel: panelOf({ modules: [module(output({ Vmax: 28.7 }))] }),
    expected: 'damages',
  },
  {
    rule: 'supply.level-low',
    name: 'type 1 is on from 15 V; 15.3 V',
    panel: inputPanel(dcInput({ type: 1 }), {}, dcSupply({ V: 18 })),
    expected: 'ok',
  },
  {
    rule: 'supply.level-low',
    name: '14.45 V',
    panel: inputPanel(dcInput({ type: 1 }), {}, dcSupply({ V: 17 })),
    expected: 'fails',
  },
  {
    rule: 'supply.level-low',
    name: 'an output that works from 20.5 V',
    panel: panelOf({ modules: [module(output({ Vmin: 20.5 }))] }),
    expected: 'fails',
  },
  {
    rule: 'supply.level-low',
    name: 'an output that works from 20.4 V',
    panel: panelOf({ modules: [module(output({ Vmin: 20.4 }))] }),
    expected: 'ok',
  },
  {
    rule: 'supply.level-low',
    name: 'custom without thresholds',
    panel: inputPanel(dcInput({ type: 'custom' })),
    expected: 'missing modules.DI.io.thresholds',
  },
  {
    rule: 'supply.level-low',
    name: 'no tolerance',
    panel: inputPanel(dcInput(), {}, noTolerance()),
    expected: 'missing supplies.S1.tolerance',
  },

  {
    rule: 'supply.no-tolerance',
    name: 'not stated',
    panel: inputPanel(dcInput(), {}, noTolerance()),
    expected: 'doubt',
  },
  { rule: 'supply.no-tolerance', name: 'stated', panel: inputPanel(), expected: 'ok' },

  {
    rule: 'supply.overload',
    name: '0.2 + 9.8 A on 10 A',
    panel: outputPanel(dcSupply({ otherLoadA: 9.8 })),
    expected: 'ok',
  },
  {
    rule: 'supply.overload',
    name: '0.2 + 9.9 A on 10 A',
    panel: outputPanel(dcSupply({ otherLoadA: 9.9 })),
    expected: 'fails',
  },
  {
    rule: 'supply.overload',
    name: 'rating not stated',
    panel: outputPanel(without(dcSupply(), 'ratedA')),
    expected: 'missing supplies.S1.ratedA',
  },
  {
    rule: 'supply.overload',
    name: 'other loads not stated',
    panel: outputPanel(without(dcSupply(), 'otherLoadA')),
    expected: 'missing supplies.S1.otherLoadA',
  },
  {
    rule: 'supply.overload',
    name: 'too much, whatever else hangs on it',
    panel: outputPanel(without(dcSupply({ ratedA: 0.1 }), 'otherLoadA')),
    expected: 'fails',
  },
  {
    rule: 'supply.overload',
    name: 'nothing hangs on it',
    panel: panelOf({ groups: [], points: [] }),
    expected: 'nothing',
  },
  {
    rule: 'supply.overload',
    name: '6 A on each of two phases of 10 A',
    panel: panelOf({
      supplies: [three],
      groups: [
        group({ common: 'line', phase: 'L1' }),
        group({ tag: 'G2', terminal: 'C2', common: 'line', phase: 'L2' }),
      ],
      modules: [module(output({ technology: 'relay' }))],
      points: [inputPoint(load(6)), inputPoint({ ...load(6), address: 'DI.02', group: 'G2' })],
    }),
    expected: 'ok',
  },
];
