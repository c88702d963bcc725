import { footprint } from '@embertally/shared/geometry/footprint';
import { isCovering } from '@embertally/shared/survey/derive/is-covering';
import type { Entry } from '@embertally/shared/survey/survey-document';
import { INK, LOAD_COLOURS, mixed, PAGE, SOFT } from '../layout/theme.ts';
import type { FontBook } from '../pdf/font-book.ts';
import type { Point, Sheet } from '../pdf/sheet.ts';
import type { PlanFrame } from './plan-frame.ts';

const NUMBER_SIZE = 5.6;

/** Footprint of an entry on the sheet. */
export function entryOutline(frame: PlanFrame, entry: Entry): readonly Point[] {
  return footprint(entry).map((point) => frame.at(point));
}

/**
 * The contents of a room: footprints with their line in the room's ledger where it fits. Each has a casing in the page's
 * colour so that it stands out on every band. Coverings of the floor lie under the rest, in outline.
 */
export function drawEntries(
  sheet: Sheet,
  book: FontBook,
  frame: PlanFrame,
  entries: readonly Entry[],
  band: number | null,
): void {
  const under = band === null ? PAGE : (LOAD_COLOURS[band] ?? PAGE);
  const fill = mixed(PAGE, under, 0.86);
  const k = frame.scale.pointsPerMetre;
  const lines = entries.map((entry, index) => ({ entry, number: String(index + 1) }));
  const coverings = lines.filter(({ entry }) => isCovering(entry));
  for (const { entry } of coverings) {
    sheet.polygon([entryOutline(frame, entry)], { stroke: { colour: SOFT, width: 0.5 } });
  }
  for (const { entry, number } of lines) {
    if (isCovering(entry)) continue;
    const outline = entryOutline(frame, entry);
    const [first, , third] = outline;
    if (first === undefined || third === undefined) continue;
    sheet.polygon([outline], { stroke: { colour: PAGE, width: 1.9 } });
    sheet.polygon([outline], { fill, stroke: { colour: INK, width: 0.6 } });
    const [width, depth] = [entry.width_m * k, entry.depth_m * k];
    const fits = Math.min(width, depth) >= NUMBER_SIZE + 2 && width >= book.width(number, NUMBER_SIZE, 'regular') + 3;
    if (fits) {
      const [x, y] = frame.at(entry);
      sheet.text(number, x, y + NUMBER_SIZE * 0.34, { size: NUMBER_SIZE, colour: INK, align: 'centre' });
    } else if (Math.min(width, depth) > 2) {
      sheet.line([first, third], { colour: SOFT, width: 0.4 });
    }
  }
}
