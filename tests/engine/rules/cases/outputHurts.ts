/** Outputs that can hurt: they cannot turn off, stay live, hold, or mix phases. */
import { acSupply, dcSupply } from '../inputPanel';
import { noTolerance, unknownSupply, without, type Case } from '../inputParts';
import {
  acCoil,
  acPanel,
  coil,
  dcRelay,
  heater,
  outputGroup,
  outputPanel,
  outputPoint,
  rc,
  relay,
  solidState,
  sourcing,
  triac,
} from '../outputParts';
import type { Panel } from '../../../../shared/panel/panelSchema';

const ac3 = acSupply({
  kind: 'ac3',
  V: 400,
  terminals: { L1: 'X1:1', L2: 'X1:2', L3: 'X1:3', N: 'X1:4' },
});
type Phase = 'L1' | 'L2' | undefined;
/** A relay module with two commons on a three-phase supply. */
function phases(second: Phase, commonInsulationV: number | undefined, supply = ac3): Panel {
  const common = (tag: string, phase: Phase) =>
    outputGroup({ tag, terminal: `DO:${tag}`, common: 'line', ...(phase && { phase }) });
  const panel = acPanel(relay(), {}, { supply });
  return {
    ...panel,
    modules: panel.modules.map((one) => ({ ...one, ...(commonInsulationV && { commonInsulationV }) })),
    groups: [common('G1', 'L1'), common('G2', second)],
    points: [outputPoint({ device: acCoil() })],
  };
}

export const outputHurtsCases: Case[] = [
  { rule: 'output.triac-on-dc', name: 'triac on 24 V DC', panel: outputPanel(triac()), expected: 'hurts' },
  { rule: 'output.triac-on-dc', name: 'triac on 230 V AC', panel: acPanel(), expected: 'ok' },
  {
    rule: 'output.triac-on-dc',
    name: 'supply unknown',
    panel: unknownSupply(acPanel()),
    expected: 'missing groups.G1.supply',
  },
  {
    rule: 'output.switches-neutral',
    name: 'common on the earthed neutral',
    panel: acPanel(relay(), {}, { group: { common: 'neutral' } }),
    expected: 'hurts',
  },
  { rule: 'output.switches-neutral', name: 'common on the line', panel: acPanel(relay()), expected: 'ok' },
  {
    rule: 'output.switches-neutral',
    name: 'an unearthed supply has no neutral to earth',
    panel: acPanel(relay(), {}, { group: { common: 'neutral' }, supply: acSupply({ earthed: false }) }),
    expected: 'ok',
  },
  {
    rule: 'output.switches-neutral',
    name: 'supply unknown',
    panel: unknownSupply(acPanel(relay(), {}, { group: { common: 'neutral' } })),
    expected: 'missing groups.G1.supply',
  },
  // 230 V / 0.1 A = 2300 Ω; 15 % of 230 V is 34.5 V: 15 mA leave exactly that.
  ...(
    [
      ['15 mA leave 34.5 V', 15, 'ok'],
      ['15.1 mA leave 34.7 V', 15.1, 'hurts'],
    ] as const
  ).map(([name, leakmA, expected]): Case => ({
    rule: 'output.leakage-holds',
    name: `${name} at a contactor that lets go at 34.5 V`,
    panel: acPanel(triac({ leakmA })),
    expected,
  })),
  {
    rule: 'output.leakage-holds',
    name: 'a heater stays warm and does not move',
    panel: acPanel(triac({ leakmA: 15.1 }), {
      device: heater({ V: 230, current: 'ac', A: 0.1, dropOutPct: 15 }),
    }),
    expected: 'fails',
  },
  {
    rule: 'output.leakage-holds',
    name: 'leakage unknown',
    panel: acPanel(without(triac(), 'leakmA')),
    expected: 'missing modules.DO.io.leakmA',
  },
  // 0.1 µF across the contact at 50 Hz and 253 V: 7.95 mA (2πfCU).
  {
    rule: 'output.leakage-holds',
    name: 'a small coil behind an RC across the contact',
    panel: acPanel(relay(), { device: acCoil({ A: 0.04 }), suppressor: rc({ at: 'contact' }) }),
    expected: 'hurts',
  },
  {
    rule: 'output.leakage-holds',
    name: 'a larger coil behind the same RC',
    panel: acPanel(relay(), { device: acCoil({ A: 0.06 }), suppressor: rc({ at: 'contact' }) }),
    expected: 'ok',
  },
  {
    rule: 'output.leakage-holds',
    name: 'the RC across the contact has no stated capacitor',
    panel: acPanel(relay(), { suppressor: without(rc({ at: 'contact' }), 'uF') }),
    expected: 'missing points.DO.01.suppressor.uF',
  },
  // The load side of a solid-state relay leaks on its own supply: 1 mA × 230 V / 5 mA = 46 kΩ.
  {
    rule: 'output.leakage-holds',
    name: 'a solid-state relay holds a small coil',
    panel: outputPanel(sourcing(), { device: solidState({}, {}, { A: 0.005, load: 'coil' }) }),
    expected: 'hurts, ok',
  },
  {
    rule: 'output.ssr-load',
    name: 'AC relay on DC',
    panel: outputPanel(sourcing(), { device: solidState({}, {}, { supply: 'S1', V: 24, current: 'dc' }) }),
    expected: 'hurts',
  },
  {
    rule: 'output.ssr-load',
    name: 'DC relay on AC',
    panel: outputPanel(sourcing(), { device: dcRelay({ supply: 'S2' }) }),
    expected: 'damages',
  },
  {
    rule: 'output.ssr-load',
    name: 'DC relay on DC',
    panel: outputPanel(sourcing(), { device: dcRelay() }),
    expected: 'ok',
  },
  {
    rule: 'output.ssr-load',
    name: 'rated for exactly the high supply, 253 V, and its load',
    panel: outputPanel(sourcing(), { device: solidState({}, { V: 253.01, A: 4 }) }),
    expected: 'ok',
  },
  {
    rule: 'output.ssr-load',
    name: 'rated below the high supply',
    panel: outputPanel(sourcing(), { device: solidState({}, { V: 252 }) }),
    expected: 'damages',
  },
  {
    rule: 'output.ssr-load',
    name: 'load of 25.1 A on a relay of 25 A',
    panel: outputPanel(sourcing(), { device: solidState({}, {}, { A: 25.1 }) }),
    expected: 'damages',
  },
  {
    rule: 'output.ssr-load',
    name: 'direction of a DC load side not stated',
    panel: outputPanel(sourcing(), {
      device: solidState(
        {},
        { V: 60, current: 'dc', polarised: true },
        { supply: 'S1', V: 24, current: 'dc' },
      ),
    }),
    expected: 'missing points.DO.01.device.load.reversed',
  },
  {
    rule: 'output.phase-mixed',
    name: 'L1 beside L2, parts 300 V',
    panel: phases('L2', 300),
    expected: 'hurts',
  },
  {
    rule: 'output.phase-mixed',
    name: 'L1 beside L2, parts 440 V',
    panel: phases('L2', 440.01),
    expected: 'ok',
  },
  { rule: 'output.phase-mixed', name: 'L1 beside L1', panel: phases('L1', undefined), expected: 'ok' },
  {
    rule: 'output.phase-mixed',
    name: 'second phase unknown',
    panel: phases(undefined, 300),
    expected: 'missing groups.G2.phase',
  },
  {
    rule: 'output.phase-mixed',
    name: 'insulation unknown',
    panel: phases('L2', undefined),
    expected: 'missing modules.DO.commonInsulationV',
  },
  {
    rule: 'output.phase-mixed',
    name: 'tolerance unknown',
    panel: phases('L2', 440.01, noTolerance(ac3)),
    expected: 'missing supplies.S1.tolerance',
  },
  // IEC 60204-1 9.4.3.
  {
    rule: 'output.earth-fault-starts',
    name: 'sinking output on earthed 0 V, valve',
    panel: outputPanel(sourcing({ technology: 'sinking' }), {}, { group: { common: 'negative' } }),
    expected: 'doubt',
  },
  {
    rule: 'output.earth-fault-starts',
    name: 'sinking output on earthed 0 V, heater',
    panel: outputPanel(
      sourcing({ technology: 'sinking' }),
      { device: heater() },
      { group: { common: 'negative' } },
    ),
    expected: 'tells',
  },
  {
    rule: 'output.earth-fault-starts',
    name: 'sinking output, unearthed',
    panel: outputPanel(
      sourcing({ technology: 'sinking' }),
      { device: coil() },
      { group: { common: 'negative' }, supply: dcSupply({ earthed: false }) },
    ),
    expected: 'ok',
  },
  {
    rule: 'output.earth-fault-starts',
    name: 'nobody says what hangs on it',
    panel: outputPanel(
      sourcing({ technology: 'sinking' }),
      { device: { kind: 'contact' } },
      { group: { common: 'negative' } },
    ),
    expected: 'missing points.DO.01.device',
  },
];
