/** Commons, neighbours, earth and fuses. */
import { acSupply, cable, dcInput, dcSupply, inputPanel } from '../inputPanel';
import { unknownSupply, without, type Case } from '../inputParts';
import { load, outputPanel, twoGroups, both, three, relays } from '../supplyParts';

export const commonCases: Case[] = [
  {
    rule: 'supply.two-on-one-common',
    name: 'one terminal, two supplies',
    panel: twoGroups({ terminal: 'X5' }, { terminal: 'X5', supply: 'S2' }, both),
    expected: 'hurts',
  },
  {
    rule: 'supply.two-on-one-common',
    name: 'one terminal, one supply',
    panel: twoGroups({ terminal: 'X5' }, { terminal: 'X5' }, both),
    expected: 'ok',
  },
  {
    rule: 'supply.two-on-one-common',
    name: 'one terminal, both poles',
    panel: twoGroups({ terminal: 'X5' }, { terminal: 'X5', common: 'positive' }, both),
    expected: 'hurts',
  },
  {
    rule: 'supply.two-on-one-common',
    name: 'two terminals',
    panel: twoGroups({}, { supply: 'S2' }, both),
    expected: 'ok',
  },
  {
    rule: 'supply.two-on-one-common',
    name: 'one terminal, one supply unknown',
    panel: unknownSupply(twoGroups({ terminal: 'X5' }, { terminal: 'X5' }, both)),
    expected: 'missing groups.G1.supply',
  },

  {
    rule: 'supply.commons-bridged',
    name: 'bridged, two supplies: said at both ends',
    panel: twoGroups({ linkedTo: ['G2'] }, { supply: 'S2' }, both),
    expected: 'hurts',
  },
  {
    rule: 'supply.commons-bridged',
    name: 'bridged, one supply',
    panel: twoGroups({ linkedTo: ['G2'] }, {}, both),
    expected: 'ok',
  },
  {
    rule: 'supply.commons-bridged',
    name: 'not bridged',
    panel: twoGroups({}, { supply: 'S2' }, both),
    expected: 'nothing',
  },
  {
    rule: 'supply.commons-bridged',
    name: 'bridged, supplies unknown',
    panel: unknownSupply(twoGroups({ linkedTo: ['G2'] }, {}, both)),
    expected: 'missing groups.G1.supply',
  },
  {
    rule: 'supply.commons-bridged',
    name: 'two phases bridged',
    panel: twoGroups({ common: 'line', phase: 'L1', linkedTo: ['G2'] }, { common: 'line', phase: 'L2' }, [
      three,
    ]),
    expected: 'hurts',
  },
  {
    rule: 'supply.commons-bridged',
    name: 'phase not stated',
    panel: twoGroups({ common: 'line', phase: 'L1', linkedTo: ['G2'] }, { common: 'line' }, [three]),
    expected: 'missing groups.G2.phase',
  },

  {
    rule: 'supply.mixed-bands',
    name: 'side by side, insulated for 229 V',
    panel: relays({ commonInsulationV: 229 }),
    expected: 'hurts',
  },
  {
    rule: 'supply.mixed-bands',
    name: 'side by side, insulated for 230 V',
    panel: relays({ commonInsulationV: 230 }),
    expected: 'ok',
  },
  {
    rule: 'supply.mixed-bands',
    name: 'side by side, insulation not stated',
    panel: relays(),
    expected: 'missing modules.RO.commonInsulationV',
  },
  {
    rule: 'supply.mixed-bands',
    name: 'order of the terminals not stated',
    panel: relays({ terminals: null, commonInsulationV: 100 }),
    expected: 'missing modules.RO.terminals',
  },
  {
    rule: 'supply.mixed-bands',
    name: 'an empty terminal between',
    panel: relays({ terminals: ['C1', '1', '-', 'C2', '2'] }),
    expected: 'ok',
  },
  {
    rule: 'supply.mixed-bands',
    name: 'both extra-low',
    panel: relays({ other: acSupply({ tag: 'S2', V: 24 }) }),
    expected: 'ok',
  },
  {
    rule: 'supply.mixed-bands',
    name: '50 V AC is extra-low, 51 V is not',
    panel: relays({ other: acSupply({ tag: 'S2', V: 51 }), commonInsulationV: 50 }),
    expected: 'hurts',
  },
  {
    rule: 'supply.mixed-bands',
    name: 'one cable, insulated for 229 V',
    panel: relays({ commonInsulationV: 300, cables: { cable: cable({ tag: 'K', insulationV: 229 }) } }),
    expected: 'hurts, ok',
  },
  {
    rule: 'supply.mixed-bands',
    name: 'one cable, insulated for 230 V',
    panel: relays({ commonInsulationV: 300, cables: { cable: cable({ tag: 'K', insulationV: 230 }) } }),
    expected: 'ok',
  },
  {
    rule: 'supply.mixed-bands',
    name: 'one cable, insulation not stated',
    panel: relays({ commonInsulationV: 300, cables: { cable: without(cable({ tag: 'K' }), 'insulationV') } }),
    expected: 'missing points.DI.01.cable.insulationV, ok',
  },
  {
    rule: 'supply.mixed-bands',
    name: 'a supply unknown',
    panel: unknownSupply(relays({ commonInsulationV: 300 })),
    expected: 'missing groups.G1.supply',
  },

  {
    rule: 'supply.unearthed-control',
    name: 'unearthed, unwatched',
    panel: inputPanel(dcInput(), {}, dcSupply({ earthed: false })),
    expected: 'doubt',
  },
  {
    rule: 'supply.unearthed-control',
    name: 'unearthed, said to be unwatched',
    panel: inputPanel(dcInput(), {}, dcSupply({ earthed: false, earthFaultMonitor: false })),
    expected: 'doubt',
  },
  {
    rule: 'supply.unearthed-control',
    name: 'unearthed with a monitor',
    panel: inputPanel(dcInput(), {}, dcSupply({ earthed: false, earthFaultMonitor: true })),
    expected: 'ok',
  },
  { rule: 'supply.unearthed-control', name: 'earthed', panel: inputPanel(), expected: 'ok' },

  {
    rule: 'group.fuse-missing',
    name: 'nothing in series',
    panel: outputPanel(without(dcSupply(), 'protectionA')),
    expected: 'damages',
  },
  { rule: 'group.fuse-missing', name: 'the supply protects', panel: outputPanel(), expected: 'ok' },
  {
    rule: 'group.fuse-missing',
    name: 'a fuse before the common',
    panel: outputPanel(without(dcSupply(), 'protectionA'), load(0.2), { fuse: { A: 2 } }),
    expected: 'ok',
  },
  {
    rule: 'group.fuse-missing',
    name: 'a fuse at every point',
    panel: outputPanel(without(dcSupply(), 'protectionA'), { ...load(0.2), fuse: { A: 1 } }),
    expected: 'ok',
  },
  {
    rule: 'group.fuse-missing',
    name: 'an input group',
    panel: inputPanel(dcInput(), {}, without(dcSupply(), 'protectionA')),
    expected: 'nothing',
  },
  {
    rule: 'group.fuse-missing',
    name: 'supply unknown',
    panel: unknownSupply(outputPanel()),
    expected: 'missing groups.G1.supply',
  },
];
