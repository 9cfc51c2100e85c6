import { useEffect, useRef } from 'react';
import Pad from 'signature_pad';
import { strokesOf, type Stroke } from './strokes';
import { useWords } from '../words';
import { FieldButton } from './FieldButton';

interface SignaturePadProps {
  label: string;
  strokes: Stroke[];
  onChange: (strokes: Stroke[]) => void;
}

/** Puts the strokes back at the canvas' present size: strokes are kept as fractions of the width, so turning the phone loses none. */
function redraw(pad: Pad, canvas: HTMLCanvasElement, strokes: Stroke[]) {
  const ratio = Math.max(window.devicePixelRatio, 1);
  canvas.width = canvas.offsetWidth * ratio;
  canvas.height = canvas.offsetHeight * ratio;
  canvas.getContext('2d')?.scale(ratio, ratio);
  pad.fromData(
    strokes.map((stroke) => ({
      dotSize: 0,
      minWidth: 0.8,
      maxWidth: 3,
      penColor: getComputedStyle(canvas).color,
      velocityFilterWeight: 0.7,
      compositeOperation: 'source-over' as const,
      points: stroke.map(([x, y, pressure], time) => ({
        x: x * canvas.offsetWidth,
        y: y * canvas.offsetWidth,
        pressure,
        time: time * 16,
      })),
    })),
  );
}

/** Draws with finger or pen, pressure kept; undo and clear. */
export function SignaturePad({ label, strokes, onChange }: SignaturePadProps) {
  const { t } = useWords();
  const canvas = useRef<HTMLCanvasElement>(null);
  const latest = useRef({ strokes, onChange });
  const redrawNow = useRef<() => void>(() => undefined);
  useEffect(() => {
    latest.current = { strokes, onChange };
  });
  useEffect(() => {
    const element = canvas.current;
    if (!element) return;
    const pad = new Pad(element, { penColor: getComputedStyle(element).color, minWidth: 0.8, maxWidth: 3 });
    const keep = () => {
      latest.current.onChange(strokesOf(pad.toData(), element.offsetWidth));
    };
    redrawNow.current = () => {
      redraw(pad, element, latest.current.strokes);
    };
    const observer = new ResizeObserver(redrawNow.current);
    observer.observe(element);
    pad.addEventListener('endStroke', keep);
    return () => {
      observer.disconnect();
      pad.removeEventListener('endStroke', keep);
      pad.off();
    };
  }, []);
  const change = (next: Stroke[]) => {
    latest.current.strokes = next;
    onChange(next);
    redrawNow.current();
  };
  return (
    <div className="grid gap-2">
      <canvas
        ref={canvas}
        role="img"
        aria-label={label}
        className="h-44 w-full touch-none border-[3px] border-ink bg-sheet text-ink landscape:h-[min(11rem,50dvh)]"
      />
      <div className="flex flex-wrap gap-2 [&>*]:flex-1">
        <FieldButton
          disabled={strokes.length === 0}
          onClick={() => {
            change(strokes.slice(0, -1));
          }}
        >
          {t('field.sign.undoStroke')}
        </FieldButton>
        <FieldButton
          disabled={strokes.length === 0}
          onClick={() => {
            change([]);
          }}
        >
          {t('field.sign.clear')}
        </FieldButton>
      </div>
    </div>
  );
}
