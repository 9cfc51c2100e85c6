/** Short ways to write the parts of a panel, so that a test shows only what it is about. */
import { panelSchema } from '../../../shared/panel/panelSchema';
import type { Group, Isolator, Panel, Point, Source, Supply } from '../../../shared/panel/panelSchema';

export const source = (tag: string, more: Partial<Source> = {}): Source => ({
  tag,
  kind: 'feeder',
  description: `Feeder ${tag}`,
  location: 'Pump hall',
  V: 120,
  phases: 1,
  ...more,
});

export const isolator = (tag: string, more: Partial<Isolator> = {}): Isolator => ({
  tag,
  kind: 'breaker',
  location: 'Pump hall',
  inPanel: false,
  inSight: true,
  operatedFrom: 'outside',
  opens: 'all-conductors',
  loadBreak: true,
  suitableForIsolation: true,
  purpose: 'control',
  lock: 'hasp',
  ...more,
});

/** 120 V AC, earthed, L and N, fed as given: `[from, ...through]`. */
export const supply = (tag: string, feeds: string[][], more: Partial<Supply> = {}): Supply => ({
  tag,
  description: `Supply ${tag}`,
  kind: 'ac1',
  purpose: 'field',
  V: 120,
  tolerance: { minPct: -10, maxPct: 10 },
  earthed: true,
  terminals: { L: `${tag}:L`, N: `${tag}:N` },
  feeds: feeds.map(([from = '', ...through]) => ({ from, through })),
  bulk: 'none',
  extraLow: 'none',
  ...more,
});

export const dc24 = (tag: string, feeds: string[][], more: Partial<Supply> = {}): Supply =>
  supply(tag, feeds, {
    kind: 'dc',
    V: 24,
    terminals: { plus: `${tag}:+`, minus: `${tag}:-` },
    extraLow: 'PELV',
    ...more,
  });

export const group = (tag: string, fedBy: string | undefined, more: Partial<Group> = {}): Group => ({
  tag,
  module: `M-${tag}`,
  terminal: `${tag}:C`,
  ...(fedBy === undefined ? {} : { supply: fedBy }),
  common: 'line',
  ...more,
});

export const point = (address: string, group: string, more: Partial<Point> = {}): Point => ({
  address,
  terminal: `T:${address}`,
  wire: `W${address}`,
  description: `Point ${address}`,
  group,
  device: { kind: 'contact' },
  otherSupply: 'none',
  ...more,
});

/** A panel that fits the schema, with a module for every group. */
export const panel = (parts: Partial<Panel>): Panel =>
  panelSchema.parse({
    format: 'coldloop-panel/1',
    tag: 'P1',
    name: 'Panel',
    location: 'Basement',
    drawing: { number: 'E-1', revision: 'A' },
    practice: 'IEC 60204-1',
    frequencyHz: 50,
    disconnect: null,
    earthTerminal: 'PE',
    sources: [],
    isolators: [],
    supplies: [],
    modules: [...new Set((parts.groups ?? []).map((one) => one.module))].map((tag) => ({
      tag,
      slot: tag,
      description: 'Relay outputs',
      io: { kind: 'digital-output', technology: 'relay', Vmin: 5, Vmax: 250, pointA: 2 },
    })),
    groups: [],
    points: [],
    stopControls: [],
    ...parts,
  });
