/** Random panels for the lock plan: shared isolators, redundant feeds, circles, one-conductor devices, bridges, guards. */
import type { Group, Isolator, Panel, Point, Source, Supply } from '../../../shared/panel/panelSchema';
import { dc24, group, isolator, panel, point, source, supply } from './parts';

export interface Random {
  chance: (probability: number) => boolean;
  below: (n: number) => number;
  pick: <T>(items: readonly T[]) => T;
}

/** mulberry32, a public-domain generator: the same seed gives the same panel on every machine. */
export function random(seed: number): Random {
  let state = seed >>> 0;
  const next = () => {
    state = (state + 0x6d2b79f5) >>> 0;
    let mixed = Math.imul(state ^ (state >>> 15), state | 1);
    mixed ^= mixed + Math.imul(mixed ^ (mixed >>> 7), mixed | 61);
    return ((mixed ^ (mixed >>> 14)) >>> 0) / 4294967296;
  };
  const below = (n: number) => Math.floor(next() * n);
  const pick = <T>(items: readonly T[]): T => {
    const item = items[below(items.length)];
    if (item === undefined) throw new Error('nothing to pick from');
    return item;
  };
  return { chance: (probability) => next() < probability, below, pick };
}

const many = <T>(n: number, make: (index: number) => T): T[] => Array.from({ length: n }, (_, i) => make(i));

function randomSource(r: Random, index: number): Source {
  const phases = r.pick([1, 1, 3] as const);
  const { V, phases: _phases, ...bare } = source(`IN${index}`);
  return r.chance(0.8) ? { ...bare, V: phases === 3 ? 208 : (V ?? 120), phases } : bare;
}

function randomIsolator(r: Random, index: number): Isolator {
  return isolator(`Q${index}`, {
    kind: r.pick(['breaker', 'disconnect', 'fuse-carrier', 'plug', r.chance(0.3) ? 'contactor' : 'breaker']),
    suitableForIsolation: r.chance(0.93),
    opens: r.pick(['all-conductors', 'all-live', r.chance(0.6) ? 'one-conductor' : 'all-live']),
    lock: r.pick(['hasp', 'hasp', 'device-needed', r.chance(0.3) ? 'cannot-lock' : 'hasp']),
    inSight: r.chance(0.7),
    inPanel: r.chance(0.4),
    operatedFrom: r.chance(0.2) ? 'door-open' : 'outside',
    loadBreak: r.chance(0.8),
    ...(r.chance(0.3) ? { alsoFeeds: many(1 + r.below(3), (n) => `Thing ${n}`) } : {}),
  });
}

function randomSupply(r: Random, index: number, tags: { sources: string[]; isolators: string[] }): Supply {
  const tag = `S${index}`;
  const earlier = many(index, (n) => `S${n}`);
  const feeds = many(r.pick([1, 1, 1, 2, 2, 3]), () => {
    const upstream = index > 0 && r.chance(0.5) ? r.pick(earlier) : r.pick(tags.sources);
    // Now and then a later supply: that is how circles come about.
    const from = r.chance(0.06) ? `S${r.below(6)}` : upstream;
    const through = r.chance(0.04) ? [] : many(1 + r.below(3), () => r.pick(tags.isolators));
    return [from, ...new Set(through)];
  });
  const earthed = r.chance(0.75);
  const guard = r.chance(0.4) ? { mayStayLive: { reason: 'Keeps the log', guard: 'Cover' } } : {};
  if (r.chance(0.4))
    return dc24(tag, feeds, { earthed, extraLow: r.pick(['PELV', 'SELV', 'none']), ...guard });
  const phases = r.chance(0.2) ? { terminals: { L1: `${tag}:1`, L2: `${tag}:2` }, V: 208 } : {};
  return supply(tag, r.chance(0.02) ? [] : feeds, { earthed, ...phases, ...guard });
}

function randomGroup(r: Random, index: number, supplies: string[]): Group {
  return group(`G${index}`, r.chance(0.99) ? r.pick(supplies) : undefined, {
    module: `M${r.below(3)}`,
    ...(index > 0 && r.chance(0.08) ? { linkedTo: [`G${r.below(index)}`] } : {}),
  });
}

function randomPoint(r: Random, index: number, groups: string[], supplies: string[]): Point {
  const { otherSupply, ...bare } = point(`A${index}`, r.pick(groups));
  if (r.chance(0.15)) return { ...bare, otherSupply: r.pick(supplies) };
  return r.chance(0.99) ? { ...bare, otherSupply: otherSupply ?? 'none' } : bare;
}

/** A panel of at most 10 isolators, and a scope of one to three of its points. */
export function randomPanel(seed: number): { panel: Panel; scope: string[]; random: Random } {
  const r = random(seed);
  const sources = many(1 + r.below(4), (n) => randomSource(r, n));
  const isolators = many(2 + r.below(9), (n) => randomIsolator(r, n));
  const tags = { sources: sources.map((one) => one.tag), isolators: isolators.map((one) => one.tag) };
  const supplies = many(2 + r.below(5), (n) => randomSupply(r, n, tags));
  const supplyTags = supplies.map((one) => one.tag);
  const groups = many(2 + r.below(4), (n) => randomGroup(r, n, supplyTags));
  const groupTags = groups.map((one) => one.tag);
  const points = many(3 + r.below(6), (n) => randomPoint(r, n, groupTags, supplyTags));
  const scope = [...new Set(many(1 + r.below(3), () => r.pick(points).address))];
  return { panel: panel({ sources, isolators, supplies, groups, points }), scope, random: r };
}
