/** Two points with one address, one terminal or one wire number: one of the rows is wrong. */
import type { PointPlace, RuleContext } from '../context';
import { settleOnSite } from '../settleOnSite';
import { found, titleOf, type RuleAt } from '../rule';

type Field = 'address' | 'terminal' | 'wire';

const index: Record<Field, (context: RuleContext) => Map<string, PointPlace[]>> = {
  address: ({ pointsByAddress }) => pointsByAddress,
  terminal: ({ pointsByTerminal }) => pointsByTerminal,
  wire: ({ pointsByWire }) => pointsByWire,
};

const duplicate = (field: Field): RuleAt<'point'> => {
  const id = `data.duplicate-${field}`;
  return {
    id,
    title: titleOf(id),
    basis: `points.*.${field}`,
    appliesTo: 'point',
    check: ({ where, point }, context) => {
      const same = index[field](context).get(point[field]) ?? [];
      if (same.length < 2) return ['ok'];
      const others = same.map((place) => place.point.address).sort();
      return [
        found(id, {
          harm: 'doubt',
          where,
          params: { value: point[field], points: others.join(', ') },
          addsSteps: settleOnSite(id, where),
        }),
      ];
    },
  };
};

export const duplicateAddress = duplicate('address');
export const duplicateTerminal = duplicate('terminal');
export const duplicateWire = duplicate('wire');
