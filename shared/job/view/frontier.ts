/** Keeps only what no later entry has seen and replaced. */
import { before, type Placed } from '../order/placed';

/** Adds one that comes later in the walk and drops those it had seen. */
export function withNewest<T extends { placed: Placed }>(list: readonly T[] | undefined, added: T): T[] {
  if (!list) return [added];
  return [...list.filter(({ placed }) => !before(placed, added.placed)), added];
}

/** The same among one person's own; those of others stay. */
export function withOwnNewest<T extends { placed: Placed; person: string }>(
  list: readonly T[] | undefined,
  added: T,
): T[] {
  if (!list) return [added];
  return [
    ...list.filter(({ placed, person }) => person !== added.person || !before(placed, added.placed)),
    added,
  ];
}

export const isAfterAll = (placed: Placed, earlier: readonly Placed[]): boolean =>
  earlier.every((each) => before(each, placed));
