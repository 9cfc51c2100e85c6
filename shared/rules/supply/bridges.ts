/** Which commons are one conductor: those on one terminal, and those that bridges join. */
import type { GroupPlace, RuleContext } from '../context';

const known = new WeakMap<RuleContext, Map<string, GroupPlace[]>>();

/** Follows the bridges both ways: a file may state a bridge at one end only. */
function neighboursOf(context: RuleContext): Map<string, Set<string>> {
  const joined = new Map<string, Set<string>>();
  const join = (a: string, b: string) => joined.set(a, (joined.get(a) ?? new Set<string>()).add(b));
  for (const { group } of context.places.group)
    for (const linked of group.linkedTo ?? []) {
      join(group.tag, linked);
      join(linked, group.tag);
    }
  return joined;
}

/** Every bridged group by tag, with all groups it is joined to, itself among them. */
function reckon(context: RuleContext): Map<string, GroupPlace[]> {
  const joined = neighboursOf(context);
  const placesByTag = new Map<string, GroupPlace[]>();
  for (const place of context.places.group)
    placesByTag.set(place.group.tag, [...(placesByTag.get(place.group.tag) ?? []), place]);
  const bridged = new Map<string, GroupPlace[]>();
  for (const start of joined.keys()) {
    if (bridged.has(start)) continue;
    const tags = new Set([start]);
    for (const tag of tags) for (const next of joined.get(tag) ?? []) tags.add(next);
    const places = [...tags].flatMap((tag) => placesByTag.get(tag) ?? []);
    for (const tag of tags) bridged.set(tag, places);
  }
  return bridged;
}

/** All groups that bridges join to this one, itself among them; none where nothing is bridged. */
export function bridgedWith({ group }: GroupPlace, context: RuleContext): readonly GroupPlace[] {
  const bridged = known.get(context) ?? reckon(context);
  known.set(context, bridged);
  return bridged.get(group.tag) ?? [];
}

/**
 * One pole of one supply, as text: two of them on one conductor are a short circuit or two supplies side by side.
 * Undefined where the supply, or the phase of a three-phase one, is not stated.
 */
export function poleOf({ group, supply }: GroupPlace): string | undefined {
  if (!supply) return undefined;
  if (supply.kind !== 'ac3' || group.common !== 'line') return `${supply.tag} ${group.common}`;
  return group.phase && `${supply.tag} ${group.phase}`;
}
