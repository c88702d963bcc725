import { clearRing } from '@embertally/shared/survey/derive/clear-ring';
import { openingsOfStorey } from '@embertally/shared/survey/derive/openings-of-storey';
import { roomRegion } from '@embertally/shared/survey/derive/room-region';
import { walls } from '@embertally/shared/survey/derive/walls';
import { isCovering } from '@embertally/shared/survey/derive/is-covering';
import type { SurveyDocument } from '@embertally/shared/survey/survey-document';
import { loadBand } from '@embertally/shared/tally/density-band';
import { INK, PAGE } from '../layout/theme.ts';
import type { FontBook } from '../pdf/font-book.ts';
import type { Point, Sheet } from '../pdf/sheet.ts';
import type { Figures } from '../figures.ts';
import type { RoomReport, StoreyReport } from '../report-book.ts';
import { drawEntries, entryOutline } from './draw-entries.ts';
import { drawOpenings } from './draw-openings.ts';
import { drawRoomLabels } from './draw-room-labels.ts';
import { fillBand } from './fill-band.ts';
import type { PlanFrame } from './plan-frame.ts';

const THINNEST_WALL = 1.5;
const CASING = 1.2;

/** One storey inside its frame: bands and hatch, walls, openings, contents, then the labels over all of them. */
export function drawStorey(
  sheet: Sheet,
  book: FontBook,
  figures: Figures,
  document: SurveyDocument,
  { storey, rooms }: StoreyReport,
  frame: PlanFrame,
): void {
  const onSheet = rooms.map((report) => ({
    report,
    rings: outlineOf(document, report, frame),
    obstacles: report.entries.filter((entry) => !isCovering(entry)).map((entry) => entryOutline(frame, entry)),
  }));
  for (const { report, rings } of onSheet) fillBand(sheet, rings, bandOf(report));
  const wallWidth = Math.max(storey.wall_thickness_m * frame.scale.pointsPerMetre, THINNEST_WALL);
  drawWalls(sheet, document, storey.id, frame, wallWidth);
  drawOpenings(sheet, frame, document, openingsOfStorey(document, storey.id), wallWidth);
  for (const { report } of onSheet) drawEntries(sheet, book, frame, report.entries, bandOf(report));
  drawRoomLabels(sheet, book, figures, onSheet, frame.box);
}

function bandOf({ tally }: RoomReport): number | null {
  const density = tally.load.perFloor?.value ?? null;
  return density === null ? null : loadBand(density);
}

/** The clear ring and its holes on the sheet; the centre lines where walls leave no clear ring. */
function outlineOf(document: SurveyDocument, { room }: RoomReport, frame: PlanFrame): readonly (readonly Point[])[] {
  const region = clearRing(document, room.id) ?? roomRegion(document.corners, room);
  return region === null ? [] : [region.ring, ...region.holes].map((ring) => ring.map((point) => frame.at(point)));
}

/** All casings first, so that no casing cuts into a wall that meets another. */
function drawWalls(sheet: Sheet, document: SurveyDocument, storeyId: string, frame: PlanFrame, width: number): void {
  const lines = walls(document, storeyId).flatMap(({ a, b }) => {
    const [from, to] = [document.corners.get(a), document.corners.get(b)];
    return from === undefined || to === undefined ? [] : [[frame.at(from), frame.at(to)] as const];
  });
  for (const line of lines) sheet.line(line, { colour: PAGE, width: width + CASING * 2, cap: 'square' });
  for (const line of lines) sheet.line(line, { colour: INK, width, cap: 'square' });
}
