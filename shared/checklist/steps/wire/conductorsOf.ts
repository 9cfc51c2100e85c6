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

export function conductorsOf({ conductors = [], terminal, wire }: Point): Conductor[] {
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
