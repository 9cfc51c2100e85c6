import { useId } from 'react';
import { loopDiagram, type LoopOptions } from '../../shared/diagram/loopDiagram';
import { loopWords } from '../../shared/diagram/loopWords';
import type { Panel } from '../../shared/panel/panelSchema';
import { useWords } from '../components/words';
import { Shape } from './Shape';

interface LoopDiagramProps extends LoopOptions {
  panel: Panel;
  /** Address of the point. */
  point: string;
}

/** The computed loop of one point as a picture; `mark` names the conductor drawn thick. */
export function LoopDiagram({ panel, point, ...options }: LoopDiagramProps) {
  const { say } = useWords();
  const words = useId();
  const picture = loopDiagram(panel, point, options);
  if (!picture) return <p>{say(loopWords(panel, point))}</p>;
  return (
    <figure className="m-0 my-2">
      <svg
        role="img"
        aria-labelledby={words}
        viewBox={`0 0 ${picture.width} ${picture.height}`}
        className="block h-auto w-full max-w-[35rem]"
      >
        <title id={words}>{say(loopWords(panel, point))}</title>
        {picture.shapes.map((shape, index) => (
          <Shape key={index} shape={shape} />
        ))}
      </svg>
      <figcaption className="text-muted">{picture.notes.map((note) => say(note)).join(' ')}</figcaption>
    </figure>
  );
}
