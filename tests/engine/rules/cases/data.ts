/** The data themselves: rows that contradict each other, terminals that nobody names. */
import { dcInput, inputPoint, module, panelOf } from '../inputPanel';
import { without, type Case } from '../inputParts';

const two = (more: Parameters<typeof inputPoint>[0]) =>
  panelOf({
    points: [inputPoint(), inputPoint({ address: 'DI.02', terminal: 'DI:2', wire: 'W2', ...more })],
  });
const spare = (more: Parameters<typeof inputPoint>[0] = {}) =>
  panelOf({ points: [without(inputPoint({ spare: true, ...more }), 'cable')] });

export const dataCases: Case[] = [
  { rule: 'data.duplicate-address', name: 'twice', panel: two({ address: 'DI.01' }), expected: 'doubt' },
  { rule: 'data.duplicate-address', name: 'once', panel: two({}), expected: 'ok' },
  { rule: 'data.duplicate-terminal', name: 'twice', panel: two({ terminal: 'DI:1' }), expected: 'doubt' },
  { rule: 'data.duplicate-terminal', name: 'once', panel: two({}), expected: 'ok' },
  { rule: 'data.duplicate-wire', name: 'twice', panel: two({ wire: 'W1' }), expected: 'doubt' },
  { rule: 'data.duplicate-wire', name: 'once', panel: two({}), expected: 'ok' },
  {
    rule: 'data.unused-terminal',
    name: 'one that no row names',
    panel: panelOf({ modules: [module(dcInput(), { terminals: ['DI:1', 'DI:2', 'DI:C'] })] }),
    expected: 'doubt',
  },
  { rule: 'data.unused-terminal', name: 'all named', panel: panelOf(), expected: 'ok' },
  {
    rule: 'data.unused-terminal',
    name: 'one that a conductor names',
    panel: panelOf({
      modules: [module(dcInput(), { terminals: ['DI:1', 'DI:2', 'DI:C'] })],
      points: [inputPoint({ conductors: [{ role: 'plus', wire: 'W9', terminal: 'DI:2' }] })],
    }),
    expected: 'ok',
  },
  {
    rule: 'data.unused-terminal',
    name: 'terminals not stated',
    panel: panelOf({ modules: [without(module(dcInput()), 'terminals')] }),
    expected: 'nothing',
  },
  {
    rule: 'data.spare-connected',
    name: 'with a cable',
    panel: spare({ bleeder: { ohm: 1000, W: 1 } }),
    expected: 'doubt',
  },
  {
    rule: 'data.spare-connected',
    name: 'with foreign voltage',
    panel: spare({ otherSupply: 'S2' }),
    expected: 'doubt',
  },
  {
    rule: 'data.spare-connected',
    name: 'with a named contact',
    panel: spare({ device: { kind: 'contact', tag: 'B1' } }),
    expected: 'doubt',
  },
  { rule: 'data.spare-connected', name: 'empty', panel: spare(), expected: 'ok' },
  { rule: 'data.spare-connected', name: 'not spare', panel: panelOf(), expected: 'nothing' },
];
