/** Which supplies may be left on with their guard while people work. */
import type { Panel, Supply } from '../panel/panelSchema';
import { foreignSupplies } from './foreignSupplies';

// Ceiling of extra-low voltage: 50 V AC, 120 V ripple-free DC (IEC 61558-1, IEV "safety extra-low voltage").
const extraLowLimitV = { ac: 50, dc: 120 };
// The file format allows a tolerance of +100 % at most: what an unstated one has to be taken for.
const unstatedMaxPct = 100;

function extraLow(supply: Supply): boolean {
  const highest = supply.V * (1 + (supply.tolerance?.maxPct ?? unstatedMaxPct) / 100);
  const limit = supply.kind === 'dc' ? extraLowLimitV.dc : extraLowLimitV.ac;
  return supply.extraLow !== 'none' && highest <= limit;
}

/** Supplies that come to the same modules as the scope, or could reach its commons through a neighbour's contact. */
function suppliesNear(panel: Panel, scopeGroups: ReadonlySet<string>): Set<string | null | undefined> {
  const mine = panel.groups.filter((group) => scopeGroups.has(group.tag));
  const modules = new Set(mine.map((group) => group.module));
  const supplies = new Set(mine.map((group) => group.supply));
  const near = panel.groups.filter(
    (group) => modules.has(group.module) || (group.supply !== undefined && supplies.has(group.supply)),
  );
  const tags = new Set(near.map((group) => group.tag));
  const foreign = panel.points.filter((point) => tags.has(point.group)).flatMap(foreignSupplies);
  return new Set([...near.map((group) => group.supply), ...foreign]);
}

/**
 * Tags of supplies that may stay live beside work on these groups: with `mayStayLive` in every description, declared
 * SELV or PELV and within extra-low voltage, and on no module of the scope.
 */
export function mayStayOn(panel: Panel, scopeGroups: ReadonlySet<string>): Set<string> {
  const near = suppliesNear(panel, scopeGroups);
  const refused = panel.supplies.filter(
    (supply) => supply.mayStayLive === undefined || !extraLow(supply) || near.has(supply.tag),
  );
  const left = new Set(panel.supplies.map((supply) => supply.tag));
  for (const supply of refused) left.delete(supply.tag);
  return left;
}
