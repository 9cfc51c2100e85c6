/** A QR code as vectors. */
import { create } from 'qrcode';
import { ink, type Pdf } from './pen';

/** Draws the code with its corner at (x, y), without its quiet zone: keep four modules clear around it. */
export function drawQr(pdf: Pdf, text: string, x: number, y: number, side: number): void {
  const { modules } = create(text, { errorCorrectionLevel: 'M' });
  const unit = side / modules.size;
  for (let row = 0; row < modules.size; row += 1)
    for (let column = 0; column < modules.size; column += 1)
      if (modules.get(row, column)) pdf.rect(x + column * unit, y + row * unit, unit, unit);
  pdf.fill(ink);
}
