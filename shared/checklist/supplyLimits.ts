/** Between which volts a supply may read, and which supplies come back with which isolators. */
import { say, type Text } from '../panel/says';
import type { Supply } from '../panel/panelSchema';
import type { Facts } from './facts';
import { inThousandths } from './inThousandths';
import { naturalCompare } from './naturalCompare';

export interface Limits {
  low: number;
  high: number;
  why: Text;
}

/** From the stated tolerance; undefined where none is stated, for a limit is never invented. */
export function supplyLimits({ tag, V, tolerance }: Supply): Limits | undefined {
  if (!tolerance) return undefined;
  const low = inThousandths(V * (1 + tolerance.minPct / 100));
  const high = inThousandths(V * (1 + tolerance.maxPct / 100));
  return { low, high, why: say('checklist.why.supply', { supply: tag, V, ...tolerance }) };
}

/** Supplies that cannot be live while the isolators of Restore motion are open. */
export function motiveSupplies({
  panel,
  isolators,
}: Pick<Facts, 'panel' | 'isolators'>): ReadonlySet<string> {
  const open = new Set(
    isolators.filter(({ restoredIn }) => restoredIn === 'restore-motion').map(({ isolator }) => isolator.tag),
  );
  const motive = new Set<string>();
  const cut = ({ feeds }: Supply) =>
    feeds.length > 0 &&
    feeds.every(({ from, through }) => motive.has(from) || through.some((tag) => open.has(tag)));
  // A supply may derive from one that is found later in the list: repeat until nothing is added.
  for (let before = -1; before !== motive.size;) {
    before = motive.size;
    for (const supply of panel.supplies) if (cut(supply)) motive.add(supply.tag);
  }
  return motive;
}

/** Supplies made dead for this job: those that Prove dead measures and those of the worked groups. */
export function suppliesMadeDead(facts: Facts): Supply[] {
  const guarded = new Set(facts.plan.guarded.map(({ supply }) => supply));
  const tags = new Set([
    ...facts.deadTests.map(({ supply }) => supply),
    ...facts.groups.map(({ supply }) => supply ?? ''),
  ]);
  return facts.panel.supplies
    .filter(({ tag }) => tags.has(tag) && !guarded.has(tag))
    .sort((a, b) => naturalCompare(a.tag, b.tag));
}
