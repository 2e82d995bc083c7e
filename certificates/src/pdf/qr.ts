import QRCode from 'qrcode';
import { type Box, inks, type Pen } from './pen.ts';

/** A QR code (ISO/IEC 18004, level M) as runs of dark squares, in a square of that side. */
export function drawQrCode(
  pen: Pen,
  content: string,
  square: { x: number; y: number; side: number },
): void {
  const { modules } = QRCode.create(content, { errorCorrectionLevel: 'M' });
  const module = square.side / modules.size;
  const runs: Box[] = [];
  for (let row = 0; row < modules.size; row += 1) {
    for (let column = 0; column < modules.size; column += 1) {
      const start = column;
      while (column < modules.size && modules.get(row, column)) column += 1;
      if (column > start) {
        runs.push({
          x: square.x + start * module,
          y: square.y + row * module,
          width: (column - start) * module,
          height: module,
        });
      }
    }
  }
  pen.fillRectangles(runs, inks.main);
}
