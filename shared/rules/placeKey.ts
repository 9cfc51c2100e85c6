/** One name for a place, for acceptances, sorting and keys of lists. */
import type { Where } from './finding';

const order = ['supply', 'source', 'isolator', 'module', 'group', 'point', 'terminal'] as const;

/** E.g. `point:DI1.03`, `group:G2`; parts in a fixed order. The place string of an acceptance. */
export const placeKey = (where: Where): string =>
  order.flatMap((kind) => (where[kind] === undefined ? [] : [`${kind}:${where[kind]}`])).join(' ');
