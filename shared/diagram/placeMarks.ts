/** Signs in the picture where a finding is; what each sign says stands beside the picture. */
import { railAt, x, type Frame } from './frame';
import { circle, tagLabel, type Place, type Primitive } from './primitives';

export interface PlaceMark {
  at: 'point' | 'terminal' | 'group' | 'module' | 'supply';
  /** One or two letters, as in the list of findings. */
  sign: string;
}

function placeOf(at: PlaceMark['at'], frame: Frame): Place {
  const { signal, columnSide } = frame;
  switch (at) {
    case 'point':
      return [x.field - 52, signal - 28];
    case 'terminal':
      return [x.terminal + 24, signal - columnSide * 18];
    case 'group':
      return [x.column - 38, railAt(frame, columnSide) - columnSide * 24];
    case 'module':
      return [x.column + 30, signal + columnSide * 62];
    case 'supply':
      return [x.field - 16, frame.railTop ? frame.top : frame.bottom];
  }
}

/** Several at one place stand side by side. */
export function placeMarks(frame: Frame, marks: readonly PlaceMark[]): Primitive[] {
  return marks.flatMap((mark, index) => {
    const before = marks.slice(0, index).filter(({ at }) => at === mark.at).length;
    const [left, y] = placeOf(mark.at, frame);
    const at: Place = [left - before * 22, y];
    return [
      circle(at, 10, 'ink'),
      tagLabel([at[0], at[1] + 4], mark.sign, {
        anchor: 'middle',
        size: 12,
        bold: true,
        tone: 'onInk',
        room: 18,
      }),
    ];
  });
}
