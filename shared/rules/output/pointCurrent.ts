/** All loads of one terminal together against what that output may carry. */
import { settleOnSite } from '../settleOnSite';
import { found, missing, quantity, titleOf, type RuleAt } from '../rule';
import { steadyA } from './drawnLoads';
import { atOutput } from './outputPlace';

const id = 'output.point-current';

export const pointCurrent: RuleAt<'point'> = {
  id,
  title: titleOf(id),
  basis: "the output's stated current per point",
  appliesTo: 'point',
  check: (place) =>
    atOutput(place, ({ path, io, ioPath }) => {
      const A = steadyA(place);
      if (A === undefined) return [missing(`${path}.device.A`)];
      if (A <= io.pointA * (1 + 1e-9)) return ['ok'];
      return [
        found(id, {
          harm: 'damages',
          where: place.where,
          params: { A, limitA: io.pointA },
          because: [
            quantity('load-current', A, 'A', `${path}.device.A`),
            quantity('point-limit', io.pointA, 'A', `${ioPath}.pointA`),
          ],
          remedy: { says: { key: 'remedy.output.point-current', params: { A } }, values: { A } },
          addsSteps: settleOnSite(id, place.where),
        }),
      ];
    }),
};
