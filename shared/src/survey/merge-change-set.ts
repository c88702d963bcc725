import { applyChanges } from './apply-changes.ts';
import type { Change, Changes, Clash } from './change.ts';
import { checkInvariants } from './check-invariants.ts';
import { loopsOfRoom } from './derive/loops-of-room.ts';
import { SurveyDraft } from './draft/survey-draft.ts';
import { rehangOpenings } from './draft/rehang-openings.ts';
import { sweepUnused } from './draft/sweep-unused.ts';
import { roomsOfStorey } from './derive/rooms-of-storey.ts';
import { entryViolations } from './invariants/entry-violations.ts';
import type { Violation } from './invariants/violation.ts';
import { clashOf, mergeRows } from './merge/merge-rows.ts';
import { touchedBy } from './merge/touched-by.ts';
import { rowsOf } from './rows.ts';
import type { SurveyDocument } from './survey-document.ts';

export type MergeOutcome =
  | {
      readonly ok: true;
      /** What is to be done to the document as it stands; empty when all of it is there already. */
      readonly changes: Changes;
      /** The document after them, at the same sequence number. */
      readonly document: SurveyDocument;
      readonly touchedRoomIds: readonly string[];
      readonly touchedStoreyIds: readonly string[];
    }
  | { readonly ok: false; readonly clashes: readonly Clash[] };

/**
 * Puts a change set made on an earlier state onto the document as it stands. All of it or, with a single clash, nothing.
 * Corners that another person's rooms came to use stay although the set deletes them; corners nobody uses after both go;
 * openings in a wall that was split in between are hung on the right half.
 *
 * @param changes rows and fields that fit their schemas (`parseChanges`)
 */
export function mergeChangeSet(document: SurveyDocument, changes: Changes): MergeOutcome {
  const rows = mergeRows(document, changes);
  if (rows.clashes.length > 0) return { ok: false, clashes: rows.clashes };
  const planTouched = rows.changes.some(({ kind }) => kind !== 'entry');
  const settled = planTouched
    ? settlePlan(document, rows.changes, changes)
    : { ok: true as const, changes: rows.changes };
  if (!settled.ok) return settled;
  const merged = settled.changes;
  const after = applyChanges(document, merged);
  const violations = violationsAfter(document, after, merged);
  if (violations.length > 0) {
    return { ok: false, clashes: violations.map((violation) => clashFrom(violation, document, changes)) };
  }
  const { roomIds, storeyIds } = touchedBy(document, after, merged);
  return { ok: true, changes: merged, document: after, touchedRoomIds: roomIds, touchedStoreyIds: storeyIds };
}

type Settled =
  { readonly ok: true; readonly changes: Changes } | { readonly ok: false; readonly clashes: readonly Clash[] };

/** Keeps what the others came to use, hangs openings and sweeps corners on the storeys the rows touch. */
function settlePlan(document: SurveyDocument, rows: Changes, asked: Changes): Settled {
  const draft = new SurveyDraft(document);
  for (const change of rows) lay(draft, change);
  for (const storeyId of touchedBy(document, applyChanges(document, rows), rows).storeyIds) {
    keepUsedCorners(draft, storeyId);
    const clash = hangOpenings(draft, storeyId, asked);
    if (clash !== null) return { ok: false, clashes: [clash] };
    sweepUnused(draft, storeyId);
  }
  return { ok: true, changes: draft.changes() };
}

function lay(draft: SurveyDraft, change: Change): void {
  const { kind, id, before, after } = change;
  if (after === null) draft.remove(kind, id);
  else draft.put(kind, (before === null ? after : { ...draft.get(kind, id), ...after }) as never);
}

function keepUsedCorners(draft: SurveyDraft, storeyId: string): void {
  for (const room of draft.roomsOf(storeyId)) {
    for (const id of loopsOfRoom(room).flat()) {
      const stored = draft.base.corners.get(id);
      if (draft.get('corner', id) === undefined && stored !== undefined) draft.put('corner', stored);
    }
  }
}

/** An opening that loses its wall without being deleted by the set is a clash: somebody counts on it. */
function hangOpenings(draft: SurveyDraft, storeyId: string, changes: Changes): Clash | null {
  const standing = draft.openingsOf(storeyId);
  const refused = rehangOpenings(draft, storeyId);
  const lost = standing.find((opening) => draft.get('opening', opening.id) === undefined);
  const id = refused?.ids?.[0] ?? lost?.id;
  if (id === undefined) return null;
  const message = refused?.message ?? 'The wall of an opening was taken away by one of you and used by the other.';
  return clashFrom({ code: 'WALL_GONE', message, storeyId, kind: 'opening', ids: [id] }, draft.base, changes);
}

function violationsAfter(before: SurveyDocument, after: SurveyDocument, changes: Changes): readonly Violation[] {
  const { storeyIds } = touchedBy(before, after, changes);
  const planTouched = changes.some(({ kind }) => kind !== 'entry');
  if (!planTouched)
    return entryViolations(
      after,
      changes.flatMap(({ id }) => after.entries.get(id) ?? []),
    );
  const found = checkInvariants(after, storeyIds);
  if (found.length > 0) return found;
  return homeless(before, after, changes);
}

/** Entries whose room the set deletes, and entries of the set whose room is not there. */
function homeless(before: SurveyDocument, after: SurveyDocument, changes: Changes): readonly Violation[] {
  const gone = changes.some(({ kind, after: row }) => kind === 'room' && row === null);
  const suspects = gone ? after.entries.values() : changes.flatMap(({ id }) => after.entries.get(id) ?? []);
  const orphaned = [...suspects].filter((entry) => !after.rooms.has(entry.room_id));
  const misplaced = roomsOfGoneStoreys(before, after);
  return [...entryViolations(after, orphaned), ...misplaced];
}

function roomsOfGoneStoreys(before: SurveyDocument, after: SurveyDocument): Violation[] {
  return [...before.storeys.keys()].flatMap((storeyId) =>
    after.storeys.has(storeyId) || roomsOfStorey(after, storeyId).length === 0
      ? []
      : checkInvariants(after, [storeyId]),
  );
}

/** A broken rule as a clash: a row that is not there was deleted by them (`gone`) or by the set itself (`edited`). */
function clashFrom(violation: Violation, document: SurveyDocument, changes: Changes): Clash {
  const { message, missing } = violation;
  if (missing !== undefined) {
    const own = changes.find(({ kind, id }) => kind === missing.kind && id === missing.id);
    const reason = own?.after === null ? 'edited' : 'gone';
    return clashOf(missing, reason, null, own?.before ?? null, null, own?.after ?? null, message);
  }
  const mine = changes.find(({ id }) => violation.ids.includes(id));
  const id = violation.ids[0] ?? mine?.id ?? '';
  const theirs = rowsOf(document, violation.kind).get(id) ?? null;
  const field = violation.field ?? null;
  return clashOf(
    { kind: violation.kind, id },
    'geometry',
    field,
    mine?.before ?? null,
    theirs,
    mine?.after ?? null,
    message,
  );
}
