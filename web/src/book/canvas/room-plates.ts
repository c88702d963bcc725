import type { Entry } from '@embertally/shared/survey/survey-document';
import { bounds } from '@embertally/shared/geometry/bounds';
import { footprint } from '@embertally/shared/geometry/footprint';
import { interiorPoint } from '@embertally/shared/geometry/interior-point';
import type { Point } from '@embertally/shared/geometry/point';
import type { RoomShape } from '../interaction/scene.ts';
import { placeBeside, type Beside } from './place-beside.ts';
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
/** Small where a room has little free space. */
export type PlateSize = 'usual' | 'small';
export interface RoomPlate {
  readonly roomId: string;
  readonly centre: Point;
  /** For a plate beside the storey: where in its room its line ends. */
  readonly leadsTo: Point | null;
  readonly size: PlateSize;
  readonly lines: readonly PlateLine[];
  readonly standing: Standing;
  readonly width_px: number;
  readonly height_px: number;
}

const PAD_PX = { usual: { x: 7, y: 4 }, small: { x: 6, y: 2 } } as const;
export const LINE_PX = { usual: 16, small: 14 } as const;
const CLEARANCE_PX = 3;
/** Between the storey and the plates beside it, and between those plates. */
const BESIDE_PX = 14;
const GAP_PX = 4;
/** What must stay free around the end of a line. */
const LINE_END_PX = 8;

export interface PlateAsked {
  readonly shape: RoomShape;
  /** Entries the plate must not cover. */
  readonly entries: readonly Entry[];
  readonly text: PlateText;
  readonly pxPerM: number;
  readonly wallWidth_px: number;
  /** False while the zoom is moving. */
  readonly settled: boolean;
  readonly measure: Measure;
}
type Measure = (words: string, of: PlateLine['of'], size: PlateSize) => number;

interface Wording {
  readonly lines: readonly PlateLine[];
  readonly size: PlateSize;
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
 * in one room places one plate. A room without the space for its name has its plate beside the storey, with a line to it.
 */
export class RoomPlates {
  readonly #kept = new Map<string, Kept>();
  readonly #fonts: boolean;
  #inside: readonly (RoomPlate | null)[] = [];
  #shown: readonly RoomPlate[] = [];
  #scale = '';

  /** @param fonts Whether the plan's own fonts measured the words */
  constructor(fonts: boolean) {
    this.#fonts = fonts;
  }

  /** The plates as they were placed last. */
  get shown(): readonly RoomPlate[] {
    return this.#shown;
  }

  /** While the zoom is still moving plates stay where they were; they find their new places when it has settled. */
  place(rooms: readonly PlateAsked[]): readonly RoomPlate[] {
    const inside = rooms.map((asked) => this.#placeInside(asked));
    const [first] = rooms;
    const scale = `${this.#fonts}|${rooms
      .map(({ shape, pxPerM, text }) => (first?.settled === true ? `${shape.room.id} ${pxPerM} ${text.figure}` : ''))
      .join('|')}`;
    const same = inside.length === this.#inside.length && inside.every((plate, index) => plate === this.#inside[index]);
    if (same && (first?.settled === false || scale === this.#scale)) return this.#shown;
    this.#inside = inside;
    this.#scale = scale;
    this.#shown = [...inside.filter((plate) => plate !== null), ...placedBeside(rooms, inside)];
    return this.#shown;
  }

  #placeInside(asked: PlateAsked): RoomPlate | null {
    const { shape, entries, text, pxPerM, wallWidth_px, settled } = asked;
    const words = `${this.#fonts}|${text.name}|${text.figure}|${text.standing}`;
    const before = this.#kept.get(shape.room.id);
    const same = before?.shape === shape && before.words === words && sameRows(before.entries, entries);
    const scale = `${pxPerM}|${wallWidth_px}`;
    if (same && (!settled || before.scale === scale)) return before.plate;
    const plate = placedInside(asked);
    this.#kept.set(shape.room.id, { shape, entries, words, scale, plate });
    return plate;
  }
}

function sameRows(a: readonly Entry[], b: readonly Entry[]): boolean {
  return a === b || (a.length === b.length && a.every((entry, index) => entry === b[index]));
}

function placedInside({ shape, entries, text, pxPerM, wallWidth_px, measure }: PlateAsked): RoomPlate | null {
  const wish = interiorPoint(shape);
  if (wish === null) return null;
  const wordings = wordingsOf(text);
  const boxes = wordings.map((wording) => boxOf(wording, measure));
  const place = placePlate({
    ...shape,
    entries,
    wish,
    sizes: boxes.map(({ width_px, height_px }) => ({ width_m: width_px / pxPerM, height_m: height_px / pxPerM })),
    clearance_m: (CLEARANCE_PX + wallWidth_px / 2) / pxPerM,
  });
  const wording = place === null ? undefined : wordings[place.size];
  const box = place === null ? undefined : boxes[place.size];
  if (place === null || wording === undefined || box === undefined) return null;
  return {
    roomId: shape.room.id,
    centre: place.centre,
    leadsTo: null,
    ...wording,
    standing: text.standing,
    ...box,
  };
}

/** Plates of the rooms that have none inside, beside the storey. */
function placedBeside(rooms: readonly PlateAsked[], inside: readonly (RoomPlate | null)[]): readonly RoomPlate[] {
  const outlines = rooms.map(({ shape }) => shape.ring);
  const strewn = rooms.flatMap(({ entries }) => entries.map((entry) => bounds(footprint(entry))));
  const standing = inside.filter((plate) => plate !== null);
  const placed: RoomPlate[] = [];
  const lines: Beside[] = [];
  for (const [index, asked] of rooms.entries()) {
    const { shape, text, pxPerM, wallWidth_px, measure } = asked;
    const wording = wordingsOf(text).find(({ size }) => size === 'small');
    if (inside[index] !== null || wording === undefined) continue;
    const box = boxOf(wording, measure);
    const beside = placeBeside({
      ends: lineEnds(asked),
      outlines,
      size: { width_m: box.width_px / pxPerM, height_m: box.height_px / pxPerM },
      away_m: (BESIDE_PX + wallWidth_px / 2) / pxPerM,
      gap_m: GAP_PX / pxPerM,
      others: [...standing, ...placed].map((plate) => ({
        centre: plate.centre,
        width_m: plate.width_px / pxPerM,
        height_m: plate.height_px / pxPerM,
      })),
      lines,
      entries: strewn,
    });
    if (beside === null) continue;
    lines.push(beside);
    placed.push({ roomId: shape.room.id, ...beside, ...wording, standing: text.standing, ...box });
  }
  return placed;
}

/** Free places of a room where a line may end, spread over it; its middle when no place is free. */
function lineEnds({ shape, entries, pxPerM, wallWidth_px }: PlateAsked): readonly Point[] {
  const end = { width_m: LINE_END_PX / pxPerM, height_m: LINE_END_PX / pxPerM };
  const { minX_m, minY_m, maxX_m, maxY_m } = bounds(shape.ring);
  const ends = [0.15, 0.5, 0.85].flatMap((across) =>
    [0.15, 0.5, 0.85].flatMap((up) => {
      const wish = { x_m: minX_m + (maxX_m - minX_m) * across, y_m: minY_m + (maxY_m - minY_m) * up };
      return (
        placePlate({ ...shape, entries, wish, sizes: [end], clearance_m: wallWidth_px / 2 / pxPerM })?.centre ?? []
      );
    }),
  );
  return ends.length > 0 ? ends : [interiorPoint(shape) ?? []].flat();
}

/** Fullest first. The word of a standing is in every wording, and a figure never stands without its room's name. */
function wordingsOf({ name, figure, standing }: PlateText): readonly Wording[] {
  const short = name.length > 18 ? `${name.slice(0, 17)}…` : name;
  const title = (words: string): PlateLine => ({ words, of: 'name' });
  const line = (words: string): PlateLine => ({ words, of: 'figure' });
  const word = standing === 'near' || standing === 'over' ? standing : null;
  const bare = [title(short), ...(word === null ? [] : [line(word)])];
  const usual = (lines: readonly PlateLine[]): Wording => ({ lines, size: 'usual' });
  const small = (lines: readonly PlateLine[]): Wording => ({ lines, size: 'small' });
  if (figure === null) return [usual([title(name)]), usual(bare), small(bare)];
  const said = word === null ? figure : `${figure} · ${word}`;
  const two = [title(short), line(said)];
  const stacked = [title(short), line(figure), ...(word === null ? [] : [line(word)])];
  const one = [line(`${short} · ${said}`)];
  return [
    usual([title(name), line(said)]),
    usual(two),
    usual(stacked),
    usual(one),
    ...[two, stacked, one, bare].map(small),
  ];
}

function boxOf({ lines, size }: Wording, measure: Measure): { readonly width_px: number; readonly height_px: number } {
  const widest = Math.max(...lines.map(({ words, of }) => measure(words, of, size)));
  return {
    width_px: widest + 2 * PAD_PX[size].x,
    height_px: lines.length * LINE_PX[size] + 2 * PAD_PX[size].y,
  };
}
