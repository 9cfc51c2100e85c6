/** What was done and read at each point, with the loop of a point that has an exception; then the steps of no point. */
import { setImmediate } from 'node:timers/promises';
import type { RecordDocument } from '../../../../shared/api/recordDocument';
import { loopDiagram } from '../../../../shared/diagram/loopDiagram';
import { loopWords } from '../../../../shared/diagram/loopWords';
import { drawShapes } from './drawShapes';
import { muted } from './pen';
import type { Printing } from './printed';
import { margin } from './sheet';
import { Table, type Column } from './table';

type Point = RecordDocument['points'][number];
type Answer = RecordDocument['steps'][number];

/** Reading, hold or finding that was not simply in limits. */
export function hasException({ address, answers }: Point, { holds, findings }: RecordDocument): boolean {
  const steps = new Set(answers.map(({ step }) => step));
  return (
    answers.some(({ verdict }) => verdict !== 'ok') ||
    holds.some(({ step }) => steps.has(step)) ||
    findings.some(({ place }) => place.split(' ').includes(`point:${address}`))
  );
}

/** Printed at this scale, letters of 13 units are 9 points high. */
const loopScale = 0.7;

function loop({ sheet, words, panel }: Printing, address: string): void {
  const picture = loopDiagram(panel, address);
  if (!picture) return;
  const height = picture.height * loopScale;
  sheet.ensure(height + 20);
  const place = { x: margin, y: sheet.y, scale: loopScale };
  sheet.tagged(
    'Figure',
    () => drawShapes(sheet.pen, picture.shapes, place, words.say),
    undefined,
    words.say(loopWords(panel, address)),
  );
  sheet.y += height + 4;
  const notes = picture.notes.map(words.say).join(' ');
  if (notes) sheet.paragraph(notes, { size: 8, colour: muted });
}

const columns = ({ words: { t } }: Printing): Column[] => [
  { head: t('records.step'), share: 40 },
  { head: t('records.found'), share: 19, written: { face: 'bold' } },
  { head: t('records.verdict'), share: 11 },
  { head: t('records.person'), share: 14 },
  { head: t('records.at'), share: 16 },
];

/** A later round is named with the time, since most answers are of the first. */
const cells = ({ words: { t, at } }: Printing, answer: Answer): string[] => [
  answer.shown,
  answer.answer,
  t(`records.verdict.${answer.verdict}`),
  answer.person,
  answer.round > 1 ? `${at(answer.at)}, ${t('records.roundN', { n: answer.round })}` : at(answer.at),
];

function answers(printing: Printing, given: readonly Answer[]): void {
  const table = new Table(printing.sheet, columns(printing));
  for (const answer of given) table.row(cells(printing, answer));
  table.end();
}

const headingOf = ({ terminal, address, description }: Point): string =>
  `${terminal}  ${address}  ${description}`;

function point(printing: Printing, each: Point): void {
  const { sheet, document } = printing;
  sheet.heading(headingOf(each), 3);
  if (hasException(each, document)) loop(printing, each.address);
  if (each.answers.length > 0) answers(printing, each.answers);
}

/** How many rows the record's tables have. */
export const rowCount = ({ points, steps, deadTests, lockOut }: RecordDocument): number =>
  points.reduce((sum, each) => sum + each.answers.length, 0) +
  steps.length +
  deadTests.length +
  lockOut.length;

/** So many points are written before other requests get their turn: about 50 ms. */
const pointsAtOnce = 10;

export async function pointsSection(printing: Printing): Promise<void> {
  const { sheet, words, document } = printing;
  sheet.heading(words.t('office.points'), 2);
  for (const [index, each] of document.points.entries()) {
    if (index % pointsAtOnce === 0) await setImmediate();
    point(printing, each);
  }
  sheet.heading(words.t('records.otherSteps', { n: document.steps.length }), 2);
  answers(printing, document.steps);
}

export const photosSection = ({ sheet, words: { t, at }, document }: Printing): void => {
  if (document.photos.length === 0) return;
  sheet.heading(t('records.photos'), 2);
  for (const photo of document.photos)
    sheet.paragraph([photo.shown, photo.person, at(photo.at), photo.sha256].filter(Boolean).join(', '), {
      size: 8,
    });
};
