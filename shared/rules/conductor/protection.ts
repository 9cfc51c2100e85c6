/** The fuses and breakers in series with a point, from the terminal back to the supply. */
import type { Fuse } from '../../panel/device';
import type { PointPlace } from '../context';

export interface Protection {
  A: number;
  kind?: Fuse['kind'];
  at: 'point' | 'group' | 'supply';
  /** The field that states it. */
  path: string;
  tag: string;
}

/** Nearest first. The supply's own protection limits by its maker's means, so no fuse characteristic is asked of it. */
export function protections({ point, path, group, supply }: PointPlace): Protection[] {
  const fuses: Protection[] = [];
  const add = (fuse: Fuse | undefined, at: 'point' | 'group', of: string, name: string) => {
    if (fuse) fuses.push({ ...fuse, at, path: `${of}.fuse`, tag: fuse.tag ?? name });
  };
  add(point.fuse, 'point', path, point.address);
  if (group) add(group.group.fuse, 'group', group.path, group.group.tag);
  if (supply?.protectionA !== undefined)
    fuses.push({
      A: supply.protectionA,
      kind: 'breaker',
      at: 'supply',
      path: `supplies.${supply.tag}.protectionA`,
      tag: supply.tag,
    });
  return fuses;
}

/** The smallest in series protects; undefined where none is stated. */
export const smallest = (fuses: Protection[]): Protection | undefined =>
  fuses.reduce<Protection | undefined>((least, one) => (least && least.A <= one.A ? least : one), undefined);
