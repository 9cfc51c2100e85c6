/** In which order a plan's isolators are opened: load side first, from outside first, the door after them. */
import type { Isolator, Panel } from '../panel/panelSchema';
import { asRead, byCodeUnits } from './inOrder';

/** How many isolators and supplies lie between a source and each isolator, on the longest way. */
function depths(panel: Panel): Map<string, number> {
  const supplies = new Map<string, number>();
  const isolators = new Map<string, number>();
  // Circles would deepen for ever: no way without a circle is longer than this.
  const longest = panel.supplies.length + 1;
  for (let round = 0; round < longest; round += 1) {
    const before = new Map(supplies);
    for (const supply of panel.supplies)
      for (const feed of supply.feeds) {
        const start = before.get(feed.from) ?? 0;
        feed.through.forEach((tag, place) =>
          isolators.set(tag, Math.max(isolators.get(tag) ?? 0, start + place + 1)),
        );
        const end = start + feed.through.length + 1;
        supplies.set(supply.tag, Math.max(supplies.get(supply.tag) ?? 0, end));
      }
    if ([...supplies].every(([tag, depth]) => before.get(tag) === depth)) break;
  }
  return isolators;
}

/**
 * The isolators in opening order: electrical ones that can be reached with the door shut, load side first, those that
 * break load before those that must not; then those behind the door; last the ones that hold other energy back.
 */
export function openingOrder(
  panel: Panel,
  isolators: readonly Isolator[],
  otherEnergy: ReadonlySet<string>,
): Isolator[] {
  const depth = depths(panel);
  const last = (one: Isolator) => (otherEnergy.has(one.tag) ? 1 : 0);
  const behindDoor = (one: Isolator) => (one.operatedFrom === 'door-open' ? 1 : 0);
  return [...isolators].sort(
    (a, b) =>
      last(a) - last(b) ||
      behindDoor(a) - behindDoor(b) ||
      (depth.get(b.tag) ?? 0) - (depth.get(a.tag) ?? 0) ||
      Number(b.loadBreak) - Number(a.loadBreak) ||
      byCodeUnits(a.location, b.location) ||
      asRead(a.tag, b.tag),
  );
}
