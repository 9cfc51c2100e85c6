/** Inputs on the wrong pole, the wrong current, the wrong way round. */
import { acInput, acSupply, dcInput, dcSupply, group, inputPanel, inputPoint, panelOf } from '../inputPanel';
import { three, npn, pnp, acTwoWire, without, unknownSupply, bare, type Case } from '../inputParts';

export const poleCases: Case[] = [
  // Which pole the common is on (IEC 60947-5-2: NPN switches 0 V, PNP switches plus).
  {
    rule: 'input.npn-on-sinking',
    name: 'NPN, common at 0 V',
    panel: inputPanel(bare, { device: npn }),
    expected: 'fails',
  },
  {
    rule: 'input.npn-on-sinking',
    name: 'NPN, common at plus',
    panel: inputPanel(bare, { device: npn }, dcSupply(), 'positive'),
    expected: 'ok',
  },
  {
    rule: 'input.npn-on-sinking',
    name: 'NPN in parallel',
    panel: inputPanel(bare, { parallel: [npn] }),
    expected: 'fails',
  },
  {
    rule: 'input.npn-on-sinking',
    name: 'supply unknown',
    panel: unknownSupply(inputPanel(bare, { device: npn })),
    expected: 'missing groups.G1.supply',
  },
  {
    rule: 'input.pnp-on-sourcing',
    name: 'PNP, common at plus',
    panel: inputPanel(bare, { device: pnp }, dcSupply(), 'positive'),
    expected: 'fails',
  },
  {
    rule: 'input.pnp-on-sourcing',
    name: 'PNP, common at 0 V',
    panel: inputPanel(bare, { device: pnp }),
    expected: 'ok',
  },
  {
    rule: 'input.pnp-on-sourcing',
    name: 'supply unknown',
    panel: unknownSupply(inputPanel(bare, { device: pnp })),
    expected: 'missing groups.G1.supply',
  },
  ...(['positive', 'negative'] as const).flatMap((common): Case[] =>
    (['input.npn-on-sinking', 'input.pnp-on-sourcing'] as const).flatMap((rule) => [
      {
        rule,
        name: `a contact suits a common at ${common}`,
        panel: inputPanel(bare, {}, dcSupply(), common),
        expected: 'nothing',
      },
      {
        rule,
        name: `push-pull suits a common at ${common}`,
        panel: inputPanel(bare, { device: { kind: 'push-pull', ...three } }, dcSupply(), common),
        expected: 'nothing',
      },
    ]),
  ),
  {
    rule: 'input.mixed-on-common',
    name: 'one of each',
    panel: panelOf({ points: [inputPoint({ device: npn }), inputPoint({ address: 'DI.02', device: pnp })] }),
    expected: 'fails',
  },
  {
    rule: 'input.mixed-on-common',
    name: 'two of one kind',
    panel: panelOf({ points: [inputPoint({ device: pnp }), inputPoint({ address: 'DI.02', device: pnp })] }),
    expected: 'ok',
  },
  {
    rule: 'input.mixed-on-common',
    name: 'each on a common of its own',
    panel: panelOf({
      groups: [group(), group({ tag: 'G2', terminal: 'DI:C2', common: 'positive' })],
      points: [inputPoint({ device: pnp }), inputPoint({ address: 'DI.02', group: 'G2', device: npn })],
    }),
    expected: 'ok',
  },
  // One LED only.
  {
    rule: 'input.led-reversed',
    name: 'current into the terminal, common at plus, stands 40 V backwards',
    panel: inputPanel(dcInput({ polarity: 'positive-only' }), {}, dcSupply(), 'positive'),
    expected: 'fails',
  },
  {
    rule: 'input.led-reversed',
    name: 'stands 28.7 V backwards, gets 28.8 V',
    panel: inputPanel(dcInput({ polarity: 'positive-only', reverseV: 28.7 }), {}, dcSupply(), 'positive'),
    expected: 'damages',
  },
  {
    rule: 'input.led-reversed',
    name: 'stands 28.8 V backwards',
    panel: inputPanel(dcInput({ polarity: 'positive-only', reverseV: 28.8 }), {}, dcSupply(), 'positive'),
    expected: 'fails',
  },
  {
    rule: 'input.led-reversed',
    name: 'reverse volts not stated: fails, and nobody knows whether it breaks',
    panel: inputPanel(
      without(dcInput({ polarity: 'positive-only' }), 'reverseV'),
      {},
      dcSupply(),
      'positive',
    ),
    expected: 'fails, missing modules.DI.io.reverseV',
  },
  {
    rule: 'input.led-reversed',
    name: 'the right way round',
    panel: inputPanel(dcInput({ polarity: 'positive-only' })),
    expected: 'ok',
  },
  {
    rule: 'input.led-reversed',
    name: 'behind a bridge',
    panel: inputPanel(dcInput({ polarity: 'positive-only', bridge: true }), {}, dcSupply(), 'positive'),
    expected: 'ok',
  },
  {
    rule: 'input.namur',
    name: 'NAMUR on a plain input',
    panel: inputPanel(bare, { device: { kind: 'namur' } }),
    expected: 'fails',
  },
  { rule: 'input.namur', name: 'a contact', panel: inputPanel(), expected: 'nothing' },
  {
    rule: 'input.namur',
    name: 'supply unknown',
    panel: unknownSupply(inputPanel(bare, { device: { kind: 'namur' } })),
    expected: 'missing groups.G1.supply',
  },
  {
    rule: 'input.dc-sensor-on-ac',
    name: 'PNP on 230 V AC',
    panel: inputPanel(acInput(), { device: pnp }, acSupply()),
    expected: 'damages',
  },
  {
    rule: 'input.dc-sensor-on-ac',
    name: 'PNP on DC',
    panel: inputPanel(bare, { device: pnp }),
    expected: 'ok',
  },
  {
    rule: 'input.dc-sensor-on-ac',
    name: 'supply unknown',
    panel: unknownSupply(inputPanel(bare, { device: pnp })),
    expected: 'missing groups.G1.supply',
  },
  {
    rule: 'input.ac-sensor-on-dc',
    name: 'AC two-wire on DC',
    panel: inputPanel(bare, { device: acTwoWire() }),
    expected: 'damages',
  },
  {
    rule: 'input.ac-sensor-on-dc',
    name: 'AC two-wire on AC',
    panel: inputPanel(acInput(), { device: acTwoWire() }, acSupply()),
    expected: 'ok',
  },
  {
    rule: 'input.ac-sensor-on-dc',
    name: 'supply unknown',
    panel: unknownSupply(inputPanel(bare, { device: acTwoWire() })),
    expected: 'missing groups.G1.supply',
  },
];
