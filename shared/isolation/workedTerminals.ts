/** What must be dead for work on a scope: its terminals, those of its groups, and every supply that enters the panel. */
import type { Panel, Point } from '../panel/panelSchema';
import { foreignSupplies } from './foreignSupplies';
import { asRead } from './inOrder';
import { mayStayOn } from './mayStayOn';
import { pointTerminals } from './pointTerminals';
import { supplyTerminals } from './supplyTerminals';

export interface Worked {
  /** Terminal tags, in reading order. */
  terminals: string[];
  supplies: string[];
  groups: string[];
  /** Isolators whose incoming side must be dead too: a worked terminal is on the device itself. */
  incoming: string[];
  /** Supplies that may stay live with their guard. */
  mayStayOn: string[];
}

/** Energy of unknown origin enters here: it is worked, since nobody can say what it reaches. */
function unstated(panel: Panel, point: Point): boolean {
  const groups = panel.groups.filter((group) => group.tag === point.group);
  const supplies = new Set(panel.supplies.map((supply) => supply.tag));
  return (
    groups.length === 0 ||
    groups.some((group) => group.supply === undefined || !supplies.has(group.supply)) ||
    foreignSupplies(point).some((tag) => tag === null || !supplies.has(tag))
  );
}

function pointsInScope(panel: Panel, scope: readonly string[]): Point[] {
  const wanted = new Set(scope);
  const found = panel.points.filter((point) => wanted.has(point.address));
  const known = new Set(found.map((point) => point.address));
  for (const address of scope)
    if (!known.has(address)) throw new Error(`no point "${address}" in panel ${panel.tag}`);
  return found;
}

const sorted = (tags: Iterable<string>): string[] => [...new Set(tags)].sort(asRead);

/** @throws Error when the scope names an address that the panel does not have. */
export function workedTerminals(panel: Panel, scope: readonly string[]): Worked {
  const points = pointsInScope(panel, scope);
  const scopeGroups = new Set(points.map((point) => point.group));
  const left = mayStayOn(panel, scopeGroups);
  const supplies = panel.supplies.filter((supply) => !left.has(supply.tag));
  const supplyTags = new Set(panel.supplies.map((supply) => supply.tag));
  const groups = panel.groups.filter(
    (group) => scopeGroups.has(group.tag) || group.supply === undefined || !supplyTags.has(group.supply),
  );
  const groupTags = new Set([...scopeGroups, ...groups.map((group) => group.tag)]);
  const touched = [
    ...panel.points
      .filter((point) => groupTags.has(point.group) || unstated(panel, point))
      .flatMap((point) => pointTerminals(panel, point)),
    ...groups.map((group) => group.terminal),
  ];
  return {
    terminals: sorted([...touched, ...supplies.flatMap(supplyTerminals)]),
    supplies: sorted(supplies.map((supply) => supply.tag)),
    groups: sorted(groupTags),
    incoming: sorted(
      panel.isolators
        .map((isolator) => isolator.tag)
        .filter((tag) => touched.some((terminal) => terminal.startsWith(`${tag}:`))),
    ),
    mayStayOn: sorted(left),
  };
}
