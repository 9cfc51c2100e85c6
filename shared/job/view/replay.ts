/** Walks through a job's entries once: each is judged by a view of what it had seen, then counts everywhere. */
import { judge } from '../judge/judge';
import type { Judged } from '../judge/judged';
import { isKnownTo, type Placed } from '../order/placed';
import { apply } from './apply';
import { emptyView, type Setting, type View } from './view';

export interface Replayed {
  view: View;
  placed: readonly Placed[];
  judged: readonly Judged[];
}

/** A view that follows one log and is brought up to what its next entry had seen. */
interface Follower {
  view: View;
  /** For each log how many of its entries are in the view. */
  taken: number[];
}

function newFor(placed: Placed, byLog: readonly (readonly Placed[])[], taken: number[]): Placed[] {
  const fresh = byLog.flatMap((entries, log) => {
    const from = taken[log] ?? 0;
    let to = from;
    for (let next = entries[to]; next && isKnownTo(next, placed); next = entries[to]) to += 1;
    taken[log] = to;
    return entries.slice(from, to);
  });
  return fresh.sort((a, b) => a.at - b.at);
}

/** @param placed in an order that agrees with what each had seen. */
export function replay(setting: Setting, placed: readonly Placed[], logs: number): Replayed {
  const byLog: Placed[][] = Array.from({ length: logs }, () => []);
  for (const each of placed) byLog[each.log]?.push(each);
  const followers = new Map<number, Follower>();
  const judged: Judged[] = [];
  const view = emptyView(setting);
  const take = (into: View, each: Placed) => {
    const worth = judged[each.at];
    if (worth) apply(into, each, worth);
  };
  for (const each of placed) {
    const follower = followers.get(each.log) ?? { view: emptyView(setting), taken: byLog.map(() => 0) };
    followers.set(each.log, follower);
    for (const seen of newFor(each, byLog, follower.taken)) take(follower.view, seen);
    judged.push(judge(follower.view, each));
    take(view, each);
  }
  return { view, placed, judged };
}
