/** Lifted wires, jumpers and earths: each is entered when made and again when put right. */
import type { View } from './view';

export const temporariesLeft = (view: View): View['temporaries'] =>
  view.temporaries.filter(
    ({ placed, removedBy }) => placed.known.body.removes === undefined && removedBy.length === 0,
  );
