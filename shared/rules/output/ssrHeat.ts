/** A solid-state relay turns about a volt times its current into heat: above a few amps it needs a heat sink. */
import { found, quantity, titleOf, type RuleAt } from '../rule';
import { settleOnSite } from '../settleOnSite';

const id = 'output.ssr-heat';

/** Without a heat sink a relay of any size is asked about above this current (common practice, no source). */
const coolA = 5;

export const ssrHeat: RuleAt<'point'> = {
  id,
  title: titleOf(id),
  basis: 'common practice: above 5 A with a heat sink',
  appliesTo: 'point',
  check: (place) => {
    const { device } = place.point;
    if (device.kind !== 'ssr-control') return [];
    const { A } = device.load;
    if (A <= coolA || device.rating.heatSink === true) return ['ok'];
    return [
      found(id, {
        harm: 'doubt',
        where: place.where,
        params: { relay: device.tag ?? place.point.address, A },
        because: [
          quantity('load-current', A, 'A', `${place.path}.device.load.A`),
          quantity('cool-limit', coolA, 'A', 'common practice'),
        ],
        remedy: { says: { key: 'remedy.output.ssr-heat' } },
        addsSteps: settleOnSite(id, place.where),
      }),
    ];
  },
};
