import type { Change, Changes } from '@embertally/shared/survey/change';
import type { EntityKind } from '@embertally/shared/survey/survey-document';
import type { SurveyDocumentV2 } from '@embertally/shared/survey/versions/v2';
import type { DocumentRepository, TouchedIds } from '../repositories/document-repository.ts';

/** A field on either side of a change, when it holds an id. */
function ids(changes: Changes, kinds: readonly EntityKind[], field: string): string[] {
  return changes
    .filter((change) => kinds.includes(change.kind))
    .flatMap((change) => [change.before?.[field], change.after?.[field]])
    .filter((value): value is string => typeof value === 'string');
}

const SHAPE = ['ring', 'holes', 'storey_id'];

/** Whether a change can leave entries outside their room, or without one. */
function movesWalls(change: Change): boolean {
  if (change.kind === 'corner') return true;
  if (change.kind !== 'room' && change.kind !== 'storey') return false;
  if (change.before === null || change.after === null) return true;
  const { after } = change;
  return SHAPE.some((field) => field in after);
}

/**
 * As much of the stored document as merging a change set can look at: for contents the rooms concerned, for anything
 * else the storeys concerned. A survey of thousands of entries is not read for one of them.
 */
export async function loadTouched(
  documents: DocumentRepository,
  surveyId: string,
  changes: Changes,
): Promise<SurveyDocumentV2> {
  const of = (kind: EntityKind): string[] =>
    changes.filter((change) => change.kind === kind).map((change) => change.id);
  const touched: TouchedIds = {
    storey: of('storey'),
    corner: of('corner'),
    room: of('room'),
    opening: of('opening'),
    entry: of('entry'),
  };
  const namedRooms = ids(changes, ['entry'], 'room_id');
  if (changes.every((change) => change.kind === 'entry')) {
    const stored = await documents.roomsOfEntries(surveyId, touched.entry);
    return documents.contents(surveyId, [...new Set([...namedRooms, ...stored])], touched.entry);
  }
  const stored = await documents.storeysOf(surveyId, touched, namedRooms);
  const named = ids(changes, ['corner', 'room', 'opening'], 'storey_id');
  const storeys = [...new Set([...touched.storey, ...named, ...stored])];
  return documents.storeys(surveyId, storeys, touched.entry, changes.some(movesWalls));
}
