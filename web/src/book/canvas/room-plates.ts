import type { Entry } from '@embertally/shared/survey/survey-document';
import { interiorPoint } from '@embertally/shared/geometry/interior-point';
import type { Point } from '@embertally/shared/geometry/point';
import type { RoomShape } from '../interaction/scene.ts';
import { placePlate } from './place-plates.ts';

export type Standing = 'within' | 'near' | 'over' | 'no limit set';
export interface PlateText {
  readonly name: string;
  /** "612 MJ/m²"; null while the tally is on its way. */
  readonly figure: string | null;
  readonly standing: Standing;
}
/** One wording of a plate: one or two lines. */
export interface PlateLines {
  readonly name: string | null;
  readonly figure: string | null;
}
export interface RoomPlate {
  readonly roomId: string;
  readonly centre: Point;
  readonly lines: PlateLines;
  readonly standing: Standing;
  readonly width_px: number;
  readonly height_px: number;
}

const PAD_X_PX = 9;
const PAD_Y_PX = 5;
export const LINE_PX = 17;
const CLEARANCE_PX = 5;

interface Kept {
  readonly shape: RoomShape;
  readonly entries: readonly Entry[];
  readonly key: string;
  readonly plate: RoomPlate | null;
}

/**
 * Plates of rooms for one zoom. Kept per room while its shape, its entries, its words and the zoom stay, so that an edit
 * in one room places one plate.
 */
export class RoomPlates {
  readonly #kept = new Map<string, Kept>();

  place(
    shape: RoomShape,
    entries: readonly Entry[],
    text: PlateText,
    pxPerM: number,
    wallWidth_px: number,
    measure: (words: string, of: 'name' | 'figure') => number,
  ): RoomPlate | null {
    const key = `${text.name}|${text.figure}|${text.standing}|${pxPerM}|${wallWidth_px}`;
    const before = this.#kept.get(shape.room.id);
    if (before?.shape === shape && before.key === key && sameRows(before.entries, entries)) return before.plate;
    const plate = placed(shape, entries, text, pxPerM, wallWidth_px, measure);
    this.#kept.set(shape.room.id, { shape, entries, key, plate });
    return plate;
  }
}

function sameRows(a: readonly Entry[], b: readonly Entry[]): boolean {
  return a === b || (a.length === b.length && a.every((entry, index) => entry === b[index]));
}

function placed(
  shape: RoomShape,
  entries: readonly Entry[],
  text: PlateText,
  pxPerM: number,
  wallWidth_px: number,
  measure: (words: string, of: 'name' | 'figure') => number,
): RoomPlate | null {
  const wish = interiorPoint(shape);
  if (wish === null) return null;
  const wordings = wordingsOf(text);
  const sizes = wordings.map((lines) => sizeOf(lines, measure));
  const place = placePlate({
    ...shape,
    entries,
    wish,
    sizes: sizes.map(({ width, height }) => ({ width_m: width / pxPerM, height_m: height / pxPerM })),
    clearance_m: (CLEARANCE_PX + wallWidth_px / 2) / pxPerM,
  });
  if (place === null) return null;
  const lines = wordings[place.size];
  const size = sizes[place.size];
  if (lines === undefined || size === undefined) return null;
  return {
    roomId: shape.room.id,
    centre: place.centre,
    lines,
    standing: text.standing,
    width_px: size.width,
    height_px: size.height,
  };
}

/** Fullest first. The word of a standing stays with its figure. */
function wordingsOf({ name, figure, standing }: PlateText): readonly PlateLines[] {
  if (figure === null) return [{ name, figure: null }];
  const said = standing === 'near' || standing === 'over' ? `${figure} · ${standing}` : figure;
  const short = name.length > 18 ? `${name.slice(0, 17)}…` : name;
  return [
    { name, figure: said },
    { name: short, figure: said },
    { name: null, figure: said },
    { name: short, figure: null },
  ];
}

function sizeOf(lines: PlateLines, measure: (words: string, of: 'name' | 'figure') => number) {
  const name = lines.name === null ? 0 : measure(lines.name, 'name');
  const figure = lines.figure === null ? 0 : measure(lines.figure, 'figure');
  const rows = (lines.name === null ? 0 : 1) + (lines.figure === null ? 0 : 1);
  return { width: Math.max(name, figure) + 2 * PAD_X_PX, height: rows * LINE_PX + 2 * PAD_Y_PX };
}
