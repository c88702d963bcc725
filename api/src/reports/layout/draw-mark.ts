import type { Sheet } from '../pdf/sheet.ts';
import { INK, MADDER } from './theme.ts';

/** The mark: four upright strokes in ink and the slanted fifth in madder, `height` points tall at the left of `x`. */
export function drawMark(sheet: Sheet, x: number, y: number, height: number): void {
  const step = height * 0.3;
  for (let stroke = 0; stroke < 4; stroke++) {
    const at = x + height * 0.12 + stroke * step;
    sheet.line(
      [
        [at, y + height * 0.04],
        [at, y + height * 0.96],
      ],
      { colour: INK, width: height * 0.1, cap: 'round' },
    );
  }
  sheet.line(
    [
      [x - height * 0.05, y + height * 0.8],
      [x + height * 1.2, y + height * 0.22],
    ],
    { colour: MADDER, width: height * 0.1, cap: 'round' },
  );
}
