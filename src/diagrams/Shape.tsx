import { fitTag } from '../../shared/diagram/fitLabel';
import type { Fill, Label, Primitive, Weight } from '../../shared/diagram/primitives';
import { useWords } from '../components/words';

const strokes: Record<Weight, number> = { thin: 1.25, wire: 2.25, thick: 6 };
const fills: Record<Fill, string> = { none: 'none', sheet: 'var(--sheet)', ink: 'var(--ink)' };
const tones: Record<Label['tone'], string> = {
  ink: 'var(--ink)',
  muted: 'var(--muted)',
  onInk: 'var(--paper)',
};

function LabelShape({ label }: { label: Label }) {
  const { say } = useWords();
  const words = 'words' in label.says;
  const fitted =
    'words' in label.says
      ? { text: say(label.says.words), size: label.size }
      : fitTag(label.says.tag, label.size, label.room);
  return (
    <text
      x={label.x}
      y={label.y}
      textAnchor={label.anchor}
      fontSize={fitted.size}
      fontFamily={words ? 'var(--font-sans)' : 'var(--font-mono)'}
      fontWeight={label.bold ? 700 : 400}
      fill={tones[label.tone]}
    >
      {fitted.text}
    </text>
  );
}

/** One line, shape or text of a picture, as ink on paper. */
export function Shape({ shape }: { shape: Primitive }) {
  if (shape.kind === 'label') return <LabelShape label={shape} />;
  const ink = { stroke: 'var(--ink)', strokeWidth: strokes[shape.weight] };
  switch (shape.kind) {
    case 'line':
      return (
        <polyline
          {...ink}
          points={shape.through.map((place) => place.join(',')).join(' ')}
          fill="none"
          strokeLinejoin="miter"
          {...(shape.dashed ? { strokeDasharray: '5 4' } : {})}
        />
      );
    case 'rect': {
      const { x, y, width, height } = shape;
      const dash = shape.dashed ? { strokeDasharray: '5 4' } : {};
      return <rect {...ink} {...dash} x={x} y={y} width={width} height={height} fill={fills[shape.fill]} />;
    }
    case 'circle':
      return <circle {...ink} cx={shape.x} cy={shape.y} r={shape.r} fill={fills[shape.fill]} />;
    case 'polygon':
      return (
        <polygon
          {...ink}
          points={shape.corners.map((place) => place.join(',')).join(' ')}
          fill={fills[shape.fill]}
        />
      );
  }
}
