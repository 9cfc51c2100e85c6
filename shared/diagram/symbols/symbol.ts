/** A symbol stands on a vertical conductor: its drawing, and how far it reaches above and below its middle. */
import { line, type Place, type Primitive } from '../primitives';

export interface Symbol {
  half: number;
  /** `down`: the conventional current runs from top to bottom (what a diode or arrow shows). */
  draw: (at: Place, down: boolean) => Primitive[];
}

/** Symbols one below the other from `from` to `to` on the line x, joined by conductors; in the order they are met from the top. */
export function chain(x: number, from: number, to: number, symbols: Symbol[], down: boolean): Primitive[] {
  const gap = (to - from) / symbols.length;
  const places = symbols.map((symbol, index) => ({ symbol, y: from + gap * (index + 0.5) }));
  const ends = [from, ...places.flatMap(({ symbol, y }) => [y - symbol.half, y + symbol.half]), to];
  const joins = ends.flatMap((y, index) =>
    index % 2 === 0 ? [line('wire', [x, y], [x, ends[index + 1] ?? y])] : [],
  );
  return [...joins, ...places.flatMap(({ symbol, y }) => symbol.draw([x, y], down))];
}
