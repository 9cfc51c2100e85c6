/** Conductors, their colours, screens and fuses. */
import type { Cable, Fuse } from '../../../../shared/panel/device';
import type { Panel, Point } from '../../../../shared/panel/panelSchema';
import { cable, dcSupply } from '../inputPanel';
import { noCable, unknownSupply, without, type Case } from '../inputParts';
import { acPanel, coil, heater, outputPanel, relay, solidState, sourcing } from '../outputParts';

const laid = (more: Partial<Cable> = {}) => cable({ grouped: 1, cores: 2, ...more });
const onRelay = (A: number, cableOf: Cable, more: Partial<Panel> = {}) =>
  outputPanel(relay({ pointA: 20, groupA: 20 }), { device: heater({ A }), cable: cableOf }, { more });
/** 0.75 mm², B2, 40 °C: 8.5 A (IEC 60204-1 Table 6, from memory). */
const fused = (
  fuse: Fuse,
  cableOf = laid(),
  more: Partial<Panel> = {},
  io = relay({ groupA: 40, pointA: 40 }),
) =>
  outputPanel(
    io,
    { device: heater({ A: 0.1 }), cable: cableOf },
    { group: { fuse }, supply: dcSupply({ protectionA: 63 }), more },
  );
const nfpa = { practice: 'NFPA 79' } as const;
const awg18 = laid({ size: { awg: 18 } });
type Conductors = NonNullable<Point['conductors']>;
const coloured = (signal: string, minus = 'BU'): { conductors: Conductors } => ({
  conductors: [
    { role: 'signal', wire: 'W1', colour: signal, terminal: 'DO:1' },
    { role: 'minus', wire: 'W1-', colour: minus, terminal: 'X3:1' },
  ],
});
const single = laid({ cores: 1 });
const noFuse = (panel: Panel): Panel => ({
  ...panel,
  supplies: panel.supplies.map((one) => without(one, 'protectionA')),
  groups: panel.groups.map((one) => without(one, 'fuse')),
});

export const conductorCases: Case[] = [
  // 13.1 A: 1.5 mm², B2, 40 °C (IEC 60204-1 Table 6; IEC 60364-5-52 gives 13 A, reference §13 row 11).
  {
    rule: 'wire.too-small',
    name: '13.1 A on 1.5 mm²',
    panel: onRelay(13.1, laid({ size: { mm2: 1.5 } })),
    expected: 'ok',
  },
  {
    rule: 'wire.too-small',
    name: '13.2 A on 1.5 mm²',
    panel: onRelay(13.2, laid({ size: { mm2: 1.5 } })),
    expected: 'damages',
  },
  // NEC 240.4(D): 18 AWG carries 5.6 A of continuous load (reference §13 row 10).
  { rule: 'wire.too-small', name: 'NFPA: 5.6 A on 18 AWG', panel: onRelay(5.6, awg18, nfpa), expected: 'ok' },
  {
    rule: 'wire.too-small',
    name: 'NFPA: 5.7 A on 18 AWG',
    panel: onRelay(5.7, awg18, nfpa),
    expected: 'damages',
  },
  {
    rule: 'wire.too-small',
    name: '8 A on 1.5 mm², bunched with nobody knows how many',
    panel: onRelay(8, without(laid({ size: { mm2: 1.5 } }), 'grouped')),
    expected: 'missing points.DO.01.cable.grouped',
  },
  {
    rule: 'wire.too-small',
    name: 'no cable stated',
    panel: noCable(outputPanel()),
    expected: 'missing points.DO.01.cable',
  },
  // I₂ = 1.9 × 6 A = 11.4 A against 1.45 × 8.5 A = 12.3 A; 1.9 × 8 A = 15.2 A (IEC 60364-4-43, factors from memory).
  { rule: 'fuse.too-big', name: 'gG 6 A on 0.75 mm²', panel: fused({ A: 6, kind: 'gG' }), expected: 'ok' },
  {
    rule: 'fuse.too-big',
    name: 'gG 8 A on 0.75 mm²',
    panel: fused({ A: 8, kind: 'gG' }),
    expected: 'damages',
  },
  {
    rule: 'fuse.too-big',
    name: 'breaker 8 A on 0.75 mm²',
    panel: fused({ A: 8, kind: 'breaker' }),
    expected: 'ok',
  },
  {
    rule: 'fuse.too-big',
    name: 'kind not stated, 8 A on 0.75 mm²',
    panel: fused({ A: 8 }),
    expected: 'missing groups.G1.fuse.kind',
  },
  {
    rule: 'fuse.too-big',
    name: 'no cable stated',
    panel: noCable(fused({ A: 6, kind: 'gG' })),
    expected: 'missing points.DO.01.cable',
  },
  // NEC 240.4(D): 18 AWG by 7 A at most.
  {
    rule: 'fuse.too-big',
    name: 'NFPA: 7 A on 18 AWG',
    panel: fused({ A: 7, kind: 'gG' }, awg18, nfpa),
    expected: 'ok',
  },
  {
    rule: 'fuse.too-big',
    name: 'NFPA: 8 A on 18 AWG',
    panel: fused({ A: 8, kind: 'gG' }, awg18, nfpa),
    expected: 'damages',
  },
  {
    rule: 'fuse.too-big',
    name: 'group fuse 5 A on a common of 4 A',
    panel: fused({ A: 5, kind: 'gG' }, laid(), {}, sourcing()),
    expected: 'damages',
  },
  {
    rule: 'fuse.too-big',
    name: 'limit of the common not stated',
    panel: fused({ A: 5, kind: 'gG' }, laid(), {}, without(sourcing(), 'groupA')),
    expected: 'missing modules.DO.io.groupA',
  },
  {
    rule: 'fuse.too-big',
    name: 'point fuse 1 A on an output of 0.5 A',
    panel: outputPanel(sourcing(), { fuse: { A: 1, kind: 'gG' }, cable: laid() }),
    expected: 'damages',
  },
  {
    rule: 'fuse.too-big',
    name: 'point fuse 0.5 A on an output of 0.5 A',
    panel: outputPanel(sourcing(), { fuse: { A: 0.5, kind: 'gG' }, cable: laid() }),
    expected: 'ok',
  },
  // 1.25 × 0.4 A = 0.5 A (NEC 210.20).
  {
    rule: 'fuse.too-small',
    name: 'point fuse 0.5 A for 0.4 A',
    panel: outputPanel(sourcing(), { fuse: { A: 0.5, kind: 'gG' }, device: coil({ A: 0.4 }) }),
    expected: 'ok',
  },
  {
    rule: 'fuse.too-small',
    name: 'point fuse 0.5 A for 0.41 A',
    panel: outputPanel(sourcing(), { fuse: { A: 0.5, kind: 'gG' }, device: coil({ A: 0.41 }) }),
    expected: 'fails',
  },
  {
    rule: 'fuse.too-small',
    name: 'group fuse 1 A before a point fuse of 0.8 A',
    panel: outputPanel(
      sourcing(),
      { fuse: { A: 0.8, kind: 'gG' } },
      { group: { fuse: { A: 1, kind: 'gG' } } },
    ),
    expected: 'fails',
  },
  {
    rule: 'fuse.too-small',
    name: 'quick fuse for a lamp that draws 1 A',
    panel: outputPanel(sourcing(), {
      fuse: { A: 0.5, kind: 'miniature-F' },
      device: coil({ load: 'lamp', A: 0.1, inrushA: 1 }),
    }),
    expected: 'fails',
  },
  {
    rule: 'fuse.too-small',
    name: 'kind of the fuse not stated for the same lamp',
    panel: outputPanel(sourcing(), { fuse: { A: 0.5 }, device: coil({ load: 'lamp', A: 0.1, inrushA: 1 }) }),
    expected: 'missing points.DO.01.fuse.kind',
  },
  {
    rule: 'fuse.too-small',
    name: 'nobody says what it drives',
    panel: outputPanel(sourcing(), { device: { kind: 'contact', tag: 'S9' } }),
    expected: 'missing points.DO.01.device.A',
  },
  {
    rule: 'fuse.missing',
    name: 'transistor with none in series',
    panel: noFuse(outputPanel()),
    expected: 'damages',
  },
  { rule: 'fuse.missing', name: 'transistor behind a group fuse', panel: outputPanel(), expected: 'ok' },
  {
    rule: 'fuse.missing',
    name: 'relay contact with another supply that nothing protects',
    panel: noFuse(outputPanel(relay(), { otherSupply: 'S2' })),
    expected: 'damages',
  },
  {
    rule: 'fuse.missing',
    name: 'load of a solid-state relay that nothing protects',
    panel: noFuse(outputPanel(sourcing(), { device: solidState(), fuse: { A: 0.5 } })),
    expected: 'damages',
  },
  {
    rule: 'fuse.missing',
    name: 'nobody says whether another supply reaches it',
    panel: outputPanel(relay(), { otherSupply: undefined }),
    expected: 'missing points.DO.01.otherSupply',
  },
  // 0.75 mm² class 5 at 70 °C: 26 × 1.1965 = 31.1 Ω/km; 5 % of 24 V are 1.2 V: at 0.5 A 38.57 m.
  {
    rule: 'wire.drop',
    name: '38.5 m keep 1.198 V',
    panel: onRelay(0.5, laid({ lengthM: 38.5 })),
    expected: 'ok',
  },
  {
    rule: 'wire.drop',
    name: '38.7 m keep 1.204 V',
    panel: onRelay(0.5, laid({ lengthM: 38.7 })),
    expected: 'fails',
  },
  {
    rule: 'wire.drop',
    name: 'no cable stated',
    panel: noCable(onRelay(0.5, laid())),
    expected: 'missing points.DO.01.cable',
  },
  // IEC 60204-1 13.2.2: green-and-yellow is for the protective conductor alone.
  {
    rule: 'wire.colour',
    name: 'green-and-yellow on the signal',
    panel: outputPanel(sourcing(), coloured('GN/YE')),
    expected: 'hurts',
  },
  {
    rule: 'wire.colour',
    name: 'the same in words',
    panel: outputPanel(sourcing(), coloured('green-yellow')),
    expected: 'hurts',
  },
  {
    rule: 'wire.colour',
    name: 'NFPA 79: plain green',
    panel: outputPanel(sourcing(), coloured('GN', 'BUWH'), { more: nfpa }),
    expected: 'hurts',
  },
  {
    rule: 'wire.colour',
    name: 'blue on DC control',
    panel: outputPanel(sourcing(), { ...coloured('BU'), cable: single }),
    expected: 'ok',
  },
  {
    rule: 'wire.colour',
    name: 'red on DC control',
    panel: outputPanel(sourcing(), { ...coloured('RD'), cable: single }),
    expected: 'doubt',
  },
  {
    rule: 'wire.colour',
    name: 'red on AC control',
    panel: acPanel(relay(), { conductors: coloured('RD').conductors.slice(0, 1), cable: single }),
    expected: 'ok',
  },
  {
    rule: 'wire.colour',
    name: 'colour not stated',
    panel: outputPanel(sourcing(), { conductors: [{ role: 'signal', wire: 'W1', terminal: 'DO:1' }] }),
    expected: 'missing points.DO.01.conductors.W1.colour',
  },
  {
    rule: 'wire.colour',
    name: 'conductors not stated',
    panel: outputPanel(sourcing(), { conductors: undefined }),
    expected: 'missing points.DO.01.conductors',
  },
  {
    rule: 'wire.colour',
    name: 'three-core cable with a green-and-yellow core, three live conductors',
    panel: outputPanel(sourcing(), {
      conductors: [
        ...coloured('BN').conductors,
        { role: 'plus', wire: 'W1+', colour: 'BK', terminal: 'X2:1' },
      ],
      cable: laid({ cores: 3, colours: ['BN', 'BU', 'GNYE'] }),
    }),
    expected: 'hurts',
  },
  {
    rule: 'wire.colour',
    name: 'the same cable with two live conductors',
    panel: outputPanel(sourcing(), {
      ...coloured('BN'),
      cable: laid({ cores: 3, colours: ['BN', 'BU', 'GNYE'] }),
    }),
    expected: 'ok',
  },
  {
    rule: 'wire.size-terminal',
    name: '2.5 mm² in 0.2 to 2.5 mm²',
    panel: outputPanel(sourcing(), { cable: laid({ size: { mm2: 2.5 } }) }),
    expected: 'ok',
  },
  {
    rule: 'wire.size-terminal',
    name: '4 mm² in 0.2 to 2.5 mm²',
    panel: outputPanel(sourcing(), { cable: laid({ size: { mm2: 4 } }) }),
    expected: 'doubt',
  },
  // 14 AWG are 2.08 mm², 12 AWG 3.31 mm² (ASTM B258).
  {
    rule: 'wire.size-terminal',
    name: '12 AWG in 0.2 to 2.5 mm²',
    panel: outputPanel(sourcing(), { cable: laid({ size: { awg: 12 } }) }),
    expected: 'doubt',
  },
  {
    rule: 'wire.size-terminal',
    name: '14 AWG in 0.2 to 2.5 mm²',
    panel: outputPanel(sourcing(), { cable: laid({ size: { awg: 14 } }) }),
    expected: 'ok',
  },
  {
    rule: 'wire.size-terminal',
    name: 'range not stated',
    panel: { ...outputPanel(), modules: outputPanel().modules.map((one) => without(one, 'terminalRange')) },
    expected: 'missing modules.DO.terminalRange',
  },
  {
    rule: 'wire.screen',
    name: 'earthed nowhere',
    panel: outputPanel(sourcing(), { cable: laid({ screened: true, screenEarthed: 'none' }) }),
    expected: 'fails',
  },
  {
    rule: 'wire.screen',
    name: 'earthed at the panel',
    panel: outputPanel(sourcing(), { cable: laid({ screened: true, screenEarthed: 'panel' }) }),
    expected: 'ok',
  },
  {
    rule: 'wire.screen',
    name: 'not stated',
    panel: outputPanel(sourcing(), { cable: laid({ screened: true }) }),
    expected: 'missing points.DO.01.cable.screenEarthed',
  },
  {
    rule: 'fuse.too-big',
    name: 'supply unknown',
    panel: unknownSupply(outputPanel()),
    expected: 'missing groups.G1.supply',
  },
];
