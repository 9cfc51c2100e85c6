/** The conductors somebody lands for a point: the listed ones, and always the one on the point's own terminal. */
import type { ConductorRole, Point } from '../../../panel/panelSchema';

export interface Conductor {
  role: ConductorRole;
  wire: string;
  terminal: string;
  colour?: string;
  /** `signal`, or `plus.2` for the second of a role: the stable part of a step's id. */
  name: string;
}

const known = new WeakMap<Point, Conductor[]>();

/** Asked for by several families of each point, so it is worked out once. */
export function conductorsOf(point: Point): readonly Conductor[] {
  const before = known.get(point);
  if (before) return before;
  const found = named(point);
  known.set(point, found);
  return found;
}

function named({ conductors = [], terminal, wire }: Point): Conductor[] {
  const own = conductors.some((each) => each.terminal === terminal)
    ? []
    : [{ role: 'signal' as const, wire, terminal }];
  const counts = new Map<string, number>();
  return [...own, ...conductors].map((each) => {
    const count = (counts.get(each.role) ?? 0) + 1;
    counts.set(each.role, count);
    return { ...each, name: count === 1 ? each.role : `${each.role}.${count}` };
  });
}
