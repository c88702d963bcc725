import type { Change, Changes } from '../change.ts';
import { groupBy } from '../group-by.ts';
import { rowsOf, type Rows } from '../rows.ts';
import { sameValue } from '../same-value.ts';
import { ENTITY_KINDS, type EntityKind, type Room, type SurveyDocument } from '../survey-document.ts';

type Overlay = { readonly [K in EntityKind]: Map<string, Rows[K] | null> };

const roomsByStorey = groupBy<Rows['room']>((room) => room.storey_id);
const cornersByStorey = groupBy<Rows['corner']>((corner) => corner.storey_id);
const openingsByStorey = groupBy<Rows['opening']>((opening) => opening.storey_id);
const entriesByRoom = groupBy<Rows['entry']>((entry) => entry.room_id);

/**
 * A document being worked on by one command. The document itself stays as it is; the draft holds what is put or removed
 * over it, and says at the end what changed, field by field.
 */
export class SurveyDraft {
  private readonly overlay: Overlay = {
    storey: new Map(),
    corner: new Map(),
    room: new Map(),
    opening: new Map(),
    entry: new Map(),
  };

  constructor(readonly base: SurveyDocument) {}

  get<K extends EntityKind>(kind: K, id: string): Rows[K] | undefined {
    const laid = this.overlay[kind].get(id);
    return laid === undefined ? rowsOf(this.base, kind).get(id) : (laid ?? undefined);
  }

  put<K extends EntityKind>(kind: K, row: Rows[K]): void {
    this.overlay[kind].set(row.id, row);
  }

  remove(kind: EntityKind, id: string): void {
    this.overlay[kind].set(id, null);
  }

  /** The corners, as a map to read from. */
  readonly corners = { get: (id: string): Rows['corner'] | undefined => this.get('corner', id) };

  roomsOf(storeyId: string): Rows['room'][] {
    return this.merged('room', roomsByStorey(this.base.rooms).get(storeyId), (row) => row.storey_id === storeyId);
  }

  cornersOf(storeyId: string): Rows['corner'][] {
    return this.merged('corner', cornersByStorey(this.base.corners).get(storeyId), (row) => row.storey_id === storeyId);
  }

  openingsOf(storeyId: string): Rows['opening'][] {
    const rows = openingsByStorey(this.base.openings).get(storeyId);
    return this.merged('opening', rows, (row) => row.storey_id === storeyId);
  }

  entriesOf(roomId: string): Rows['entry'][] {
    return this.merged('entry', entriesByRoom(this.base.entries).get(roomId), (row) => row.room_id === roomId);
  }

  /** Corners that are new or stand elsewhere than in the document. */
  movedCorners(): Set<string> {
    const moved = new Set<string>();
    for (const [id, corner] of this.overlay.corner) {
      const before = this.base.corners.get(id);
      if (corner !== null && (before?.x_m !== corner.x_m || before.y_m !== corner.y_m)) moved.add(id);
    }
    return moved;
  }

  /** Whether the room's outline is new or another than in the document. */
  hasNewOutline(room: Room): boolean {
    const before = this.base.rooms.get(room.id);
    return before === undefined || before.ring !== room.ring || before.holes !== room.holes;
  }

  /** What the draft changes: rows made and edited from the storey down to its contents, then rows deleted, contents first. */
  changes(): Changes {
    const made: Change[] = [];
    const deleted: Change[] = [];
    for (const kind of ENTITY_KINDS) {
      for (const [id, row] of this.overlay[kind]) {
        const before = rowsOf(this.base, kind).get(id);
        if (row === null) {
          if (before !== undefined) deleted.unshift({ kind, id, before: { ...before }, after: null });
        } else if (before === undefined) made.push({ kind, id, before: null, after: { ...row } });
        else if (before !== row) made.push(...editOf(kind, { ...before }, { ...row }));
      }
    }
    return [...made, ...deleted];
  }

  private merged<K extends EntityKind>(
    kind: K,
    rows: readonly Rows[K][] | undefined,
    belongs: (row: Rows[K]) => boolean,
  ): Rows[K][] {
    const overlay: ReadonlyMap<string, Rows[K] | null> = this.overlay[kind];
    const kept = (rows ?? []).filter((row) => !overlay.has(row.id));
    for (const row of overlay.values()) if (row !== null && belongs(row)) kept.push(row);
    return kept;
  }
}

function editOf(kind: EntityKind, before: Record<string, unknown>, after: Record<string, unknown>): Change[] {
  const fields = Object.keys(after).filter((field) => !sameValue(before[field], after[field]));
  if (fields.length === 0) return [];
  const pick = (row: Record<string, unknown>) => Object.fromEntries(fields.map((field) => [field, row[field]]));
  return [{ kind, id: after['id'] as string, before: pick(before), after: pick(after) }];
}
