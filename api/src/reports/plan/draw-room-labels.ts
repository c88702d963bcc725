import { drawStandingEdge, STANDING_COLOURS } from '../layout/draw-standing.ts';
import { INK, PAGE, SOFT } from '../layout/theme.ts';
import type { Figures } from '../figures.ts';
import type { FontBook } from '../pdf/font-book.ts';
import type { Point, Sheet } from '../pdf/sheet.ts';
import { wrapText } from '../pdf/wrap-text.ts';
import type { RoomReport } from '../report-book.ts';
import { placeLabels } from './place-labels.ts';
import type { Rect } from './polygon.ts';

export interface RoomOnSheet {
  readonly report: RoomReport;
  readonly rings: readonly (readonly Point[])[];
  readonly obstacles: readonly (readonly Point[])[];
}

interface PlateLine {
  readonly text: string;
  readonly weight: 'regular' | 'bold';
}
type Plate = readonly PlateLine[];

const SIZE = 6.6;
const LEADING = 8.4;
const PAD = 4.2;
const PAD_ABOVE = 3.4;
/** A name that needs more lines is left to the room table; its number stands on the plan. */
const MOST_LINES = 4;

/** Plates with number, name, density and standing; where one finds no free floor the plate shrinks to the number. */
export function drawRoomLabels(
  sheet: Sheet,
  book: FontBook,
  figures: Figures,
  rooms: readonly RoomOnSheet[],
  plan: Rect,
): void {
  const plates = new Map(rooms.map(({ report }) => [report.room.id, platesOf(book, figures, report)]));
  const requests = rooms.map(({ report, rings, obstacles }) => ({
    id: report.room.id,
    rings,
    obstacles,
    sizes: (plates.get(report.room.id) ?? []).map((plate) => sizeOf(book, plate)),
  }));
  const standings = new Map(rooms.map(({ report }) => [report.room.id, report.standing]));
  for (const place of placeLabels(requests, plan)) {
    const plate = plates.get(place.id)?.[place.size];
    const standing = standings.get(place.id) ?? 'no limit set';
    if (plate === undefined) continue;
    if (place.pointsAt !== null) {
      const from: Point = [place.x + (place.pointsAt[0] < place.x ? 0 : place.width), place.y + place.height / 2];
      sheet.line([from, place.pointsAt], { colour: PAGE, width: 1.8 });
      sheet.line([from, place.pointsAt], { colour: INK, width: 0.5 });
      sheet.circle(place.pointsAt[0], place.pointsAt[1], 1.4, { fill: INK, stroke: { colour: PAGE, width: 0.5 } });
    }
    sheet.rect(place.x, place.y, place.width, place.height, { fill: PAGE, stroke: { colour: SOFT, width: 0.4 } });
    drawStandingEdge(sheet, standing, place.x, place.y, place.width, place.height);
    for (const [line, { text, weight }] of plate.entries()) {
      const y = place.y + PAD_ABOVE + SIZE * 0.82 + line * LEADING;
      const colour = weight === 'bold' ? INK : standing === 'no limit set' ? INK : STANDING_COLOURS[standing];
      sheet.text(text, place.x + place.width / 2, y, { size: SIZE, weight, colour, align: 'centre' });
    }
  }
}

function platesOf(book: FontBook, figures: Figures, { number, room, tally, standing }: RoomReport): Plate[] {
  const density = figures.estimate(tally.load.perFloor);
  const word = standing === 'near' || standing === 'over' ? ` · ${standing}` : '';
  const figure: PlateLine = { text: `${density}${word}`, weight: 'regular' };
  const name = `${number} ${room.name}`;
  const named = (width: number): Plate => [
    ...wrapText(book, name, SIZE, 'bold', width).map((text): PlateLine => ({ text, weight: 'bold' })),
    figure,
  ];
  return [
    ...[named(120), named(64)].filter((plate) => plate.length <= MOST_LINES),
    [{ text: String(number), weight: 'bold' }, figure],
    [{ text: String(number), weight: 'bold' }],
  ];
}

function sizeOf(book: FontBook, plate: Plate): { width: number; height: number } {
  const widest = Math.max(...plate.map(({ text, weight }) => book.width(text, SIZE, weight)));
  return {
    width: Math.max(widest, 6) + PAD * 2 + 1,
    height: plate.length * LEADING + PAD_ABOVE * 2 - (LEADING - SIZE),
  };
}
