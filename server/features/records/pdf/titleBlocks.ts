/** The title block at the lower right of every page, once the number of pages is known. */
import { ink, muted } from './pen';
import type { Printing } from './printed';
import { footRoom, margin } from './sheet';

export function titleBlocks({ sheet, words: { t }, document, number }: Printing): void {
  const { pdf, pen } = sheet;
  const { start, count } = pdf.bufferedPageRange();
  const { panel, job } = document;
  for (let page = 0; page < count; page += 1) {
    pdf.switchToPage(start + page);
    const cells: [string, string][] = [
      [t('office.panel'), panel.tag],
      [t('office.panel.drawing'), `${panel.drawing.number} ${panel.drawing.revision}`],
      [t('office.job'), job.number],
      [t('office.record'), String(number)],
      [t('records.pdf.page'), t('records.pdf.pageOf', { n: page + 1, of: count })],
    ];
    const width = 74;
    const height = 30;
    const y = pdf.page.height - margin - footRoom + 20;
    const left = pdf.page.width - margin - cells.length * width;
    pdf.markContent('Artifact', { type: 'Pagination' });
    cells.forEach(([name, value], index) => {
      const x = left + index * width;
      pdf.rect(x, y, width, height).lineWidth(0.8).strokeColor(ink).stroke();
      pen.draw(pen.lines(name, 200, { size: 6.5 }), x + 5, y + 3, { size: 6.5, colour: muted });
      const size = value.length > 12 ? 6.5 : 9;
      pen.draw(pen.lines(value, width - 8, { face: 'tagBold', size }).slice(0, 2), x + 5, y + 13, {
        face: 'tagBold',
        size,
      });
    });
    pdf.endMarkedContent();
  }
}
