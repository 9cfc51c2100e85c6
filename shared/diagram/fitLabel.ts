/** Keeps a label in its room: smaller letters first, then a cut with an ellipsis; the text alternative says it whole. */

/** Advance of one letter of the monospaced face, in parts of its size (Atkinson Hyperlegible Mono: 632 of 1000 units). */
const monoAdvance = 0.632;
const smallest = 10;

export function fitTag(text: string, size: number, room: number | undefined): { text: string; size: number } {
  if (room === undefined || text.length * size * monoAdvance <= room) return { text, size };
  const fitting = room / (text.length * monoAdvance);
  if (fitting >= smallest) return { text, size: fitting };
  const letters = Math.max(2, Math.floor(room / (smallest * monoAdvance)));
  return { text: `${text.slice(0, letters - 1)}…`, size: smallest };
}
