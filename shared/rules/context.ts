/** The panel, indexed once, so that a rule finds the group, module and supply of a place without searching. */
import type { Group, Module, Panel, Point, Supply } from '../panel/panelSchema';
import { groupVolts, supplyVolts, type Volts } from './volts';

export interface PointPlace {
  where: { point: string };
  /** Tag-based path of this point in the panel file. */
  path: string;
  point: Point;
  group?: GroupPlace;
  /** What the terminal can be fed with; absent when the group's supply is unknown. */
  volts?: Volts;
  supply?: Supply;
  module?: Module;
}
export interface GroupPlace {
  where: { group: string };
  path: string;
  group: Group;
  module?: Module;
  supply?: Supply;
  volts?: Volts;
  points: PointPlace[];
}
export interface ModulePlace {
  where: { module: string };
  path: string;
  module: Module;
  groups: GroupPlace[];
}
export interface SupplyPlace {
  where: { supply: string };
  path: string;
  supply: Supply;
  volts: Volts;
  groups: GroupPlace[];
  /** Points whose solid-state relay switches a load on this supply. */
  relayLoads: PointPlace[];
}
export interface RuleContext {
  panel: Panel;
  supplies: Map<string, SupplyPlace>;
  modules: Map<string, ModulePlace>;
  groups: Map<string, GroupPlace>;
  /** Every place once, duplicates of a tag included. */
  places: { point: PointPlace[]; group: GroupPlace[]; module: ModulePlace[]; supply: SupplyPlace[] };
  pointsByAddress: Map<string, PointPlace[]>;
  pointsByTerminal: Map<string, PointPlace[]>;
  pointsByWire: Map<string, PointPlace[]>;
  pointsByCable: Map<string, PointPlace[]>;
  groupsByTerminal: Map<string, GroupPlace[]>;
}

function gather<T>(items: T[], keyOf: (item: T) => string | undefined): Map<string, T[]> {
  const gathered = new Map<string, T[]>();
  for (const item of items) {
    const key = keyOf(item);
    if (key === undefined) continue;
    const known = gathered.get(key);
    if (known) known.push(item);
    else gathered.set(key, [item]);
  }
  return gathered;
}

/** The first of each tag: a draft may hold a tag twice. */
function firstOf<T>(items: T[], tagOf: (item: T) => string): Map<string, T> {
  const first = new Map<string, T>();
  for (const item of items) if (!first.has(tagOf(item))) first.set(tagOf(item), item);
  return first;
}

const supplyPlace = (supply: Supply): SupplyPlace => ({
  where: { supply: supply.tag },
  path: `supplies.${supply.tag}`,
  supply,
  volts: supplyVolts(supply),
  groups: [],
  relayLoads: [],
});
const modulePlace = (module: Module): ModulePlace => ({
  where: { module: module.tag },
  path: `modules.${module.tag}`,
  module,
  groups: [],
});

function groupPlace(
  group: Group,
  modules: Map<string, ModulePlace>,
  supplies: Map<string, SupplyPlace>,
): GroupPlace {
  const module = modules.get(group.module);
  const supply = group.supply === undefined ? undefined : supplies.get(group.supply);
  const place: GroupPlace = {
    where: { group: group.tag },
    path: `groups.${group.tag}`,
    group,
    points: [],
    ...(module && { module: module.module }),
    ...(supply && { supply: supply.supply, volts: groupVolts(supply.supply, group) }),
  };
  module?.groups.push(place);
  supply?.groups.push(place);
  return place;
}

function pointPlace(
  point: Point,
  groups: Map<string, GroupPlace>,
  supplies: Map<string, SupplyPlace>,
): PointPlace {
  const group = groups.get(point.group);
  const place: PointPlace = {
    where: { point: point.address },
    path: `points.${point.address}`,
    point,
    ...(group && { group }),
    ...(group?.module && { module: group.module }),
    ...(group?.supply && { supply: group.supply }),
    ...(group?.volts && { volts: group.volts }),
  };
  group?.points.push(place);
  if (point.device.kind === 'ssr-control') supplies.get(point.device.load.supply)?.relayLoads.push(place);
  return place;
}

/** Indexes a panel in one walk over each list. Broken references leave the field of the place absent. */
export function ruleContext(panel: Panel): RuleContext {
  const supply = panel.supplies.map(supplyPlace);
  const module = panel.modules.map(modulePlace);
  const supplies = firstOf(supply, (place) => place.supply.tag);
  const modules = firstOf(module, (place) => place.module.tag);
  const group = panel.groups.map((one) => groupPlace(one, modules, supplies));
  const groups = firstOf(group, (place) => place.group.tag);
  const point = panel.points.map((one) => pointPlace(one, groups, supplies));
  return {
    panel,
    supplies,
    modules,
    groups,
    places: { point, group, module, supply },
    pointsByAddress: gather(point, (place) => place.point.address),
    pointsByTerminal: gather(point, (place) => place.point.terminal),
    pointsByWire: gather(point, (place) => place.point.wire),
    pointsByCable: gather(point, (place) => place.point.cable?.tag),
    groupsByTerminal: gather(group, (place) => place.group.terminal),
  };
}
