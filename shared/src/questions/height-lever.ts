import { kindByKey } from '../catalogue/kinds.ts';
import { scaleKind } from '../catalogue/scale-kind.ts';
import type { RoomInput, RoomInputEntry } from '../tally/room-input.ts';
import type { Lever } from './lever.ts';

const MILLIMETRE = 0.001;
const LEAST_STORED_M = 0.1;
const LEAST_ROOM_M = 1.8;
const MOST_ROOM_M = 20;

/** The height of the room, from 1.8 m or the top of its openings to 20 m. */
export function roomHeightLever(input: RoomInput): Lever {
  const { height_m, openings } = input.room;
  const top = Math.max(0, ...(openings ?? []).map((opening) => (opening.sill_m ?? 0) + opening.height_m));
  const least = Math.min(height_m, Math.max(LEAST_ROOM_M, top));
  return {
    title: 'Height of the room',
    output: 'roomHeight',
    unit: 'm',
    now: height_m,
    least,
    most: Math.max(MOST_ROOM_M, height_m),
    tolerance: MILLIMETRE,
    apply: (x) => ({ ...input, room: { ...input.room, height_m: x } }),
  };
}

/**
 * The height to which one entry is stored, from 0.1 m to the ceiling. Mass and peak follow in proportion; a stack of
 * pallets keeps to its own formula.
 *
 * @returns undefined when there is no such entry or it has no height
 */
export function storageHeightLever(input: RoomInput, entryId: string): Lever | undefined {
  const entry = input.contents.find(({ id }) => id === entryId);
  const now = entry?.height_m ?? null;
  if (!entry || now === null) return undefined;
  return {
    title: `Height of ${entry.label ?? entry.id}`,
    output: 'storageHeight',
    unit: 'm',
    now,
    least: Math.min(LEAST_STORED_M, now),
    most: Math.max(now, input.room.height_m - (entry.base_height_m ?? 0)),
    tolerance: MILLIMETRE,
    apply: (x) => ({
      ...input,
      contents: input.contents.map((one) => (one === entry ? storedTo(entry, x, now) : one)),
    }),
  };
}

function storedTo(entry: RoomInputEntry, height: number, now: number): RoomInputEntry {
  const ratio = height / now;
  const kind = entry.kind == null ? undefined : kindByKey(entry.kind);
  const own = kind?.measure.by === 'stack height' ? scaleKind(kind, height).peak_kW : null;
  const peak = own ?? (entry.peak_kW == null ? null : entry.peak_kW * ratio);
  return {
    ...entry,
    height_m: height,
    parts: entry.parts.map((part) => ({ ...part, mass_kg: part.mass_kg * ratio })),
    peak_kW: peak,
    ...(entry.curve == null ? {} : { curve: entry.curve.map(([t, Q]): [number, number] => [t, Q * ratio]) }),
  };
}
