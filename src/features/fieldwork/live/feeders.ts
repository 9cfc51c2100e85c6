/** What can make a terminal live although this person's locks are on: told from the energy graph, likeliest first. */
import { countsAsIsolation, electricalKind } from '../../../../shared/isolation/countsAsIsolation';
import type { Live } from '../../../../shared/isolation/types';
import { reach } from '../../../../shared/isolation/reach';
import type { ReadingAsk } from '../../../../shared/checklist/types';
import type { Isolator, Panel } from '../../../../shared/panel/panelSchema';

export type Feeder =
  /** A path from a source that the person's own locks do not break; `open` is the isolator to go to, if one can. */
  | { why: 'path'; path: string[]; maybe: boolean; open?: Isolator }
  /** Locked by this person and on the way: it may not have opened every conductor, or is the wrong one. */
  | { why: 'not-opened'; isolator: Isolator }
  | { why: 'stored'; supply: string }
  | { why: 'induced' }
  | { why: 'wrong-terminal' };

/** The isolators named on a path, in its order. */
const isolatorsOn = (panel: Panel, path: string[]): Isolator[] =>
  path.flatMap((tag) => panel.isolators.filter((isolator) => isolator.tag === tag));

function pathFeeder(panel: Panel, live: Live, locked: ReadonlySet<string>): Feeder {
  const open = isolatorsOn(panel, live.path).find(
    (isolator) => countsAsIsolation(isolator) && electricalKind(isolator) && !locked.has(isolator.tag),
  );
  return { why: 'path', path: live.path, maybe: live.maybe, ...(open ? { open } : {}) };
}

const startsWith = (path: string[], start: string[]): boolean =>
  start.every((tag, index) => path[index] === tag);

/** Everything `reach` finds live at the terminal, or at the supply it belongs to, with these isolators open. */
function livePaths(panel: Panel, dead: NonNullable<ReadingAsk['dead']>, open: ReadonlySet<string>): Live[] {
  const { terminals, supplies } = reach(panel, open);
  const found = [terminals.get(dead.terminal), terminals.get(dead.second), supplies.get(dead.supply)];
  const lives = found.flatMap((live) => live ?? []);
  // A path that another one continues, or repeats, says nothing of its own.
  return lives.filter(
    ({ path }, index) =>
      !lives.some(
        (other, at) =>
          at !== index && startsWith(other.path, path) && (other.path.length > path.length || at < index),
      ),
  );
}

/** The isolators that would feed the terminal if they were not open: reach with none open names them. */
function lockedOnTheWay(
  panel: Panel,
  dead: NonNullable<ReadingAsk['dead']>,
  locked: ReadonlySet<string>,
): Feeder[] {
  const tags = new Set(
    livePaths(panel, dead, new Set()).flatMap(({ path }) => path.filter((tag) => locked.has(tag))),
  );
  return panel.isolators
    .filter(({ tag }) => tags.has(tag))
    .map((isolator) => ({ why: 'not-opened', isolator }));
}

/** @param locked tags of the isolators on which this person's own lock is known to be. */
export function feeders(panel: Panel, ask: ReadingAsk, locked: ReadonlySet<string>): Feeder[] {
  const { dead } = ask;
  if (!dead) return [{ why: 'wrong-terminal' }];
  const supply = panel.supplies.find(({ tag }) => tag === dead.supply);
  const found: Feeder[] = [
    ...livePaths(panel, dead, locked).map((live) => pathFeeder(panel, live, locked)),
    ...lockedOnTheWay(panel, dead, locked),
  ];
  if (ask.unit === 'V DC' && supply && supply.bulk !== 'none')
    found.push({ why: 'stored', supply: supply.tag });
  if (ask.unit === 'V AC') found.push({ why: 'induced' });
  return [...found, { why: 'wrong-terminal' }];
}
