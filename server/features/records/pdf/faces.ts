/** The embedded faces of a record, and which of them can show a word. */
import { createRequire } from 'node:module';

const require = createRequire(import.meta.url);
const atkinson = (weight: 400 | 700) =>
  require.resolve(
    `@fontsource/atkinson-hyperlegible-next/files/atkinson-hyperlegible-next-latin-${weight}-normal.woff`,
  );
const dejavu = (name: string) => require.resolve(`dejavu-fonts-ttf/ttf/${name}.ttf`);

export type Face = 'words' | 'bold' | 'tag' | 'tagBold' | 'signs' | 'signsBold';

/** Tags stand in a monospaced face that keeps 0 and O apart; `signs` shows Ω µ ≤ ≥ → ✓ Δ and what the first face lacks. */
export const faceFiles: Record<Face, string> = {
  words: atkinson(400),
  bold: atkinson(700),
  tag: dejavu('DejaVuSansMono'),
  tagBold: dejavu('DejaVuSansMono-Bold'),
  signs: dejavu('DejaVuSans'),
  signsBold: dejavu('DejaVuSans-Bold'),
};

/** Basic Latin, Latin-1 and the marks of the `latin` subset of the first face; everything else goes to the second. */
const shownByFirst =
  /^[\u0020-\u007e\u00a0-\u00ac\u00ae-\u00b4\u00b6-\u00ff\u0131\u0152\u0153\u02c6\u02da\u02dc\u2013\u2014\u2018-\u201a\u201c-\u201e\u2022\u2026\u2039\u203a\u20ac]*$/;
const second: Partial<Record<Face, Face>> = { words: 'signs', bold: 'signsBold' };

/** The face for a word: the wished one, or the one that has its signs. */
export const faceFor = (word: string, wished: Face): Face =>
  shownByFirst.test(word) ? wished : (second[wished] ?? wished);
