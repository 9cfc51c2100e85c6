/** Which signal word a live place earns: above extra-low voltage it will kill, below it could burn. */
import { say, type Text } from '../panel/says';
import type { Warning } from './types';

/** Touch is taken to kill above 25 V AC or 60 V DC (isolation.md §3, bands); an unknown kind counts as AC. */
export const isDangerous = (V: number, kind: 'dc' | 'ac1' | 'ac3' | undefined): boolean =>
  V > (kind === 'dc' ? 60 : 25);

export const staysLive = (place: Text, V: number, kind: 'dc' | 'ac1' | 'ac3' | undefined): Warning =>
  isDangerous(V, kind)
    ? { signal: 'danger', says: say('checklist.warning.stays-live', { place, V }) }
    : { signal: 'caution', says: say('checklist.warning.stays-live-low', { place, V }) };
