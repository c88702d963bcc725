import { pointInRegion } from '../../geometry/point-in-region.ts';
import { roomRegion } from '../derive/room-region.ts';
import type { Entry, SurveyDocument } from '../survey-document.ts';
import { entryWords, nameOf } from '../words.ts';
import type { Violation } from './violation.ts';

/** The most one entry may weigh, kg: 1,000 t. More is a slip of the unit or of the pen. */
export const HEAVIEST_ENTRY_KG = 1_000_000;

/** Times of a measured curve are at least this far apart, s; what lies closer is one reading written twice. */
const LEAST_STEP_S = 0.001;

/** Entries without a room, with their middle outside their room, or heavier than anything one entry can be. */
export function entryViolations(document: SurveyDocument, entries: Iterable<Entry>): Violation[] {
  const found: Violation[] = [];
  const regions = new Map<string, ReturnType<typeof roomRegion>>();
  for (const entry of entries) {
    const room = document.rooms.get(entry.room_id);
    const at = { storeyId: room?.storey_id ?? null, kind: 'entry', ids: [entry.id] } as const;
    const own = valueViolation(entry);
    if (own !== null) found.push({ ...at, ...own });
    if (room === undefined) {
      const message = `The room of ${entryWords(entry)} is not in the survey any more.`;
      found.push({ ...at, code: 'ROOM_GONE', message, missing: { kind: 'room', id: entry.room_id } });
      continue;
    }
    let region = regions.get(room.id);
    if (region === undefined) regions.set(room.id, (region = roomRegion(document.corners, room)));
    if (region === null || pointInRegion(entry, region) !== 'outside') continue;
    const message = `${entryWords(entry)} would stand outside room ${nameOf(room)}.`;
    found.push({ ...at, code: 'ENTRY_OUTSIDE_ROOM', message, ids: [entry.id, room.id] });
  }
  return found;
}

function valueViolation(entry: Entry): { code: string; message: string; field: string } | null {
  const mass_kg = entry.count * entry.parts.reduce((sum, part) => sum + part.mass_kg, 0);
  if (mass_kg > HEAVIEST_ENTRY_KG) {
    const tonnes = Math.round(mass_kg / 1000).toLocaleString('en-GB');
    const message = `${entryWords(entry)} would weigh ${tonnes} t; one entry can be at most 1,000 t.`;
    return { code: 'ENTRY_TOO_HEAVY', message, field: 'parts' };
  }
  if (entry.curve === null) return null;
  const rises = entry.curve.every(([time_s, power_kW], index) => {
    const before = entry.curve?.[index - 1];
    return time_s >= 0 && power_kW >= 0 && (before === undefined || time_s - before[0] >= LEAST_STEP_S);
  });
  if (rises) return null;
  const message = `The curve of ${entryWords(entry)} must run forward in time and must not go below 0 kW.`;
  return { code: 'ENTRY_CURVE_ORDER', message, field: 'curve' };
}
