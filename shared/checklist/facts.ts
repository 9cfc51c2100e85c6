/** What the step families may know: the panel, the plan and the findings, looked up and put in walking order once. */
import type { DeadTest, LockPlan, PlannedIsolator, StillLive, Wait } from '../isolation/types';
import type { Group, Module, Panel, Point, Source, Supply } from '../panel/panelSchema';
import type { Finding, StepSeed } from '../rules/finding';
import { naturalCompare } from './naturalCompare';
import { neighboursIn } from './neighbours';
import { plannedIsolators } from './plannedIsolators';
import { stayingFindings, type StayingFinding } from './stayingFindings';

export type FerruleScheme = 'DIN 46228-4' | 'German old code' | 'French code';

export interface ChecklistInput {
  panel: Panel;
  /** The panel as it may stand: this revision and the last built one together. Absent: the panel itself. */
  cabinet?: Panel;
  /** SHA-256 of the panel revision's canonical JSON. */
  panelDigest: string;
  ruleSet: string;
  /** Addresses of the points to be worked, in any order. */
  scope: readonly string[];
  /** Findings that stay: accepted ones and those that only tell. */
  findings: Finding[];
  plan: LockPlan;
  /** What stays live when only the panel's own disconnect is open. */
  stillLive: StillLive[];
  deadTests: DeadTest[];
  waits: Wait[];
  settings: { deadLimitV: number; permitAsked: boolean; ferruleScheme: FerruleScheme };
}

/** A point of the scope with what it hangs on; a draft may lack the group's supply. */
export interface PointFacts {
  point: Point;
  group: Group;
  module: Module;
  supply?: Supply;
  /** Shared by every step of the point: a checklist holds tens of thousands of steps. */
  where: { point: string; terminal: string };
  loop: { kind: 'loop'; point: string };
}

export interface IsolatorFacts extends PlannedIsolator {
  /** The non-electrical source it holds back, if it does. */
  holds?: Source;
  /** Motive isolators and other energy stay locked while points are proved. */
  restoredIn: 'close' | 'restore-motion';
}

export interface Facts extends ChecklistInput {
  cabinet: Panel;
  /** In the order of the walk: modules by slot, terminals left to right. */
  points: PointFacts[];
  /** Groups of the scope, in the same order. */
  groups: Group[];
  modules: Module[];
  /** In opening order, those of other energy last. */
  isolators: IsolatorFacts[];
  supply: (tag: string | undefined) => Supply | undefined;
  /** Every description of a supply in the cabinet: two revisions may differ. */
  described: (tag: string) => readonly Supply[];
  /** A point of the scope by its address. */
  worked: (address: string) => PointFacts | undefined;
  /** The terminals beside a terminal of a module in scope. */
  beside: (module: string, terminal: string) => string[];
  /** Dead tests at the terminals of a point. */
  testsAt: (address: string) => readonly DeadTest[];
  /** Terminals that the stage Prove dead reads by name. */
  provedDead: ReadonlySet<string>;
  /** Findings that touch the scope, in a stable order. */
  stays: StayingFinding[];
  seeds: (family: string) => (StepSeed & { finding: StayingFinding })[];
}

function inWalkingOrder(points: PointFacts[]): PointFacts[] {
  const place = new Map<string, number>();
  for (const { module } of points)
    module.terminals?.forEach((terminal, index) => place.set(`${module.tag}\u0000${terminal}`, index));
  const placeOf = ({ point, module }: PointFacts) =>
    place.get(`${module.tag}\u0000${point.terminal}`) ?? Number.MAX_SAFE_INTEGER;
  return [...points].sort(
    (a, b) =>
      naturalCompare(a.module.slot, b.module.slot) ||
      naturalCompare(a.module.tag, b.module.tag) ||
      placeOf(a) - placeOf(b) ||
      naturalCompare(a.point.terminal, b.point.terminal) ||
      naturalCompare(a.point.address, b.point.address),
  );
}

function pointsInScope({ panel, scope }: ChecklistInput): PointFacts[] {
  const wanted = new Set(scope);
  const groups = new Map(panel.groups.map((group) => [group.tag, group]));
  const modules = new Map(panel.modules.map((module) => [module.tag, module]));
  const supplies = new Map(panel.supplies.map((supply) => [supply.tag, supply]));
  return panel.points.flatMap((point) => {
    const group = groups.get(point.group);
    const module = group && modules.get(group.module);
    if (!wanted.has(point.address)) return [];
    if (!group || !module)
      throw new Error(`point ${point.address} hangs on no group and module of the panel`);
    const supply = supplies.get(group.supply ?? '');
    const where = { point: point.address, terminal: point.terminal };
    const loop = { kind: 'loop' as const, point: point.address };
    const worked = { point, group, module, where, loop };
    return [supply ? { ...worked, supply } : worked];
  });
}

/**
 * Looks everything up once.
 * @throws Error when a point of the scope names a group or module the panel does not have, or is not in the panel.
 */
export function factsOf(input: ChecklistInput): Facts {
  const points = inWalkingOrder(pointsInScope(input));
  const known = new Map(points.map((each) => [each.point.address, each]));
  const lost = input.scope.find((address) => !known.has(address));
  if (lost !== undefined) throw new Error(`point ${lost} is not in the panel`);
  const { panel, cabinet = panel } = input;
  const described = new Map<string, Supply[]>();
  for (const one of cabinet.supplies) described.set(one.tag, [...(described.get(one.tag) ?? []), one]);
  // What this revision says of a supply comes first; what only the cabinet has is not lost.
  const supplies = new Map([...cabinet.supplies, ...panel.supplies].map((supply) => [supply.tag, supply]));
  const modules = [...new Set(points.map(({ module }) => module))];
  const isolators = plannedIsolators(input);
  const stays = stayingFindings(
    input,
    isolators.map(({ isolator }) => isolator.tag),
  );
  const seeds = stays.flatMap((finding) => (finding.addsSteps ?? []).map((seed) => ({ ...seed, finding })));
  const tests = new Map<string, DeadTest[]>();
  for (const test of input.deadTests) {
    if (!('point' in test.at)) continue;
    const gathered = tests.get(test.at.point);
    if (gathered) gathered.push(test);
    else tests.set(test.at.point, [test]);
  }
  const byFamily = new Map<string, typeof seeds>();
  for (const seed of seeds) byFamily.set(seed.family, [...(byFamily.get(seed.family) ?? []), seed]);
  return {
    ...input,
    cabinet,
    points,
    groups: [...new Set(points.map(({ group }) => group))],
    modules,
    beside: neighboursIn(input.panel, modules),
    isolators,
    supply: (tag) => (tag === undefined ? undefined : supplies.get(tag)),
    worked: (address) => known.get(address),
    testsAt: (address) => tests.get(address) ?? [],
    described: (tag) => described.get(tag) ?? [],
    provedDead: new Set(input.deadTests.filter(({ at }) => !('point' in at)).map(({ terminal }) => terminal)),
    stays,
    seeds: (family) => byFamily.get(family) ?? [],
  };
}
