/** Currents, contacts, volts and poles of outputs. */
import { acSupply, cable, dcSupply } from '../inputPanel';
import { noCable, noTolerance, unknownSupply, without, type Case } from '../inputParts';
import {
  acCoil,
  acPanel,
  coil,
  heater,
  outputPanel,
  outputPoint,
  relay,
  solidState,
  sourcing,
  triac,
} from '../outputParts';

const unknownDevice = { device: { kind: 'contact' as const, tag: 'S9' } };
const second = (A: number) =>
  outputPoint({ address: 'DO.02', terminal: 'DO:2', wire: 'W2', device: coil({ A }) });
const dcContact = (A: number, io = relay(), supply = dcSupply({ tolerance: { minPct: 0, maxPct: 0 } })) =>
  outputPanel(io, { device: coil({ A }) }, { supply });
/** 125 V DC: R300 breaks 0.22 A there (IEC 60947-5-1 Annex A; reference §13 row 30). */
const at125 = dcSupply({ V: 125, tolerance: { minPct: 0, maxPct: 0 }, extraLow: 'none' });
/** 240 V AC: B300 makes 15 A and breaks 1.5 A there (same row). */
const at240 = acSupply({ V: 240, tolerance: { minPct: 0, maxPct: 0 } });

export const outputLoadCases: Case[] = [
  { rule: 'output.transistor-on-ac', name: 'on 230 V AC', panel: acPanel(sourcing()), expected: 'damages' },
  { rule: 'output.transistor-on-ac', name: 'on 24 V DC', panel: outputPanel(), expected: 'ok' },
  {
    rule: 'output.transistor-on-ac',
    name: 'supply unknown',
    panel: unknownSupply(outputPanel()),
    expected: 'missing groups.G1.supply',
  },
  {
    rule: 'output.polarity',
    name: 'sourcing output with its common at 0 V',
    panel: outputPanel(sourcing(), { conductors: [] }, { group: { common: 'negative' } }),
    expected: 'damages',
  },
  {
    rule: 'output.polarity',
    name: 'sinking output with its common at plus',
    panel: outputPanel(sourcing({ technology: 'sinking' })),
    expected: 'damages',
  },
  {
    rule: 'output.polarity',
    name: 'sourcing output with its common at plus',
    panel: outputPanel(),
    expected: 'ok',
  },
  {
    rule: 'output.polarity',
    name: 'polarised load the wrong way round',
    panel: outputPanel(sourcing(), { device: coil({ polarised: true, reversed: true }) }),
    expected: 'damages',
  },
  {
    rule: 'output.polarity',
    name: 'polarised load the right way round',
    panel: outputPanel(sourcing(), { device: coil({ polarised: true, reversed: false }) }),
    expected: 'ok',
  },
  {
    rule: 'output.polarity',
    name: 'direction of a polarised load not stated',
    panel: outputPanel(sourcing(), { device: coil({ polarised: true }) }),
    expected: 'missing points.DO.01.device.reversed',
  },
  {
    rule: 'output.polarity',
    name: 'far end of the load on the pole of the common',
    panel: outputPanel(sourcing(), {
      conductors: [
        { role: 'signal', wire: 'W1', colour: 'BU', terminal: 'DO:1' },
        { role: 'plus', wire: 'W1+', colour: 'BU', terminal: 'X3:1' },
      ],
    }),
    expected: 'damages',
  },
  {
    rule: 'output.point-current',
    name: '0.5 A of 0.5 A',
    panel: outputPanel(sourcing(), { device: coil({ A: 0.5 }) }),
    expected: 'ok',
  },
  {
    rule: 'output.point-current',
    name: '0.51 A of 0.5 A',
    panel: outputPanel(sourcing(), { device: coil({ A: 0.51 }) }),
    expected: 'damages',
  },
  {
    rule: 'output.point-current',
    name: 'two loads in parallel add up',
    panel: outputPanel(sourcing(), { device: coil({ A: 0.3 }), parallel: [coil({ A: 0.3 })] }),
    expected: 'damages',
  },
  {
    rule: 'output.point-current',
    name: 'nobody says what it drives',
    panel: outputPanel(sourcing(), unknownDevice),
    expected: 'missing points.DO.01.device.A',
  },
  {
    rule: 'output.group-current',
    name: '0.8 A of 0.8 A',
    panel: outputPanel(sourcing({ groupA: 0.8 }), { device: coil({ A: 0.4 }) }, { beside: [second(0.4)] }),
    expected: 'ok',
  },
  {
    rule: 'output.group-current',
    name: '0.81 A of 0.8 A',
    panel: outputPanel(sourcing({ groupA: 0.8 }), { device: coil({ A: 0.4 }) }, { beside: [second(0.41)] }),
    expected: 'damages',
  },
  {
    rule: 'output.group-current',
    name: 'limit of the common unknown',
    panel: outputPanel(
      without(sourcing(), 'groupA'),
      { device: coil({ A: 0.4 }) },
      { beside: [second(0.4)] },
    ),
    expected: 'missing modules.DO.io.groupA',
  },
  // A filament lamp draws up to 15 times its current (reference §8, §13 row 35: 0.2 A lamp, 2 to 3 A).
  {
    rule: 'output.inrush',
    name: 'stated 2 A for 20 ms of 2 A for 20 ms',
    panel: outputPanel(sourcing(), { device: coil({ load: 'lamp', inrushA: 2, inrushMs: 20 }) }),
    expected: 'ok',
  },
  {
    rule: 'output.inrush',
    name: 'stated 2.1 A',
    panel: outputPanel(sourcing(), { device: coil({ load: 'lamp', inrushA: 2.1, inrushMs: 20 }) }),
    expected: 'damages',
  },
  {
    rule: 'output.inrush',
    name: 'stated 21 ms',
    panel: outputPanel(sourcing(), { device: coil({ load: 'lamp', inrushA: 2, inrushMs: 21 }) }),
    expected: 'damages',
  },
  {
    rule: 'output.inrush',
    name: 'a lamp of 0.2 A without a stated inrush may draw 3 A',
    panel: outputPanel(sourcing(), { device: coil({ load: 'lamp', A: 0.2 }) }),
    expected: 'missing points.DO.01.device.inrushA',
  },
  {
    rule: 'output.inrush',
    name: 'surge of the output not stated',
    panel: outputPanel(without(sourcing(), 'inrush'), {
      device: coil({ load: 'lamp', inrushA: 2, inrushMs: 20 }),
    }),
    expected: 'missing modules.DO.io.inrush',
  },
  { rule: 'output.inrush', name: 'a DC coil has no inrush', panel: outputPanel(), expected: 'ok' },
  {
    rule: 'output.contact-dc',
    name: 'R300 at 125 V, 0.22 A',
    panel: dcContact(0.22, relay(), at125),
    expected: 'ok',
  },
  {
    rule: 'output.contact-dc',
    name: 'R300 at 125 V, 0.23 A',
    panel: dcContact(0.23, relay(), at125),
    expected: 'damages',
  },
  {
    rule: 'output.contact-dc',
    name: 'R300 at 24 V: never above thermal, 1 A',
    panel: dcContact(1),
    expected: 'ok',
  },
  { rule: 'output.contact-dc', name: 'R300 at 24 V, 1.05 A', panel: dcContact(1.05), expected: 'damages' },
  {
    rule: 'output.contact-dc',
    name: 'DC-13 of 2 A at 24 V',
    panel: dcContact(2, relay({ dc13: { V: 24, A: 2 } })),
    expected: 'ok',
  },
  {
    rule: 'output.contact-dc',
    name: 'only an AC code stated',
    panel: dcContact(0.2, relay({ contact: ['B300'] })),
    expected: 'missing modules.DO.io.dc13',
  },
  {
    rule: 'output.contact-ac',
    name: 'B300 at 240 V: 1.5 A broken, 15 A made',
    panel: acPanel(relay(), { device: acCoil({ A: 1.5, inrushA: 15 }) }, { supply: at240 }),
    expected: 'ok',
  },
  {
    rule: 'output.contact-ac',
    name: 'B300 at 240 V: 1.51 A broken',
    panel: acPanel(relay(), { device: acCoil({ A: 1.51, inrushA: 10 }) }, { supply: at240 }),
    expected: 'damages',
  },
  {
    rule: 'output.contact-ac',
    name: 'B300 at 240 V: 15.1 A made',
    panel: acPanel(relay(), { device: acCoil({ A: 1, inrushA: 15.1 }) }, { supply: at240 }),
    expected: 'damages',
  },
  {
    rule: 'output.contact-ac',
    name: 'inrush of a 1 A coil not stated: up to 20 A',
    panel: acPanel(relay(), { device: without(acCoil({ A: 1 }), 'inrushA') }, { supply: at240 }),
    expected: 'missing points.DO.01.device.inrushA',
  },
  {
    rule: 'output.contact-ac',
    name: 'only a DC code stated',
    panel: acPanel(relay({ contact: ['R300'] })),
    expected: 'missing modules.DO.io.contact',
  },
  // 24 V + 20 % = 28.8 V; − 15 % = 20.4 V (IEC 61131-2 supply tolerance).
  {
    rule: 'output.voltage-window',
    name: 'up to 28.8 V on 28.9 V',
    panel: outputPanel(sourcing({ Vmax: 28.9 })),
    expected: 'ok',
  },
  {
    rule: 'output.voltage-window',
    name: 'up to 28.8 V on 28.7 V',
    panel: outputPanel(sourcing({ Vmax: 28.7 })),
    expected: 'damages',
  },
  {
    rule: 'output.voltage-window',
    name: 'down to 20.4 V, needs 20.5 V',
    panel: outputPanel(sourcing({ Vmin: 20.5 })),
    expected: 'damages',
  },
  {
    rule: 'output.voltage-window',
    name: 'a 12 V coil on 24 V',
    panel: outputPanel(sourcing(), { device: coil({ V: 12 }) }),
    expected: 'damages',
  },
  {
    rule: 'output.voltage-window',
    name: 'an AC coil on DC',
    panel: outputPanel(sourcing(), { device: coil({ current: 'ac' }) }),
    expected: 'damages',
  },
  {
    rule: 'output.voltage-window',
    name: 'tolerance unknown',
    panel: outputPanel(sourcing(), {}, { supply: noTolerance() }),
    expected: 'missing supplies.S1.tolerance',
  },
  {
    rule: 'output.min-load',
    name: 'triac of 30 mA least, load 30 mA',
    panel: acPanel(triac(), { device: acCoil({ A: 0.03 }) }),
    expected: 'ok',
  },
  {
    rule: 'output.min-load',
    name: 'triac of 30 mA least, load 29 mA',
    panel: acPanel(triac(), { device: acCoil({ A: 0.029 }) }),
    expected: 'fails',
  },
  {
    rule: 'output.min-load',
    name: 'least load unknown',
    panel: acPanel(without(triac(), 'minLoadmA')),
    expected: 'missing modules.DO.io.minLoadmA',
  },
  // 20.4 V − 0.5 V = 19.9 V without a cable length; 80 % of 24 V are 19.2 V, 83 % are 19.92 V.
  {
    rule: 'output.load-underfed',
    name: '19.9 V for 19.8 V',
    panel: outputPanel(sourcing(), { device: coil({ pickUpPct: 82.5 }), cable: cable({ lengthM: 0 }) }),
    expected: 'ok',
  },
  {
    rule: 'output.load-underfed',
    name: '19.9 V for 19.92 V',
    panel: outputPanel(sourcing(), { device: coil({ pickUpPct: 83 }), cable: cable({ lengthM: 0 }) }),
    expected: 'fails',
  },
  // 1.5 mm² class 5 over 50 m at 70 °C: 13.3 × 1.1965 × 2 × 0.05 = 1.591 Ω; 0.5 A keep 0.796 V of 19.9 V.
  {
    rule: 'output.load-underfed',
    name: '50 m of 1.5 mm² leave 19.10 V for 19.2 V',
    panel: outputPanel(sourcing(), {
      device: coil({ A: 0.5 }),
      cable: cable({ size: { mm2: 1.5 }, lengthM: 50 }),
    }),
    expected: 'fails',
  },
  {
    rule: 'output.load-underfed',
    name: '40 m of 1.5 mm² leave 19.26 V',
    panel: outputPanel(sourcing(), {
      device: coil({ A: 0.5 }),
      cable: cable({ size: { mm2: 1.5 }, lengthM: 40 }),
    }),
    expected: 'ok',
  },
  {
    rule: 'output.load-underfed',
    name: 'no cable stated',
    panel: noCable(outputPanel()),
    expected: 'missing points.DO.01.cable',
  },
  {
    rule: 'output.load-underfed',
    name: 'drop of the output not stated',
    panel: outputPanel(without(sourcing(), 'onDropV')),
    expected: 'missing modules.DO.io.onDropV',
  },
  {
    rule: 'output.ssr-control',
    name: 'needs 19.9 V and gets 19.89 V over 30 m',
    panel: outputPanel(sourcing(), { device: solidState({ Vmin: 19.9 }) }),
    expected: 'fails',
  },
  {
    rule: 'output.ssr-control',
    name: 'needs 19.8 V',
    panel: outputPanel(sourcing(), { device: solidState({ Vmin: 19.8 }) }),
    expected: 'ok',
  },
  {
    rule: 'output.ssr-control',
    name: 'takes 28.7 V and gets 28.8 V',
    panel: outputPanel(sourcing(), { device: solidState({ Vmax: 28.7 }) }),
    expected: 'damages',
  },
  {
    rule: 'output.ssr-control',
    name: 'DC control on AC',
    panel: acPanel(relay(), { device: solidState({ Vmax: 300 }) }),
    expected: 'damages',
  },
  {
    rule: 'output.ssr-control',
    name: 'no cable stated',
    panel: noCable(outputPanel(sourcing(), { device: solidState() })),
    expected: 'missing points.DO.01.cable',
  },
  {
    rule: 'output.ssr-heat',
    name: '5 A without a heat sink',
    panel: outputPanel(sourcing(), { device: solidState({}, { heatSink: false }, { A: 5 }) }),
    expected: 'ok',
  },
  {
    rule: 'output.ssr-heat',
    name: '6 A with a heat sink',
    panel: outputPanel(sourcing(), { device: solidState({}, {}, { A: 6 }) }),
    expected: 'ok',
  },
  {
    rule: 'output.ssr-heat',
    name: '6 A, heat sink not stated',
    panel: outputPanel(sourcing(), { device: solidState({}, { heatSink: undefined }, { A: 6 }) }),
    expected: 'doubt',
  },
  {
    rule: 'output.no-suppression',
    name: 'a heater has no spike',
    panel: outputPanel(sourcing(), { device: heater(), suppressor: { kind: 'none', at: 'load' } }),
    expected: 'nothing',
  },
];
