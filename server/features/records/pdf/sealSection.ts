/** The signatures with their meaning, and the record's place in the chain. */
import type { RecordDocument } from '../../../../shared/api/recordDocument';
import { ink, muted } from './pen';
import type { Printing } from './printed';
import { drawQr } from './qr';
import { margin } from './sheet';
import { drawSignature } from './signaturePicture';
import { table } from './table';

type Signature = RecordDocument['signatures'][number];
const pictureBox = { width: 150, height: 54 };
const boxHeight = 84;

function signature({ sheet, words: { t, at } }: Printing, signed: Signature): void {
  sheet.ensure(boxHeight);
  const { y, pen } = sheet;
  sheet.artifact(() =>
    sheet.pdf
      .rect(margin, y, sheet.width, boxHeight - 6)
      .lineWidth(0.8)
      .strokeColor(ink)
      .stroke(),
  );
  sheet.tagged(
    'Figure',
    () => drawSignature(pen, signed.picture, { x: margin + 10, y: y + 12, ...pictureBox }),
    undefined,
    t('records.pdf.signatureOf', { name: signed.name }),
  );
  const x = margin + pictureBox.width + 26;
  const room = sheet.width - pictureBox.width - 36;
  const lines = [
    { text: `${signed.name}, ${t(`records.kind.${signed.kind}`)}`, written: { face: 'bold', size: 10 } },
    { text: `“${signed.meaning}”`, written: { size: 9 } },
    { text: `${at(signed.at)} (${signed.zone})`, written: { size: 8.5 } },
    { text: signed.digest, written: { face: 'tag', size: 6.5, colour: muted } },
  ] as const;
  let top = y + 7;
  for (const { text, written } of lines) {
    const wrapped = pen.lines(text, room, written);
    sheet.tagged('P', () => pen.draw(wrapped, x, top, written));
    top += wrapped.length * written.size * 1.3 + 3;
  }
  sheet.y += boxHeight;
}

export function signaturesSection(printing: Printing): void {
  printing.sheet.heading(printing.words.t('records.signatures'), 2);
  for (const signed of printing.document.signatures) signature(printing, signed);
}

function logs({ sheet, words: { t }, document }: Printing): void {
  sheet.heading(t('records.pdf.logs'), 3);
  table(
    sheet,
    [
      { head: t('records.person'), share: 22 },
      { head: t('records.pdf.entries'), share: 10 },
      { head: t('records.pdf.lastHash'), share: 68, written: { face: 'tag', size: 7 } },
    ],
    document.logs.map(({ person, seq, hash }) => [person, String(seq), hash]),
  );
}

const qrSide = 84;

export function sealSection(printing: Printing): void {
  const { sheet, words, digest, seal, previousSeal, sealedAt, verifyUrl } = printing;
  const { t, at } = words;
  sheet.heading(t('records.seal'), 2);
  logs(printing);
  sheet.ensure(qrSide + 20);
  const top = sheet.y;
  const x = sheet.pdf.page.width - margin - qrSide;
  sheet.tagged(
    'Figure',
    () => drawQr(sheet.pdf, verifyUrl, x, top + 4, qrSide),
    undefined,
    t('records.pdf.qr'),
  );
  const facts: [string, string][] = [
    [t('records.sealedAt'), at(sealedAt.toISOString())],
    [t('office.digest'), digest],
    [t('records.previousSeal'), previousSeal ?? '–'],
    [t('records.seal'), seal],
  ];
  for (const [name, value] of facts) {
    sheet.tagged('P', () => {
      sheet.pen.draw([...sheet.pen.lines(name, 300, { size: 8 })], margin, sheet.y, {
        size: 8,
        colour: muted,
      });
      sheet.pen.draw(sheet.pen.lines(value, 420, { face: 'tag', size: 8 }), margin, sheet.y + 10, {
        face: 'tag',
        size: 8,
      });
    });
    sheet.y += 23;
  }
  sheet.y = Math.max(sheet.y, top + qrSide + 8);
  sheet.paragraph(t('records.pdf.verify', { url: verifyUrl.replace(/\?.*$/, '') }), {
    size: 8,
    colour: muted,
  });
}
