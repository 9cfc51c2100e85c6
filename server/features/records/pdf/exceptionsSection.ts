/** What did not go as planned: first in the record, so that nobody has to look for it. */
import { recordExceptions } from '../../../../shared/api/recordExceptions';
import type { Printing } from './printed';

type Line = readonly [what: string, words: string];

const answerLines = ({ document, words: { t, at } }: Printing): Line[] =>
  recordExceptions(document).map(({ verdict, shown, between, answer, person, at: when, then }) => [
    t(`records.verdict.${verdict}`),
    `${shown ?? `${t('records.deadTests')}, ${between?.join(' – ') ?? ''}`}: ${answer}. ${person}, ${at(when)}` +
      (then.length > 0 ? ` ${t('records.exceptions.then', { answers: then.join(', ') })}` : ''),
  ]);

const lockLines = ({ document, words: { t } }: Printing): Line[] =>
  document.lockOut
    .filter(({ removedBy }) => removedBy !== null)
    .map(({ isolator, lock, person, removedBy }) => [
      `${t('records.lock')} ${lock}`,
      `${isolator}, ${person}: ${t('records.removedBy', { name: removedBy ?? '' })}`,
    ]);

const roundLines = ({ document, words: { t, at } }: Printing): Line[] =>
  document.rounds
    .filter(({ number }) => number > 1)
    .map(({ number, words, points, person, at: when }) => [
      t('records.roundN', { n: number }),
      `${words} (${points.join(', ')}). ${person}, ${at(when)}`,
    ]);

function holdLines({ document, words: { t, at } }: Printing): Line[] {
  return document.holds.map((hold) => {
    const decided =
      hold.decidedBy === null
        ? t('records.hold.undecided')
        : t('records.hold.decided', {
            name: hold.decidedBy,
            decision: hold.decision === null ? '' : t(`records.decision.${hold.decision}`),
            words: hold.decidedWords ?? '',
          });
    return [t('records.hold'), `${hold.shown}: ${hold.words}. ${hold.person}, ${at(hold.at)}. ${decided}`];
  });
}

const findingLines = ({ document, words: { t } }: Printing): Line[] =>
  document.findings.map(({ rule, place, says, accepted }) => [
    `${rule} ${place}`,
    accepted ? `${says} ${t('office.acceptedBy', { name: accepted.by, reason: accepted.reason })}` : says,
  ]);

const saidLines = ({ document, words: { t, at } }: Printing): Line[] => [
  ...document.returned.map(({ shown, words, person, at: when }): Line => [
    t('records.returned'),
    `${shown}: ${words}. ${person}, ${at(when)}`,
  ]),
  ...document.chosen.map(({ shown, words, person, at: when }): Line => [
    t('records.chosen'),
    `${shown}: ${words}. ${person}, ${at(when)}`,
  ]),
  ...document.drawingDiffers.map(({ words, person, at: when }): Line => [
    t('records.drawingDiffers'),
    `${words}. ${person}, ${at(when)}`,
  ]),
  ...document.notes.map(({ words, person, at: when }): Line => [
    t('records.note'),
    `${words}. ${person}, ${at(when)}`,
  ]),
];

export function exceptionsSection(printing: Printing): void {
  const { sheet, words } = printing;
  sheet.heading(words.t('records.exceptions'), 2);
  const lines = [answerLines, lockLines, roundLines, holdLines, saidLines, findingLines].flatMap((of) =>
    of(printing),
  );
  if (lines.length === 0) sheet.paragraph(words.t('records.exceptions.none'));
  for (const [what, says] of lines) sheet.paragraph(`${what}  ${says}`);
}
