/** The PDF of a sealed record: A4 or Letter, embedded faces, tagged, in the language it was signed in, no content from outside. */
import PDFDocument from 'pdfkit';
import { exceptionsSection } from './exceptionsSection';
import { headSection } from './headSection';
import { Pen, type Pdf } from './pen';
import { photosSection, pointsSection, rowCount } from './pointsSection';
import type { Printing, RecordToPrint } from './printed';
import { recordWords } from './recordWords';
import { sealSection, signaturesSection } from './sealSection';
import { margin, Sheet } from './sheet';
import { deadTestSection, lockOutSection } from './tablesSection';
import { titleBlocks } from './titleBlocks';

const sections: readonly ((printing: Printing) => void | Promise<void>)[] = [
  headSection,
  exceptionsSection,
  lockOutSection,
  deadTestSection,
  pointsSection,
  photosSection,
  signaturesSection,
  sealSection,
  titleBlocks,
];

function bytesOf(pdf: Pdf): Promise<Buffer> {
  return new Promise((resolve, reject) => {
    const parts: Buffer[] = [];
    pdf.on('data', (part: Buffer) => parts.push(part));
    pdf.on('end', () => resolve(Buffer.concat(parts)));
    pdf.on('error', reject);
    pdf.end();
  });
}

export async function recordPdf(record: RecordToPrint): Promise<Buffer> {
  const { document, number, digest, sealedAt } = record;
  const words = recordWords(document);
  const pdf = new PDFDocument({
    // The paper of the place whose rules the panel follows: common practice, no source.
    size: record.panel.practice === 'NFPA 79' ? 'LETTER' : 'A4',
    margin,
    // Text is placed by hand: without this a line near the foot would begin a page of its own.
    margins: { top: margin, left: margin, right: margin, bottom: 0 },
    bufferPages: true,
    pdfVersion: '1.7',
    tagged: true,
    lang: document.language,
    displayTitle: true,
    info: {
      Title: words.t('records.title', { number, tag: document.panel.tag }),
      Author: document.site.name,
      Creator: 'Coldloop',
      Producer: 'Coldloop',
      // Outside the compressed streams, so that a verifier finds it without reading pages.
      Keywords: digest,
      CreationDate: sealedAt,
      ModDate: sealedAt,
    },
  });
  const sheet = new Sheet(new Pen(pdf), rowCount(document));
  const printing: Printing = { ...record, sheet, words };
  for (const section of sections) await section(printing);
  return bytesOf(pdf);
}
