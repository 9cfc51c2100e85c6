/** Which signal word a live place earns: above extra-low voltage it will kill, below it could burn. */
import type { Supply } from '../panel/panelSchema';
import { say, type Text } from '../panel/says';
import type { Warning } from './types';

/** Touch is taken to kill above 25 V AC or 60 V DC (isolation.md §3, bands); an unknown kind counts as AC. */
export const isDangerous = (V: number, kind: 'dc' | 'ac1' | 'ac3' | undefined): boolean =>
  V > (kind === 'dc' ? 60 : 25);

/** Readings on a supply above extra-low voltage are taken next to what kills; an unknown supply counts as one. */
export const liveMeasuring = (supply: Supply | undefined): Warning[] =>
  supply?.extraLow === 'SELV' || supply?.extraLow === 'PELV'
    ? []
    : [{ signal: 'danger', says: say('checklist.warning.live-measuring', { V: supply?.V ?? '?' }) }];

export const staysLive = (place: Text, V: number, kind: 'dc' | 'ac1' | 'ac3' | undefined): Warning =>
  isDangerous(V, kind)
    ? { signal: 'danger', says: say('checklist.warning.stays-live', { place, V }) }
    : { signal: 'caution', says: say('checklist.warning.stays-live-low', { place, V }) };
