/** A drawn signature as vectors, or the name that was typed instead. */
import type { z } from 'zod';
import type { signaturePicture } from '../../../../shared/job/entry';
import { ink, type Pen } from './pen';

export interface Box {
  x: number;
  y: number;
  width: number;
  height: number;
}
type Picture = z.infer<typeof signaturePicture>;
type Strokes = Extract<Picture, { strokes: unknown }>['strokes'];

const least = (a: number, b: number): number => Math.min(a, b);
const most = (a: number, b: number): number => Math.max(a, b);

/** Scale that brings every stroke into the box, keeping its shape, whatever unit the pad measured in. */
function fit(strokes: Strokes, { width, height }: Box) {
  const xs = strokes.flat().map(([x]) => x);
  const ys = strokes.flat().map(([, y]) => y);
  const bound = (values: number[], pick: (a: number, b: number) => number) =>
    values.reduce(pick, values[0] ?? 0);
  const left = bound(xs, least);
  const top = bound(ys, least);
  const wide = Math.max(bound(xs, most) - left, 1e-6);
  const high = Math.max(bound(ys, most) - top, 1e-6);
  return { left, top, scale: Math.min(width / wide, height / high) };
}

function drawStrokes({ pdf }: Pen, strokes: Strokes, box: Box): void {
  const { left, top, scale } = fit(strokes, box);
  pdf.lineWidth(1.1).strokeColor(ink).lineCap('round').lineJoin('round');
  for (const stroke of strokes) {
    const places = stroke.map(([x, y]) => [box.x + (x - left) * scale, box.y + (y - top) * scale] as const);
    places.forEach(([x, y], index) => (index === 0 ? pdf.moveTo(x, y) : pdf.lineTo(x, y)));
    // A single touch is a dot: a line of no length with round ends.
    const [first] = places;
    if (places.length === 1 && first) pdf.lineTo(first[0], first[1]);
    pdf.stroke();
  }
  pdf.lineCap('butt').lineJoin('miter');
}

export function drawSignature(pen: Pen, picture: Picture, box: Box): void {
  if ('strokes' in picture) drawStrokes(pen, picture.strokes, box);
  else {
    const written = { size: 15 };
    pen.draw(pen.lines(picture.typed, box.width, written), box.x, box.y + box.height - 20, written);
  }
}
