/** Outputs, pairs of groups and relay modules for the tables of the supply rules. */
import type { DigitalOutput } from '../../../shared/panel/moduleIo';
import type { Group, Panel, Point, Supply } from '../../../shared/panel/panelSchema';
import { acSupply, cable, dcInput, dcSupply, group, inputPoint, module, panelOf } from './inputPanel';
import { without } from './inputParts';

export const output = (more: Partial<DigitalOutput> = {}): DigitalOutput => ({
  kind: 'digital-output',
  technology: 'sourcing',
  Vmin: 19,
  Vmax: 30,
  pointA: 0.5,
  ...more,
});
export const load = (A: number): Partial<Point> => ({
  device: { kind: 'load', load: 'lamp', V: 24, current: 'dc', A, polarised: false },
});
export const outputPanel = (
  supply: Supply = dcSupply(),
  point: Partial<Point> = load(0.2),
  more: Partial<Group> = {},
): Panel =>
  panelOf({
    supplies: [supply],
    modules: [module(output())],
    groups: [group({ common: 'positive', ...more })],
    points: [inputPoint(point)],
  });

/** Two groups with a point each, on two modules unless said otherwise. */
export const twoGroups = (first: Partial<Group>, second: Partial<Group>, supplies: Supply[]): Panel =>
  panelOf({
    supplies,
    modules: [module(dcInput()), module(dcInput(), { tag: 'DJ', terminals: ['DJ:1', 'DJ:C'] })],
    groups: [group(first), group({ tag: 'G2', module: 'DJ', terminal: 'DJ:C', ...second })],
    points: [inputPoint(), inputPoint({ address: 'DJ.01', terminal: 'DJ:1', wire: 'W2', group: 'G2' })],
  });
export const second = dcSupply({ tag: 'S2' });
export const both = [dcSupply(), second];
export const three = acSupply({
  kind: 'ac3',
  V: 400,
  terminals: { L1: 'X:1', L2: 'X:2', L3: 'X:3', N: 'X:N' },
});

/** A relay module with a 24 V and a 230 V common beside each other. */
export const relays = (
  more: {
    commonInsulationV?: number;
    terminals?: string[] | null;
    cables?: Partial<Point>;
    other?: Supply;
  } = {},
): Panel => {
  const {
    commonInsulationV,
    terminals = ['C1', '1', 'C2', '2'],
    cables = {},
    other = acSupply({ tag: 'S2' }),
  } = more;
  const relay = module(output({ technology: 'relay', Vmin: 0, Vmax: 250 }), {
    tag: 'RO',
    ...(commonInsulationV !== undefined && { commonInsulationV }),
  });
  return panelOf({
    supplies: [dcSupply(), other],
    modules: [terminals ? { ...relay, terminals } : without(relay, 'terminals')],
    groups: [
      group({ module: 'RO', terminal: 'C1', common: 'positive' }),
      group({ tag: 'G2', module: 'RO', terminal: 'C2', supply: 'S2', common: 'line' }),
    ],
    points: [
      inputPoint({ terminal: '1', ...load(0.2), cable: cable({ tag: 'K1' }), ...cables }),
      inputPoint({
        address: 'RO.02',
        terminal: '2',
        group: 'G2',
        wire: 'W2',
        ...load(0.2),
        cable: cable({ tag: 'K2' }),
        ...cables,
      }),
    ],
  });
};
