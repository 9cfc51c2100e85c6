/** Suppressors: none, wrong, the wrong way round. */
import { without, type Case } from '../inputParts';
import {
  acCoil,
  acPanel,
  coil,
  diode,
  outputPanel,
  rc,
  relay,
  sourcing,
  solidState,
  triac,
} from '../outputParts';

const none = { kind: 'none', at: 'load' } as const;
const withDiode = (more: Parameters<typeof diode>[0]) => outputPanel(sourcing(), { suppressor: diode(more) });
const on230 = (suppressor: ReturnType<typeof rc>) => acPanel(triac(), { suppressor });

export const outputSpikeCases: Case[] = [
  {
    rule: 'output.no-suppression',
    name: 'DC coil, none',
    panel: outputPanel(sourcing(), { suppressor: none }),
    expected: 'damages',
  },
  {
    rule: 'output.no-suppression',
    name: 'DC coil on a relay contact, none',
    panel: outputPanel(relay(), { suppressor: none }),
    expected: 'damages',
  },
  { rule: 'output.no-suppression', name: 'DC coil with a diode', panel: outputPanel(), expected: 'ok' },
  {
    rule: 'output.no-suppression',
    name: 'the coil has its own',
    panel: outputPanel(sourcing(), { suppressor: none, device: coil({ suppressed: true }) }),
    expected: 'ok',
  },
  {
    rule: 'output.no-suppression',
    name: 'AC coil on a triac, none',
    panel: acPanel(triac(), { suppressor: none }),
    expected: 'damages',
  },
  {
    rule: 'output.no-suppression',
    name: 'AC coil on a relay contact',
    panel: acPanel(relay(), { suppressor: none }),
    expected: 'nothing',
  },
  {
    rule: 'output.no-suppression',
    name: 'nobody says',
    panel: outputPanel(sourcing(), { suppressor: undefined }),
    expected: 'missing points.DO.01.suppressor',
  },
  {
    rule: 'output.no-suppression',
    name: 'coil behind a solid-state relay, nobody says',
    panel: outputPanel(sourcing(), { device: solidState({}, {}, { load: 'solenoid' }) }),
    expected: 'missing points.DO.01.device.load.suppressor',
  },
  // Three times 28.8 V is 86.4 V (reference §8: ten times is recommended).
  {
    rule: 'output.wrong-suppression',
    name: 'diode of 86.4 V',
    panel: withDiode({ V: 86.4 }),
    expected: 'ok',
  },
  {
    rule: 'output.wrong-suppression',
    name: 'diode of 86 V',
    panel: withDiode({ V: 86 }),
    expected: 'damages',
  },
  {
    rule: 'output.wrong-suppression',
    name: 'diode of 0.24 A on a coil of 0.25 A',
    panel: withDiode({ A: 0.24 }),
    expected: 'damages',
  },
  {
    rule: 'output.wrong-suppression',
    name: 'diode across the contact',
    panel: withDiode({ at: 'contact' }),
    expected: 'damages',
  },
  { rule: 'output.wrong-suppression', name: 'diode on AC', panel: on230(diode()), expected: 'damages' },
  {
    rule: 'output.wrong-suppression',
    name: 'reverse rating not stated',
    panel: outputPanel(sourcing(), { suppressor: without(diode(), 'V') }),
    expected: 'missing points.DO.01.suppressor.V',
  },
  {
    rule: 'output.wrong-suppression',
    name: 'TVS of 28.8 V',
    panel: withDiode({ kind: 'tvs', V: 28.8 }),
    expected: 'ok',
  },
  {
    rule: 'output.wrong-suppression',
    name: 'TVS of 28 V',
    panel: withDiode({ kind: 'tvs', V: 28 }),
    expected: 'damages',
  },
  // 1.1 × 230 V = 253 V.
  {
    rule: 'output.wrong-suppression',
    name: 'varistor of 253 V',
    panel: on230(rc({ kind: 'mov', V: 253 })),
    expected: 'ok',
  },
  {
    rule: 'output.wrong-suppression',
    name: 'varistor of 250 V',
    panel: on230(rc({ kind: 'mov', V: 250 })),
    expected: 'damages',
  },
  // 230 V and 0.1 A: 115 to 230 Ω, 0.05 to 0.1 µF (0.5 to 1 Ω/V and µF/A; reference §13 row 34 has the rule at 24 V, 0.5 A).
  {
    rule: 'output.wrong-suppression',
    name: 'RC of 115 Ω and 0.1 µF',
    panel: on230(rc({ ohm: 115, uF: 0.1 })),
    expected: 'ok',
  },
  {
    rule: 'output.wrong-suppression',
    name: 'RC of 100 Ω',
    panel: on230(rc({ ohm: 100 })),
    expected: 'damages',
  },
  {
    rule: 'output.wrong-suppression',
    name: 'RC of 0.22 µF',
    panel: on230(rc({ uF: 0.22 })),
    expected: 'damages',
  },
  {
    rule: 'output.wrong-suppression',
    name: 'capacitor of 250 V on 253 V',
    panel: on230(rc({ V: 250 })),
    expected: 'damages',
  },
  {
    rule: 'output.wrong-suppression',
    name: 'a module with diodes built in, on AC',
    panel: acPanel(relay({ suppression: 'diode' }), { device: acCoil(), suppressor: none }),
    expected: 'damages',
  },
  {
    rule: 'output.suppressor-reversed',
    name: 'the wrong way round',
    panel: withDiode({ reversed: true }),
    expected: 'damages',
  },
  { rule: 'output.suppressor-reversed', name: 'the right way round', panel: withDiode({}), expected: 'ok' },
  {
    rule: 'output.suppressor-reversed',
    name: 'not stated',
    panel: outputPanel(sourcing(), { suppressor: without(diode(), 'reversed') }),
    expected: 'missing points.DO.01.suppressor.reversed',
  },
];
