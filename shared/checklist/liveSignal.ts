/** Which signal word a live place earns: above extra-low voltage it will kill, below it could burn. */
import type { Supply } from '../panel/panelSchema';
import { say, type Text } from '../panel/says';
import type { Warning } from './types';

/** Touch is taken to kill above 25 V AC or 60 V DC (isolation.md §3, bands); an unknown kind counts as AC. */
export const isDangerous = (V: number, kind: 'dc' | 'ac1' | 'ac3' | undefined): boolean =>
  V > (kind === 'dc' ? 60 : 25);

// The file format allows a tolerance of +100 % at most: what an unstated one has to be taken for.
const unstatedMaxPct = 100;

/** The label alone says nothing: a circuit called SELV that carries more volts than touch bears is as live as the rest. */
const isHarmless = ({ extraLow, kind, V, tolerance }: Supply): boolean =>
  extraLow !== 'none' && !isDangerous(V * (1 + (tolerance?.maxPct ?? unstatedMaxPct) / 100), kind);

/** Readings on a supply above extra-low voltage are taken next to what kills; an unknown supply counts as one. */
export const liveMeasuring = (supply: Supply | undefined): Warning[] =>
  supply && isHarmless(supply)
    ? []
    : [{ signal: 'danger', says: say('checklist.warning.live-measuring', { V: supply?.V ?? '?' }) }];

export const staysLive = (place: Text, V: number, kind: 'dc' | 'ac1' | 'ac3' | undefined): Warning =>
  isDangerous(V, kind)
    ? { signal: 'danger', says: say('checklist.warning.stays-live', { place, V }) }
    : { signal: 'caution', says: say('checklist.warning.stays-live-low', { place, V }) };
