/** What opens and closes a circuit: contact, transistor, triac, in the style of IEC 60617. */
import { circle, line, polygon, type Place, type Primitive } from '../primitives';
import type { Symbol } from './symbol';

export const contact: Symbol = {
  half: 16,
  draw: ([x, y]) => [line('wire', [x, y + 16], [x - 13, y - 12])],
};

/** A small filled triangle at `tip`, pointing along (dx, dy), a unit vector. */
export function arrowHead([x, y]: Place, [dx, dy]: Place, size = 8): Primitive {
  const back: Place = [x - dx * size, y - dy * size];
  const wide = size * 0.55;
  return polygon(
    'ink',
    [x, y],
    [back[0] - dy * wide, back[1] + dx * wide],
    [back[0] + dy * wide, back[1] - dx * wide],
  );
}

/** NPN: the emitter's arrow leaves the base; PNP: it points to it. The emitter is where the current leaves (NPN) or enters (PNP). */
function transistor(kind: 'npn' | 'pnp'): Symbol {
  return {
    half: 18,
    draw: ([x, y], down) => {
      const emitterBelow = (kind === 'npn') === down;
      const end: Place = [x, y + (emitterBelow ? 18 : -18)];
      const base: Place = [x - 14, y + (emitterBelow ? 6 : -6)];
      const length = Math.hypot(end[0] - base[0], end[1] - base[1]);
      const out: Place = [(end[0] - base[0]) / length, (end[1] - base[1]) / length];
      const tip: Place = kind === 'npn' ? end : base;
      const along: Place = kind === 'npn' ? out : [-out[0], -out[1]];
      return [
        line('wire', [x - 14, y - 12], [x - 14, y + 12]),
        line('thin', [x - 24, y], [x - 14, y]),
        line('wire', [x, y - 18], [x - 14, y - 6]),
        line('wire', [x, y + 18], [x - 14, y + 6]),
        arrowHead(tip, along),
      ];
    },
  };
}
export const npn = transistor('npn');
export const pnp = transistor('pnp');

export const triac: Symbol = {
  half: 12,
  draw: ([x, y]) => [
    line('wire', [x - 14, y - 12], [x + 14, y - 12]),
    line('wire', [x - 14, y + 12], [x + 14, y + 12]),
    polygon('none', [x - 13, y - 12], [x - 1, y - 12], [x - 7, y + 12]),
    polygon('none', [x + 1, y + 12], [x + 13, y + 12], [x + 7, y - 12]),
    line('thin', [x - 8, y + 12], [x - 20, y + 18]),
  ],
};

/** A switch whose inside the panel file does not tell. */
export const anySwitch: Symbol = {
  half: 16,
  draw: ([x, y]) => [circle([x, y], 16), line('wire', [x - 9, y + 9], [x + 9, y - 9])],
};
