/** What people wrote beside their answers. */
import type { JobState } from '../types';
import { isOf, type Placed } from '../order/placed';
import type { View } from '../view/view';

const from = ({ entry, person }: Placed) => ({ entry: entry.id, person, at: entry.at });

export const notes = (placed: readonly Placed[]): JobState['notes'] =>
  placed.flatMap((each) => (isOf(each, 'note') ? [{ ...from(each), words: each.known.body.words }] : []));

export const drawingDiffers = (placed: readonly Placed[]): JobState['drawingDiffers'] =>
  placed.flatMap((each) => (isOf(each, 'drawing-differs') ? [{ ...from(each), body: each.known.body }] : []));

export const temporaries = (view: View): JobState['temporaries'] =>
  view.temporaries.map(({ placed, removedBy }) => ({
    entry: placed.entry.id,
    body: placed.known.body,
    ...(removedBy[0] && { removedBy: removedBy[0].person }),
  }));

export const returns = ({ returned }: View): JobState['returns'] =>
  returned.map((each) => ({ ...from(each), steps: each.known.body.steps }));

export const choices = ({ chosen }: View): JobState['chosen'] =>
  [...chosen.values()]
    .flat()
    .sort((a, b) => a.at - b.at)
    .map((each) => ({ ...from(each), body: each.known.body }));
