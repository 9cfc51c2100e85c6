/** All loads of one common, all on, against what the common may carry. */
import type { PointPlace } from '../context';
import { settleOnSite } from '../settleOnSite';
import { found, missing, quantity, titleOf, type RuleAt } from '../rule';
import { steadyA } from './drawnLoads';
import { atOutputGroup } from './outputPlace';

const id = 'output.group-current';

export interface GroupSum {
  A: number;
  /** A point of which nobody has said what hangs on it. */
  unknown?: PointPlace;
}

/** Added up with every output on: no diversity is stated in a panel file. */
export function groupSum(points: PointPlace[]): GroupSum {
  const unknown = points.find((place) => steadyA(place) === undefined);
  const A = points.reduce((sum, place) => sum + (steadyA(place) ?? 0), 0);
  return unknown ? { A, unknown } : { A };
}

export const groupCurrent: RuleAt<'group'> = {
  id,
  title: titleOf(id),
  basis: "the output's stated current per common; every output on",
  appliesTo: 'group',
  check: (place) =>
    atOutputGroup(place, ({ io, ioPath }) => {
      if (place.points.length === 0) return [];
      const { A, unknown } = groupSum(place.points);
      // A common carries at least what one of its points may.
      const limitA = io.groupA ?? io.pointA;
      if (A <= limitA * (1 + 1e-9)) return [unknown ? missing(`${unknown.path}.device.A`) : 'ok'];
      if (io.groupA === undefined) return [missing(`${ioPath}.groupA`)];
      return [
        found(id, {
          harm: 'damages',
          where: place.where,
          params: { A, limitA, points: place.points.length },
          because: [
            quantity('group-current', A, 'A', 'sum of the loads of the group, all on'),
            quantity('group-limit', limitA, 'A', `${ioPath}.groupA`),
          ],
          remedy: { says: { key: 'remedy.output.group-current', params: { overA: A - limitA } } },
          addsSteps: settleOnSite(id, place.where),
        }),
      ];
    }),
};
