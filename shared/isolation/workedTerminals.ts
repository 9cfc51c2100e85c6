/** What must be dead for work on a scope: its terminals, those of its groups, and every supply that enters the panel. */
import type { Group, Panel, Point } from '../panel/panelSchema';
import { foreignSupplies } from './foreignSupplies';
import { inReadingOrder } from './inOrder';
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

interface Known {
  groups: Map<string, Group[]>;
  supplies: Set<string>;
}

function knownIn(panel: Panel): Known {
  const groups = new Map<string, Group[]>();
  for (const group of panel.groups) {
    const same = groups.get(group.tag);
    if (same) same.push(group);
    else groups.set(group.tag, [group]);
  }
  return { groups, supplies: new Set(panel.supplies.map((supply) => supply.tag)) };
}

/** Energy of unknown origin enters here: it is worked, since nobody can say what it reaches. */
function unstated(known: Known, point: Point): boolean {
  const { supplies } = known;
  const groups = known.groups.get(point.group) ?? [];
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

const sorted = (tags: Iterable<string>): string[] => inReadingOrder(new Set(tags), (tag) => tag);

/** A terminal of the device itself, however the drawing writes it: Q1:2, Q1.T1, Q1/3. */
const isOn = (device: string, terminal: string): boolean =>
  terminal.startsWith(device) && !/^[\p{L}\p{N}]/u.test(terminal.slice(device.length));

/** Supplies that must be dead for work on these groups: all that enter the panel but those left on with a guard. */
export function workedSupplies(panel: Panel, scope: readonly string[]): Set<string> {
  const left = mayStayOn(panel, new Set(pointsInScope(panel, scope).map((point) => point.group)));
  return new Set(panel.supplies.map((supply) => supply.tag).filter((tag) => !left.has(tag)));
}

/** @throws Error when the scope names an address that the panel does not have. */
export function workedTerminals(panel: Panel, scope: readonly string[]): Worked {
  const points = pointsInScope(panel, scope);
  const scopeGroups = new Set(points.map((point) => point.group));
  const left = mayStayOn(panel, scopeGroups);
  const supplies = panel.supplies.filter((supply) => !left.has(supply.tag));
  const known = knownIn(panel);
  const groups = panel.groups.filter(
    (group) => scopeGroups.has(group.tag) || group.supply === undefined || !known.supplies.has(group.supply),
  );
  const groupTags = new Set([...scopeGroups, ...groups.map((group) => group.tag)]);
  const touched = [
    ...panel.points
      .filter((point) => groupTags.has(point.group) || unstated(known, point))
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
        .filter((tag) => touched.some((terminal) => isOn(tag, terminal))),
    ),
    mayStayOn: sorted(left),
  };
}
