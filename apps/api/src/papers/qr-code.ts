import qrcode from 'qrcode';
import { ink, type Paper } from './paper.ts';

/** Draws a QR code of a text as rectangles, so that it prints sharp at any size; `size` in points. */
export function drawQrCode(
  paper: Paper,
  text: string,
  { x, y, size }: { x: number; y: number; size: number },
): void {
  const { modules } = qrcode.create(text, { errorCorrectionLevel: 'M' });
  const side = size / modules.size;
  paper.save();
  for (let row = 0; row < modules.size; row += 1)
    for (let column = 0; column < modules.size; column += 1)
      if (modules.get(row, column) === 1) paper.rect(x + column * side, y + row * side, side, side);
  paper.fill(ink).restore();
}
