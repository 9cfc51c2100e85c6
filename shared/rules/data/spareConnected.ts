/** A point that the file calls spare and yet wires. */
import { settleOnSite } from '../settleOnSite';
import { found, titleOf, type RuleAt } from '../rule';
import { isConnected } from '../spare';

const id = 'data.spare-connected';

export const spareConnected: RuleAt<'point'> = {
  id,
  title: titleOf(id),
  basis: 'points.*.spare',
  appliesTo: 'point',
  check: ({ where, point }) => {
    if (point.spare !== true) return [];
    if (!isConnected(point)) return ['ok'];
    return [
      found(id, {
        harm: 'doubt',
        where,
        params: { terminal: point.terminal },
        addsSteps: settleOnSite(id, where),
      }),
    ];
  },
};
