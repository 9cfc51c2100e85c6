/** A panel of any number of points, like the big remote-I/O panels of a plant: the same for the same number. */
import {
  coil24,
  contact,
  diode,
  innerBreaker,
  input24,
  inputPoint,
  isolator,
  mains,
  onDc,
  output24,
  outputPoint,
  pnp,
  regulated,
  terminalRange,
} from '../../server/commands/demo/panelParts';
import { panelSchema, type Panel, type Point } from '../../shared/panel/panelSchema';

const perCard = 16;
const cardsPerSupply = 8;

const many = <T>(count: number, make: (index: number) => T): T[] =>
  Array.from({ length: count }, (_, index) => make(index));

/** Three cards in four are inputs, as is usual; every second input is a three-wire sensor. */
const isOutput = (card: number): boolean => card % 4 === 3;
const module = (card: number): string => `IO${card + 1}`;
const feeding = (card: number): string => `S24-${Math.floor(card / cardsPerSupply) + 1}`;

function pointOf(card: number, number: number): Point {
  const place = `Bay ${card + 1}`;
  const name = `${card + 1}-${number}`;
  const wired = {
    module: module(card),
    number,
    group: `G${card + 1}`,
    lengthM: 10 + ((card * 7 + number) % 60),
  };
  return isOutput(card)
    ? outputPoint(
        { ...wired, description: `Valve ${name}`, device: coil24(`Y${name}`, place, 'solenoid', 0.2) },
        onDc,
        {
          suppressor: diode,
        },
      )
    : inputPoint({
        ...wired,
        description: `Limit switch ${name}`,
        device: number % 2 === 0 ? pnp(`B${name}`, place) : contact(`S${name}`, place),
      });
}

function cards(count: number): Pick<Panel, 'modules' | 'groups' | 'points'> {
  const every = many(count, (card) => card);
  return {
    modules: every.map((card) => ({
      tag: module(card),
      slot: `${card + 1}`,
      description: isOutput(card) ? '16 outputs' : '16 inputs',
      pluggable: true,
      terminals: [...many(perCard, (index) => `${module(card)}:${index + 1}`), `${module(card)}:C`],
      terminalRange,
      io: isOutput(card) ? output24 : input24,
    })),
    groups: every.map((card) => ({
      tag: `G${card + 1}`,
      module: module(card),
      terminal: `${module(card)}:C`,
      supply: feeding(card),
      common: isOutput(card) ? ('positive' as const) : ('negative' as const),
      ...(isOutput(card) ? { fuse: { tag: `FU${card + 1}`, A: 4 } } : {}),
    })),
    points: every.flatMap((card) => many(perCard, (index) => pointOf(card, index + 1))),
  };
}

/** A panel of about `points` points (whole cards of 16), with one 24 V supply for eight cards and two feeders. */
export function generatedPanel(points: number): Panel {
  const count = Math.ceil(points / perCard);
  const supplies = Math.ceil(count / cardsPerSupply);
  return panelSchema.parse({
    format: 'coldloop-panel/1',
    tag: 'HQ-BIG',
    name: 'Generated panel',
    location: 'Bench',
    drawing: { number: 'E-900', revision: 'A' },
    practice: 'IEC 60204-1',
    frequencyHz: 50,
    ambientC: 40,
    wiringMethod: 'B2',
    disconnect: 'Q1',
    earthTerminal: 'PE',
    sources: [1, 2].map((n) => ({
      tag: `IN${n}`,
      kind: 'feeder',
      description: `Feeder ${n}`,
      location: 'Pump hall',
      V: 230,
      phases: 1,
    })),
    isolators: [
      isolator('Q1', { kind: 'disconnect', location: 'Door', inPanel: true }),
      isolator('Q2', { kind: 'disconnect', location: 'Side wall' }),
      ...many(supplies, (n) => innerBreaker(`F${n + 1}`, 'Top rail')),
    ],
    supplies: [
      ...[1, 2].map((n) => ({
        tag: `S230-${n}`,
        description: `230 V from feeder ${n}`,
        kind: 'ac1',
        purpose: 'logic',
        V: 230,
        tolerance: mains,
        earthed: true,
        terminals: { L: `X1:${2 * n - 1}`, N: `X1:${2 * n}` },
        feeds: [{ from: `IN${n}`, through: [`Q${n}`] }],
        ratedA: 63,
        otherLoadA: 1,
        protectionA: 16,
        bulk: 'none',
        extraLow: 'none',
      })),
      ...many(supplies, (n) => ({
        tag: `S24-${n + 1}`,
        description: '24 V DC field supply',
        kind: 'dc',
        purpose: 'field',
        V: 24,
        tolerance: regulated,
        earthed: true,
        earthFaultMonitor: false,
        terminals: { plus: `X2:${n + 1}+`, minus: `X2:${n + 1}-` },
        // Every third one has both feeders.
        feeds: [
          { from: `S230-${(n % 2) + 1}`, through: [`F${n + 1}`] },
          ...(n % 3 === 0 ? [{ from: `S230-${((n + 1) % 2) + 1}`, through: [`F${n + 1}`] }] : []),
        ],
        ratedA: 20,
        otherLoadA: 0.5,
        protectionA: 4,
        bulk: { uF: 2200, bleedOhm: 1000 },
        extraLow: 'PELV',
      })),
    ],
    ...cards(count),
    stopControls: [],
  });
}
