/** More hangs on a supply than it is rated for, with everything switched on. */
import { say } from '../../panel/says';
import type { SupplyPlace } from '../context';
import { found, missing, quantity, titleOf, type Outcome, type RuleAt } from '../rule';
import { drawnFrom, fullestA } from './loads';

const id = 'supply.overload';

/** Loads of supplies fed from this one are its `otherLoadA`: how well they convert, the file does not say. */
function ask(place: SupplyPlace): Outcome[] {
  const { where, path, supply, groups, relayLoads } = place;
  if (groups.length + relayLoads.length === 0) return [];
  if (supply.ratedA === undefined) return [missing(`${path}.ratedA`)];
  const drawn = drawnFrom(place);
  const wiredA = fullestA(drawn, supply.kind === 'ac3');
  const allA = wiredA + (supply.otherLoadA ?? 0);
  if (allA > supply.ratedA)
    return [
      found(id, {
        harm: 'fails',
        where,
        params: { supply: supply.tag, A: allA, ratedA: supply.ratedA },
        because: [
          quantity('wired-load', wiredA, 'A', 'all points of its groups on'),
          quantity('other-load', supply.otherLoadA ?? 0, 'A', `${path}.otherLoadA`),
          quantity('supply-rating', supply.ratedA, 'A', `${path}.ratedA`),
        ],
        remedy: { says: say(`finding.${id}.remedy`, { A: allA }), values: { A: allA } },
      }),
    ];
  const lacking = drawn.find((item) => 'missing' in item);
  if (lacking && 'missing' in lacking) return [missing(lacking.missing)];
  return [supply.otherLoadA === undefined ? missing(`${path}.otherLoadA`) : 'ok'];
}

export const supplyOverload: RuleAt<'supply'> = {
  id,
  title: titleOf(id),
  basis: 'sum of the stated loads, all on',
  appliesTo: 'supply',
  check: ask,
};
