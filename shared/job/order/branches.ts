/** Tells the branches of a forked log apart, by the hashes its entries name. */
import { digestOf } from '../../panel/canonical';
import type { Entry } from '../entry';
import type { Log } from './logs';
import type { Placed } from './placed';

const hashes = new WeakMap<Entry, string>();

/** Undefined for an entry that has no canonical form. */
function hashOf(entry: Entry): string | undefined {
  const known = hashes.get(entry);
  if (known !== undefined) return known;
  try {
    const hash = digestOf(entry);
    hashes.set(entry, hash);
    return hash;
  } catch {
    return undefined;
  }
}

function branchesOf(forked: readonly Placed[]): void {
  const byHash = new Map<string, Placed>();
  // In order of number: what `previous` names stands before.
  for (const placed of forked) {
    const { previous } = placed.entry;
    const parent = previous === null ? undefined : byHash.get(previous);
    placed.branch = new Set(parent ? [...(parent.branch ?? []), parent] : []);
    const hash = hashOf(placed.entry);
    if (hash !== undefined) byHash.set(hash, placed);
  }
}

/** Marks the entries at and after the first fork of each log with the branch they follow. */
export function branches(logs: readonly Log[], placed: readonly Placed[]): void {
  logs.forEach(({ forksAt }, log) => {
    if (forksAt === undefined) return;
    branchesOf(
      placed.filter((each) => each.log === log && each.seq >= forksAt).sort((a, b) => a.seq - b.seq),
    );
  });
}
