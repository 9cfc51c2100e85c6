/** Which dead tests belong to the first steps of their point instead of the stage Prove dead. */
import { foreignSupplies } from '../../../isolation/foreignSupplies';
import type { DeadTest } from '../../../isolation/types';
import type { Point } from '../../../panel/panelSchema';
import type { Facts } from '../../facts';

/** Foreign voltage may reach the terminal; a point nobody has asked about counts as reached. */
export const hasForeignVoltage = (point: Point): boolean => foreignSupplies(point).length > 0;

/**
 * A worked terminal without foreign voltage is read as the first step of its point (isolation.md §3),
 * where it is never offered in bulk; reading it here as well would only teach people to tick.
 */
export function readInWire(facts: Facts, { at }: DeadTest): boolean {
  if (!('point' in at)) return false;
  const worked = facts.worked(at.point);
  return worked !== undefined && !hasForeignVoltage(worked.point);
}
