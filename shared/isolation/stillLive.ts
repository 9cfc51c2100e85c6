/** The picture people remember: what stays live after opening only these isolators. */
import type { Panel } from '../panel/panelSchema';
import { tagOf } from './graphEdge';
import { inReadingOrder } from './inOrder';
import { reach } from './reach';
import type { Live, StillLive } from './types';

/** Incoming sides inside the enclosure that stay live, in reading order. */
export const liveIncoming = (places: Map<string, Live>): StillLive[] =>
  inReadingOrder(places, ([id]) => id).map(([id, live]) => ({ ...live, incomingOf: tagOf(id) }));

/** Every terminal and incoming side that is live, or may be, with `open` open: terminals first, in reading order. */
export function stillLive(panel: Panel, open: ReadonlySet<string>): StillLive[] {
  const live = reach(panel, open);
  const terminals = inReadingOrder(live.terminals, ([terminal]) => terminal).map(([terminal, found]) => ({
    ...found,
    terminal,
  }));
  return [...terminals, ...liveIncoming(live.places)];
}
