/** Everything the state of a job is built from. */
import type { Entry } from '../entry';
import type { Hole } from '../order/holes';
import type { Log } from '../order/logs';
import type { Replayed } from '../view/replay';

export interface Folded {
  replayed: Replayed;
  scope: readonly string[];
  /** Every entry held, of whomever. */
  entries: readonly Entry[];
  logs: readonly Log[];
  holes: readonly Hole[];
  /** Ids that came with two contents. */
  twice: readonly string[];
}
