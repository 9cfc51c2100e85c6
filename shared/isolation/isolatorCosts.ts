/** One exact number for each isolator, so that the least sum is the least set with every tie settled. */
import { byCodeUnits } from './inOrder';

/**
 * Costs under which the cheapest set is the one of least weight, then of fewest isolators, then with the sorted tag
 * list that is least by code units. Of two sets of one size the one that holds the first tag they do not share has
 * the lesser list, so the tag of rank r earns 2^(n-1-r); one isolator outweighs all that together, and one unit of
 * weight outweighs all counts.
 */
export function isolatorCosts(weights: ReadonlyMap<string, number>): Map<string, bigint> {
  const tags = [...weights.keys()].sort(byCodeUnits);
  const n = BigInt(tags.length);
  const one = 1n << n;
  const unit = one * (n + 1n);
  return new Map(
    tags.map((tag, rank) => [
      tag,
      BigInt(weights.get(tag) ?? 0) * unit + one - (1n << (n - 1n - BigInt(rank))),
    ]),
  );
}
