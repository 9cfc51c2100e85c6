/** Keeps the objects of an earlier reading for entries that have not changed: what was worked out of them holds on. */
import type { Entry } from '../../shared/job/entry';

const isSame = (known: Entry | undefined, fresh: Entry): known is Entry =>
  known !== undefined && JSON.stringify(known) === JSON.stringify(fresh);

/** `fresh` with known objects where they say the same; `known` itself when nothing has changed. */
export function sameEntries(known: Entry[] | undefined, fresh: Entry[]): Entry[] {
  if (!known) return fresh;
  const byId = new Map(known.map((entry) => [entry.id, entry]));
  const like = fresh.map((entry) => {
    const before = byId.get(entry.id);
    return isSame(before, entry) ? before : entry;
  });
  const isAll = like.length === known.length && like.every((entry) => byId.get(entry.id) === entry);
  return isAll ? known : like;
}
