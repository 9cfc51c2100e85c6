/** Signature strokes as the entry keeps them: [x, y, pressure], positions as fractions of the pad's width. */
export type Stroke = [number, number, number][];

interface DrawnStroke {
  points: { x: number; y: number; pressure: number }[];
}

// Four decimals of the pad's width are finer than a finger and keep the entry well under its 64 kB.
const rounded = (value: number): number => Math.round(value * 10_000) / 10_000;

/** @param width of the pad in CSS pixels. */
export const strokesOf = (drawn: DrawnStroke[], width: number): Stroke[] =>
  drawn
    .filter((stroke) => stroke.points.length > 0)
    .map((stroke) =>
      stroke.points.map(({ x, y, pressure }): [number, number, number] => [
        rounded(x / width),
        rounded(y / width),
        rounded(pressure),
      ]),
    );
