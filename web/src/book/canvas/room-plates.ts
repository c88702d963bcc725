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
/** One line of a plate: a room's name or a figure with its unit. */
export interface PlateLine {
  readonly words: string;
  readonly of: 'name' | 'figure';
}
export interface RoomPlate {
  readonly roomId: string;
  readonly centre: Point;
  readonly lines: readonly PlateLine[];
  readonly standing: Standing;
  readonly width_px: number;
  readonly height_px: number;
}

const PAD_X_PX = 7;
const PAD_Y_PX = 4;
export const LINE_PX = 16;
const CLEARANCE_PX = 3;

export interface PlateAsked {
  readonly shape: RoomShape;
  /** Entries the plate must not cover. */
  readonly entries: readonly Entry[];
  readonly text: PlateText;
  readonly pxPerM: number;
  readonly wallWidth_px: number;
  /** False while the zoom is moving. */
  readonly settled: boolean;
  readonly measure: (words: string, of: 'name' | 'figure') => number;
}

interface Kept {
  readonly shape: RoomShape;
  readonly entries: readonly Entry[];
  readonly words: string;
  readonly scale: string;
  readonly plate: RoomPlate | null;
}

/**
 * Plates of rooms for one zoom. Kept per room while its shape, its entries, its words and the zoom stay, so that an edit
 * in one room places one plate.
 */
export class RoomPlates {
  readonly #kept = new Map<string, Kept>();
  readonly #fonts: boolean;

  /** @param fonts Whether the plan's own fonts measured the words */
  constructor(fonts: boolean) {
    this.#fonts = fonts;
  }

  /** While the zoom is still moving a plate stays where it was; it finds its new place when the zoom has settled. */
  place(asked: PlateAsked): RoomPlate | null {
    const { shape, entries, text, pxPerM, wallWidth_px, settled } = asked;
    const words = `${this.#fonts}|${text.name}|${text.figure}|${text.standing}`;
    const before = this.#kept.get(shape.room.id);
    const same = before?.shape === shape && before.words === words && sameRows(before.entries, entries);
    const scale = `${pxPerM}|${wallWidth_px}`;
    if (same && (!settled || before.scale === scale)) return before.plate;
    const plate = placed(asked);
    this.#kept.set(shape.room.id, { shape, entries, words, scale, plate });
    return plate;
  }
}

function sameRows(a: readonly Entry[], b: readonly Entry[]): boolean {
  return a === b || (a.length === b.length && a.every((entry, index) => entry === b[index]));
}

function placed({ shape, entries, text, pxPerM, wallWidth_px, measure }: PlateAsked): RoomPlate | null {
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

/** Fullest first. The word of a standing is in every wording, and a figure never stands without its room's name. */
function wordingsOf({ name, figure, standing }: PlateText): readonly (readonly PlateLine[])[] {
  const short = name.length > 18 ? `${name.slice(0, 17)}…` : name;
  const title = (words: string): PlateLine => ({ words, of: 'name' });
  const line = (words: string): PlateLine => ({ words, of: 'figure' });
  const word = standing === 'near' || standing === 'over' ? standing : null;
  const bare = [title(short), ...(word === null ? [] : [line(word)])];
  if (figure === null) return [[title(name)], bare];
  const said = word === null ? figure : `${figure} · ${word}`;
  const stacked = [title(short), line(figure), ...(word === null ? [] : [line(word)])];
  return [[title(name), line(said)], [title(short), line(said)], stacked, [line(`${short} · ${said}`)], bare];
}

function sizeOf(lines: readonly PlateLine[], measure: (words: string, of: 'name' | 'figure') => number) {
  const widest = Math.max(...lines.map(({ words, of }) => measure(words, of)));
  return { width: widest + 2 * PAD_X_PX, height: lines.length * LINE_PX + 2 * PAD_Y_PX };
}
