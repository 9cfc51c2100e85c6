/** The geometry of shared/diagram as vectors in a PDF. */
import { fitTag } from '../../../../shared/diagram/fitLabel';
import type { Fill, Label, Primitive, Weight } from '../../../../shared/diagram/primitives';
import type { Text } from '../../../../shared/panel/says';
import { ink, muted, type Pen, type Written } from './pen';

const strokes: Record<Weight, number> = { thin: 1.25, wire: 2.25, thick: 6 };
const colours: Record<Label['tone'], string> = { ink, muted, onInk: '#ffffff' };
const fills: Record<Exclude<Fill, 'none'>, string> = { sheet: '#ffffff', ink };

function label(pen: Pen, shape: Label, say: (text: Text) => string): void {
  const fitted =
    'words' in shape.says
      ? { text: say(shape.says.words), size: shape.size }
      : fitTag(shape.says.tag, shape.size, shape.room);
  const face = 'words' in shape.says ? 'words' : shape.bold ? 'tagBold' : 'tag';
  const written: Written = { face, size: fitted.size, colour: colours[shape.tone] };
  const lines = pen.lines(fitted.text, 1000, written);
  const width = pen.width(fitted.text, written);
  const shift = { start: 0, middle: width / 2, end: width }[shape.anchor];
  pen.draw(lines, shape.x - shift, shape.y - fitted.size, written);
}

/** Traces the shape; painting it is the caller's. */
function trace({ pdf }: Pen, shape: Exclude<Primitive, Label>): void {
  switch (shape.kind) {
    case 'line':
      shape.through.forEach(([x, y], index) => (index === 0 ? pdf.moveTo(x, y) : pdf.lineTo(x, y)));
      return;
    case 'polygon':
      shape.corners.forEach(([x, y], index) => (index === 0 ? pdf.moveTo(x, y) : pdf.lineTo(x, y)));
      pdf.closePath();
      return;
    case 'rect':
      pdf.rect(shape.x, shape.y, shape.width, shape.height);
      return;
    case 'circle':
      pdf.circle(shape.x, shape.y, shape.r);
  }
}

function paint(pen: Pen, shape: Exclude<Primitive, Label>): void {
  const { pdf } = pen;
  pdf.lineWidth(strokes[shape.weight]).strokeColor(ink);
  if ('dashed' in shape && shape.dashed) pdf.dash(5, { space: 4 });
  else pdf.undash();
  trace(pen, shape);
  if (shape.kind === 'line' || shape.fill === 'none') pdf.stroke();
  else pdf.fillAndStroke(fills[shape.fill], ink);
  pdf.undash();
}

/** Draws shapes with their plane's origin at (x, y), in a scale. */
export function drawShapes(
  pen: Pen,
  shapes: readonly Primitive[],
  place: { x: number; y: number; scale: number },
  say: (text: Text) => string,
): void {
  pen.pdf.save();
  pen.pdf.translate(place.x, place.y).scale(place.scale);
  for (const shape of shapes) {
    if (shape.kind === 'label') label(pen, shape, say);
    else paint(pen, shape);
  }
  pen.pdf.restore();
}
