/** A conductor that carries less than its loads draw gets hot for as long as they are on. */
import { smallConductorCap } from '../../electrical/smallConductorCap';
import { settleOnSite } from '../settleOnSite';
import { found, missing, quantity, titleOf, type RuleAt } from '../rule';
import { steadyA } from '../output/drawnLoads';
import { atOutput } from '../output/outputPlace';
import { carries, isCarries } from './carries';

const id = 'wire.too-small';

/** Only outputs: an input draws milliamps, and what its fuse lets through is asked by `fuse.too-big`. */
export const tooSmall: RuleAt<'point'> = {
  id,
  title: titleOf(id),
  basis: 'IEC 60204-1 Table 6; NFPA 79 small conductors with NEC 240.4(D)',
  appliesTo: 'point',
  check: (place, context) =>
    atOutput(place, ({ path }) => {
      const A = steadyA(place);
      if (A === undefined) return [missing(`${path}.device.A`)];
      if (A === 0) return [];
      const able = carries(place, context);
      if (!isCarries(able)) return [able];
      const { cable } = place.point;
      const nec = context.panel.practice === 'NFPA 79' && cable ? smallConductorCap(cable.size) : undefined;
      const most = Math.min(able.A, nec?.continuousA ?? Infinity);
      if (A <= Math.min(able.worstA, most)) return ['ok'];
      if (A <= most) return [missing(able.lacks ?? `${path}.cable.grouped`)];
      return [
        found(id, {
          harm: 'damages',
          where: place.where,
          params: { A, carriesA: most },
          because: [
            quantity('load-current', A, 'A', `${path}.device.A`),
            quantity('ampacity', most, 'A', `${context.panel.practice}, ${path}.cable`),
          ],
          remedy: { says: { key: 'remedy.wire.too-small', params: { A } }, values: { A } },
          addsSteps: settleOnSite(id, place.where),
        }),
      ];
    }),
};
