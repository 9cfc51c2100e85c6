/** What a dead reading means: the bands of isolation.md §3. */
import type { ReadingAsk } from '../../../../shared/checklist/types';
import type { Panel, Supply } from '../../../../shared/panel/panelSchema';

export type DeadBand = 'dead' | 'not-dead' | 'live';

// isolation.md §3: up to 25 V AC / 60 V DC it is "not dead"; above, "live".
const liveAboveV = { 'V AC': 25, 'V DC': 60 } as const;
// isolation.md §3: a reading of 80 % of a supply means that the supply is still on, whatever the band.
const stillOnShare = 0.8;
// 0.8 × 24 is a hair above 19.2 in binary: a reading of exactly 80 % must count.
const rounding = 1e-9;

/** An unknown unit counts as the stricter one: a missing datum is never assumed safe. */
export function deadBand(ask: ReadingAsk, value: number): DeadBand {
  const V = Math.abs(value);
  if (V <= (ask.high ?? 0)) return 'dead';
  return V > liveAboveV[ask.unit === 'V DC' ? 'V DC' : 'V AC'] ? 'live' : 'not-dead';
}

const isRead = ({ kind }: Supply, { unit }: ReadingAsk): boolean => (kind === 'dc') === (unit === 'V DC');

/**
 * The supply the reading looks like, nearest first; undefined when it reaches 80 % of none.
 * AC or DC makes no difference: a meter on the wrong function shows a live supply all the same.
 */
export function supplyStillOn(panel: Panel, ask: ReadingAsk, value: number): Supply | undefined {
  const V = Math.abs(value);
  const near = panel.supplies
    .filter((supply) => V >= stillOnShare * supply.V - rounding)
    .sort((a, b) => Number(isRead(b, ask)) - Number(isRead(a, ask)) || Math.abs(a.V - V) - Math.abs(b.V - V));
  return near.find((supply) => supply.tag === ask.dead?.supply) ?? near[0];
}
