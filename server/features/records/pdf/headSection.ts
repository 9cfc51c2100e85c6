/** The head of a record: which record, whose work, when, and which points. */
import type { RecordDocument } from '../../../../shared/api/recordDocument';
import { muted } from './pen';
import type { Printing } from './printed';

const names = ({ people }: RecordDocument, part: 'electrician' | 'foreman'): string =>
  people
    .filter((person) => person.part === part)
    .map(({ name }) => name)
    .join(', ');

export function headSection({ sheet, words, document, number }: Printing): void {
  const { t, at } = words;
  const { panel, job, times, site, amends } = document;
  sheet.heading(t('records.title', { number, tag: `${panel.tag} ${panel.name}` }), 1);
  if (amends) sheet.paragraph(t('records.pdf.amends', { number: amends.number }), { face: 'bold', size: 11 });
  sheet.facts([
    [t('app.site'), site.name],
    [t('office.job'), job.number],
    [t('office.panel'), `${panel.tag} ${panel.name}`],
    [t('office.panel.location'), panel.location],
    [t('office.panel.drawing'), `${panel.drawing.number} ${panel.drawing.revision}`],
    [t('office.panel.revision'), String(panel.revision)],
    [t('office.new.electricians'), names(document, 'electrician')],
    [t('office.new.foreman'), names(document, 'foreman')],
    [t('office.job.sentAt'), at(times.sentAt)],
    [t('records.startedAt'), at(times.startedAt)],
    [t('records.signedAt'), at(times.signedAt)],
    [t('records.countersignedAt'), at(times.countersignedAt)],
  ]);
  sheet.paragraph(t('records.pdf.times', { zone: words.zone }), { size: 8, colour: muted });
  sheet.heading(t('records.pdf.scope', { n: document.scope.length }), 3);
  sheet.paragraph(document.scope.join('  '), { face: 'tag', size: 7.5 });
  if (job.words !== null) sheet.paragraph(`${t('office.new.words')}: ${job.words}`);
}
