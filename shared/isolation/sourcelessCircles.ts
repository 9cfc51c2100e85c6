/** Supplies that feed each other in a circle which no source reaches. */
import type { Panel } from '../panel/panelSchema';

/** For each supply, the supplies it is fed from. */
function feedersOf(panel: Panel): Map<string, Set<string>> {
  const feeders = new Map<string, Set<string>>();
  const sources = new Set(panel.sources.map((source) => source.tag));
  for (const supply of panel.supplies) {
    const known = feeders.get(supply.tag) ?? new Set<string>();
    for (const feed of supply.feeds) if (!sources.has(feed.from)) known.add(feed.from);
    feeders.set(supply.tag, known);
  }
  return feeders;
}

function upstreamOf(tag: string, feeders: Map<string, Set<string>>): Set<string> {
  const seen = new Set<string>();
  const waiting = [...(feeders.get(tag) ?? [])];
  for (let next = waiting.pop(); next !== undefined; next = waiting.pop()) {
    if (seen.has(next)) continue;
    seen.add(next);
    waiting.push(...(feeders.get(next) ?? []));
  }
  return seen;
}

/** True when energy of a described or unknown origin enters at this supply itself. */
function hasOrigin(panel: Panel, tag: string): boolean {
  const sources = new Set(panel.sources.map((source) => source.tag));
  const supplies = new Set(panel.supplies.map((supply) => supply.tag));
  return panel.supplies
    .filter((supply) => supply.tag === tag)
    .some(
      (supply) =>
        supply.feeds.length === 0 ||
        supply.feeds.some((feed) => sources.has(feed.from) || !supplies.has(feed.from)),
    );
}

/** Each circle as its sorted tags. What is fed only by such a circle, and not part of one, is not listed. */
export function sourcelessCircles(panel: Panel): string[][] {
  const feeders = feedersOf(panel);
  const circles = new Map<string, string[]>();
  for (const tag of feeders.keys()) {
    const upstream = upstreamOf(tag, feeders);
    if (!upstream.has(tag)) continue;
    if ([...upstream].some((one) => hasOrigin(panel, one))) continue;
    const circle = [...upstream].filter((one) => upstreamOf(one, feeders).has(tag)).sort();
    circles.set(circle.join('\u0000'), circle);
  }
  return [...circles.values()].sort((a, b) => (a.join('\u0000') < b.join('\u0000') ? -1 : 1));
}
