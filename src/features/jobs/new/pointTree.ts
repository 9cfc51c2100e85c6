import type { Panel, Point } from '../../../../shared/panel/panelSchema';

export interface GroupBranch {
  tag: string;
  supply: string | undefined;
  points: Point[];
}
export interface ModuleBranch {
  tag: string;
  description: string;
  groups: GroupBranch[];
  points: Point[];
}

const matches = (point: Point, filter: string) =>
  `${point.address} ${point.terminal} ${point.wire} ${point.cable?.tag ?? ''} ${point.description}`
    .toLowerCase()
    .includes(filter);

/** The points that match the filter under their groups and modules, in the panel's order; empty branches fall away. */
export function pointTree(panel: Panel, filter: string): ModuleBranch[] {
  const wanted = filter.trim().toLowerCase();
  const byGroup = new Map<string, Point[]>();
  for (const point of panel.points) {
    if (wanted && !matches(point, wanted)) continue;
    const known = byGroup.get(point.group);
    if (known) known.push(point);
    else byGroup.set(point.group, [point]);
  }
  return panel.modules.flatMap((module) => {
    const groups = panel.groups
      .filter((group) => group.module === module.tag && byGroup.has(group.tag))
      .map((group) => ({ tag: group.tag, supply: group.supply, points: byGroup.get(group.tag) ?? [] }));
    if (groups.length === 0) return [];
    const points = groups.flatMap((group) => group.points);
    return [{ tag: module.tag, description: module.description, groups, points }];
  });
}
