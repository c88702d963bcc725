import type { Corner, EntityKind, Entry, Opening, Room, Storey, SurveyDocument } from './survey-document.ts';

/** The row type of each kind. */
export interface Rows {
  readonly storey: Storey;
  readonly corner: Corner;
  readonly room: Room;
  readonly opening: Opening;
  readonly entry: Entry;
}

const MAP_NAMES = {
  storey: 'storeys',
  corner: 'corners',
  room: 'rooms',
  opening: 'openings',
  entry: 'entries',
} as const satisfies Record<EntityKind, keyof SurveyDocument>;

export type MapName = (typeof MAP_NAMES)[EntityKind];

/** The name of the document's map that holds the rows of a kind. */
export function mapName<K extends EntityKind>(kind: K): (typeof MAP_NAMES)[K] {
  return MAP_NAMES[kind];
}

/** The rows of a kind by id. */
export function rowsOf<K extends EntityKind>(document: SurveyDocument, kind: K): ReadonlyMap<string, Rows[K]> {
  const maps: { readonly [Kind in EntityKind]: ReadonlyMap<string, Rows[Kind]> } = {
    storey: document.storeys,
    corner: document.corners,
    room: document.rooms,
    opening: document.openings,
    entry: document.entries,
  };
  return maps[kind];
}
