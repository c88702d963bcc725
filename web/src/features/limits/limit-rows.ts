import type { Limit, LimitQuantity } from '@embertally/shared/contracts/limits';
import type { RoomSummary } from '@embertally/shared/contracts/surveys';
import { standingOf, type Standing } from '@embertally/shared/limits/standing';

export interface LimitRow {
  readonly limit: Limit;
  readonly roomName: string;
  /** What the room comes to in the limit's own unit; null where the headline does not carry it. */
  readonly value: number | null;
  readonly standing: Standing;
}

const VALUE_OF: Readonly<Partial<Record<LimitQuantity, (summary: RoomSummary) => number | null>>> = {
  load_per_floor_MJ_m2: (summary) => summary.load_per_floor_MJ_m2,
  load_total_MJ: (summary) => summary.load_total_MJ,
  peak_kW: (summary) => summary.peak_kW,
};

/** Limits beside what their rooms come to, the most exceeded first; those without a value last, by room. */
export function limitRows(limits: readonly Limit[], summaries: readonly RoomSummary[]): readonly LimitRow[] {
  const rooms = new Map(summaries.map((summary) => [summary.room_id, summary]));
  const rows = limits.map((limit): LimitRow => {
    const room = rooms.get(limit.room_id);
    const value = room === undefined ? null : (VALUE_OF[limit.quantity]?.(room) ?? null);
    return { limit, roomName: room?.name ?? 'a room that is gone', value, standing: standingOf(value, limit.bound) };
  });
  const ratio = (row: LimitRow) => (row.value === null ? -1 : row.value / row.limit.bound);
  return rows.toSorted((a, b) => ratio(b) - ratio(a) || a.roomName.localeCompare(b.roomName));
}
