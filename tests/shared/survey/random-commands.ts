import fc from 'fast-check';
import { applyChanges } from '@embertally/shared/survey/apply-changes';
import type { Changes } from '@embertally/shared/survey/change';
import type { Done, Refusal } from '@embertally/shared/survey/command';
import { addEntries } from '@embertally/shared/survey/commands/add-entries';
import { addOpening } from '@embertally/shared/survey/commands/add-opening';
import { addStorey } from '@embertally/shared/survey/commands/add-storey';
import { copyContents } from '@embertally/shared/survey/commands/copy-contents';
import { deleteEntries } from '@embertally/shared/survey/commands/delete-entries';
import { deleteOpening } from '@embertally/shared/survey/commands/delete-opening';
import { deleteRoom } from '@embertally/shared/survey/commands/delete-room';
import { deleteStorey } from '@embertally/shared/survey/commands/delete-storey';
import { drawRoom } from '@embertally/shared/survey/commands/draw-room';
import { duplicateEntries } from '@embertally/shared/survey/commands/duplicate-entries';
import { editEntries } from '@embertally/shared/survey/commands/edit-entries';
import { editOpening } from '@embertally/shared/survey/commands/edit-opening';
import { editRoom } from '@embertally/shared/survey/commands/edit-room';
import { editStorey } from '@embertally/shared/survey/commands/edit-storey';
import { fillHole } from '@embertally/shared/survey/commands/fill-hole';
import { insertCorner } from '@embertally/shared/survey/commands/insert-corner';
import { moveCorner } from '@embertally/shared/survey/commands/move-corner';
import { moveEntries } from '@embertally/shared/survey/commands/move-entries';
import { moveOpening } from '@embertally/shared/survey/commands/move-opening';
import { moveWall } from '@embertally/shared/survey/commands/move-wall';
import { joinRooms } from '@embertally/shared/survey/commands/join-rooms';
import { removeCorner } from '@embertally/shared/survey/commands/remove-corner';
import { splitRoom } from '@embertally/shared/survey/commands/split-room';
import { walls } from '@embertally/shared/survey/derive/walls';
import { newStorey } from '@embertally/shared/survey/new-storey';
import { newOpening } from '@embertally/shared/survey/new-opening';
import type { SurveyDocument } from '@embertally/shared/survey/survey-document';
import { crate, uid } from '../../support/survey-builder.ts';

/** Numbers a step is made of: which command, which rows it picks and where things go. */
export interface Step {
  readonly command: number;
  readonly pick: readonly number[];
  readonly place: readonly number[];
  readonly slanted: boolean;
}

const COMMANDS = 24;

/** Places come from a coarse lattice most of the time, so that walls meet, coincide and touch. */
const lattice = fc.integer({ min: -4, max: 12 }).map((n) => n / 2);
const coordinate = fc.oneof(
  { weight: 4, arbitrary: lattice },
  { weight: 1, arbitrary: fc.double({ min: -2, max: 6, noNaN: true }) },
);

export const step: fc.Arbitrary<Step> = fc.record({
  command: fc.oneof({ weight: 2, arbitrary: fc.constant(0) }, { weight: 3, arbitrary: fc.nat(COMMANDS - 1) }),
  pick: fc.array(fc.nat(999), { minLength: 4, maxLength: 4 }),
  place: fc.array(coordinate, { minLength: 6, maxLength: 6 }),
  slanted: fc.boolean(),
});

function picked<T>(items: Iterable<T>, n: number): T | undefined {
  const all = [...items];
  return all[n % all.length];
}

/** Runs one step; `name` makes its new ids. Null when the document has nothing the command could be about. */
export function runStep(
  document: SurveyDocument,
  { command, pick, place, slanted }: Step,
  name: string,
): Done | Refusal | null {
  const [p0 = 0, p1 = 0, p2 = 0] = pick;
  const [x = 0, y = 0, x2 = 0, y2 = 0, x3 = 0, y3 = 0] = place;
  const storey = picked(document.storeys.values(), p0);
  const room = picked(document.rooms.values(), p0);
  const corner = picked(document.corners.values(), p0);
  const opening = picked(document.openings.values(), p1);
  const entry = picked(document.entries.values(), p1);
  const wall = storey && picked(walls(document, storey.id), p1);
  const maker = { recorded_by: 'someone', recorded_at: '2026-01-02T03:04:05Z' };
  const patchEntry = { count: p2, width_m: 0.3 + p2 / 500 };
  switch (command) {
    case 0:
    case 1: {
      if (storey === undefined) return null;
      const rectangle = [
        { x_m: x, y_m: y },
        { x_m: x2, y_m: y },
        { x_m: x2, y_m: y2 },
        { x_m: x, y_m: y2 },
      ];
      const other = [
        { x_m: x, y_m: y },
        { x_m: x2, y_m: y2 },
        { x_m: x3, y_m: y3 },
        ...(p1 % 2 === 0 ? [] : [{ x_m: (x + x3) / 2 - 1, y_m: (y + y3) / 2 + 0.5 }]),
      ];
      const points = slanted ? other : rectangle;
      const corner_ids = points.map((_, index) => uid(`${name}.${index}`));
      return drawRoom(document, { room_id: uid(name), storey_id: storey.id, points, corner_ids, cut_out: p1 % 3 > 0 });
    }
    case 2:
      return corner ? moveCorner(document, { corner_id: corner.id, x_m: x, y_m: y }) : null;
    case 3:
      return corner
        ? moveCorner(document, { corner_id: corner.id, x_m: corner.x_m + x / 5, y_m: corner.y_m + y / 5 })
        : null;
    case 4:
      return storey && wall
        ? moveWall(document, {
            storey_id: storey.id,
            wall: [wall.a, wall.b],
            dx_m: slanted ? x / 4 : 0,
            dy_m: slanted ? 0 : y / 4,
          })
        : null;
    case 5: {
      if (!storey || !wall) return null;
      const a = document.corners.get(wall.a);
      const b = document.corners.get(wall.b);
      if (!a || !b) return null;
      const t = (p2 + 1) / 1001;
      const aside = slanted ? x / 10 : 0;
      const at = { x_m: a.x_m + (b.x_m - a.x_m) * t + aside, y_m: a.y_m + (b.y_m - a.y_m) * t - aside };
      return insertCorner(document, { storey_id: storey.id, wall: [wall.a, wall.b], corner_id: uid(name), ...at });
    }
    case 6:
      return corner ? removeCorner(document, { corner_id: corner.id }) : null;
    case 7:
      return room
        ? editRoom(document, { room_id: room.id, patch: { height_m: 2 + p1 / 300, name: `Room ${name}` } })
        : null;
    case 8:
      return room ? deleteRoom(document, { room_id: room.id }) : null;
    case 9:
    case 10: {
      if (!storey || !wall) return null;
      const kind = p2 % 2 === 0 ? 'door' : 'window';
      const ends: [string, string] = slanted ? [wall.a, wall.b] : [wall.b, wall.a];
      const size = { offset_m: Math.abs(x2), width_m: 0.2 + Math.abs(y2) / 4 };
      return addOpening(document, {
        opening: newOpening({ id: uid(name), storey_id: storey.id, wall: ends, kind, ...size }),
      });
    }
    case 11:
      return opening
        ? editOpening(document, { opening_id: opening.id, patch: { width_m: 0.1 + Math.abs(x) / 3 } })
        : null;
    case 12:
      return opening && wall
        ? moveOpening(document, { opening_id: opening.id, wall: [wall.a, wall.b], offset_m: Math.abs(x) / 2 })
        : null;
    case 13:
      return opening ? deleteOpening(document, { opening_ids: [opening.id] }) : null;
    case 14:
    case 15:
      return room ? addEntries(document, { entries: [{ ...crate(name, 'x', x, y), room_id: room.id }] }) : null;
    case 16:
      return entry ? editEntries(document, { entry_ids: [entry.id], patch: patchEntry }) : null;
    case 17:
      return entry ? moveEntries(document, { moves: [{ entry_id: entry.id, x_m: x, y_m: y }] }) : null;
    case 18:
      return entry
        ? duplicateEntries(document, {
            ...maker,
            copies: [{ entry_id: entry.id, id: uid(name), dx_m: x / 3, dy_m: y / 3 }],
          })
        : null;
    case 19: {
      const to = picked(document.rooms.values(), p1);
      if (!room || !to || slanted) return entry ? deleteEntries(document, { entry_ids: [entry.id] }) : null;
      const here = [...document.entries.values()].filter((one) => one.room_id === room.id).slice(0, 4);
      const ids = Object.fromEntries(here.map((one, index) => [one.id, uid(`${name}.${index}`)]));
      return copyContents(document, { ...maker, from_room_id: room.id, to_room_id: to.id, ids });
    }
    case 20:
      if (storey && p1 % 3 > 0) {
        const patch = { wall_thickness_m: (p2 % 5) / 10, height_m: 2.5 + (p2 % 7) / 5 };
        return editStorey(document, { storey_id: storey.id, patch });
      }
      if (room && p1 % 2 === 0)
        return fillHole(document, { room_id: room.id, corner_id: room.holes[0]?.[0] ?? uid('none') });
      return addStorey(document, { storey: newStorey({ id: uid(name), name }) });
    case 21: {
      const loop = room?.ring.flatMap((id) => document.corners.get(id) ?? []) ?? [];
      const [a, b] = [loop[p1 % loop.length], loop[(p1 + 1) % loop.length]];
      const [c, d] = [loop[(p1 + 2) % loop.length], loop[(p1 + 3) % loop.length]];
      if (!room || !a || !b || !c || !d) return null;
      const t = slanted ? 0 : ((p2 % 9) + 1) / 10;
      const from = { x_m: a.x_m + (b.x_m - a.x_m) * t, y_m: a.y_m + (b.y_m - a.y_m) * t };
      const to = { x_m: d.x_m + (c.x_m - d.x_m) * t, y_m: d.y_m + (c.y_m - d.y_m) * t };
      const points = p2 % 3 === 0 ? [from, { x_m: x, y_m: y }, to] : [from, to];
      const corner_ids = points.map((_, index) => uid(`${name}.${index}`));
      return splitRoom(document, { room_id: room.id, new_room_id: uid(name), name, points, corner_ids });
    }
    case 22: {
      const other = picked(document.rooms.values(), p1);
      return room && other ? joinRooms(document, { room_id: room.id, other_id: other.id }) : null;
    }
    default:
      return storey && document.storeys.size > 1 && p1 % 4 === 0
        ? deleteStorey(document, { storey_id: storey.id })
        : null;
  }
}

export interface Ran {
  readonly document: SurveyDocument;
  readonly done: readonly Changes[];
  readonly refusals: readonly Refusal[];
}

/** Runs a sequence; `after` is called with the document after every step that changed something. */
export function runSteps(
  start: SurveyDocument,
  steps: readonly Step[],
  prefix: string,
  after: (document: SurveyDocument, changes: Changes) => void = () => undefined,
): Ran {
  let document = start;
  const done: Changes[] = [];
  const refusals: Refusal[] = [];
  for (const [index, one] of steps.entries()) {
    const outcome = runStep(document, one, `${prefix}${index}`);
    if (outcome === null) continue;
    if (outcome.refused) {
      refusals.push(outcome);
      continue;
    }
    if (outcome.changes.length === 0) continue;
    document = applyChanges(document, outcome.changes);
    done.push(outcome.changes);
    after(document, outcome.changes);
  }
  return { document, done, refusals };
}
