/** What people said on the job: steps sent back, answers chosen, drawings that differ, notes. */
import type { RecordDocument } from '../../../../shared/api/recordDocument';
import type { Reader } from './reader';

const titleOf = ({ folded, say }: Reader, id: string): string => {
  const step = folded.pack.checklist.steps.find((each) => each.id === id);
  return step ? say(step.title) : id;
};

export const returned = (reader: Reader): RecordDocument['returned'] =>
  reader.folded.state.returns.flatMap(({ person, at, steps }) =>
    steps.map(({ step, words }) => ({
      shown: titleOf(reader, step),
      words,
      person: reader.nameOf(person),
      at,
    })),
  );

export const chosen = (reader: Reader): RecordDocument['chosen'] =>
  reader.folded.state.chosen.map(({ person, at, body }) => ({
    shown: titleOf(reader, body.step),
    words: body.words,
    person: reader.nameOf(person),
    at,
  }));

export const drawingDiffers = ({ folded, nameOf }: Reader): RecordDocument['drawingDiffers'] =>
  folded.state.drawingDiffers.map(({ person, at, body }) => ({
    words: body.proposed === undefined ? body.says : `${body.says} (${body.proposed})`,
    person: nameOf(person),
    at,
  }));

export const notes = ({ folded, nameOf }: Reader): RecordDocument['notes'] =>
  folded.state.notes.map(({ person, at, words }) => ({ words, person: nameOf(person), at }));
