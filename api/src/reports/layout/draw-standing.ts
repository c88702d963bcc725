import type { Standing } from '@embertally/shared/limits/standing';
import type { FontBook } from '../pdf/font-book.ts';
import type { Colour, Sheet } from '../pdf/sheet.ts';
import { INK, MADDER, OCHRE, SOFT } from './theme.ts';

export const STANDING_COLOURS: Readonly<Record<Standing, Colour>> = {
  within: INK,
  near: OCHRE,
  over: MADDER,
  'no limit set': SOFT,
};

/**
 * The edge that says a standing without colour: none for within, dotted for near, double for over. `x, y` is the top left
 * corner of what it stands around.
 */
export function drawStandingEdge(
  sheet: Sheet,
  standing: Standing,
  x: number,
  y: number,
  width: number,
  height: number,
): void {
  const colour = STANDING_COLOURS[standing];
  if (standing === 'near') sheet.rect(x, y, width, height, { stroke: { colour, width: 1, dash: [2.2, 1.6] } });
  if (standing === 'over') {
    sheet.rect(x, y, width, height, { stroke: { colour, width: 0.8 } });
    sheet.rect(x + 1.8, y + 1.8, width - 3.6, height - 3.6, { stroke: { colour, width: 0.8 } });
  }
}

/** The word of a standing with its edge; `y` is the baseline. Returns the width taken. */
export function drawStanding(
  sheet: Sheet,
  book: FontBook,
  standing: Standing,
  x: number,
  y: number,
  size: number,
): number {
  const edged = standing === 'near' || standing === 'over';
  const pad = edged ? 5 : 0;
  const weight = edged ? 'bold' : 'regular';
  const wide = book.width(standing, size, weight);
  drawStandingEdge(sheet, standing, x, y - size - 1.5, wide + pad * 2, size + 5.5);
  sheet.text(standing, x + pad, y, { size, weight, colour: STANDING_COLOURS[standing] });
  return wide + pad * 2;
}
