import type { Changes } from '@embertally/shared/survey/change';
import { rowsOf } from '@embertally/shared/survey/rows';
import { ENTITY_KINDS, type EntityKind, type SurveyDocument } from '@embertally/shared/survey/survey-document';
import type { DocumentRepository } from '../repositories/document-repository.ts';

interface KindWrites {
  readonly kind: EntityKind;
  readonly added: readonly object[];
  readonly edited: readonly object[];
  readonly removed: readonly string[];
}

function writesOf(kind: EntityKind, before: SurveyDocument, after: SurveyDocument, changes: Changes): KindWrites {
  const was = rowsOf(before, kind);
  const is = rowsOf(after, kind);
  const added: object[] = [];
  const edited: object[] = [];
  const removed: string[] = [];
  for (const id of new Set(changes.filter((change) => change.kind === kind).map((change) => change.id))) {
    const row = is.get(id);
    if (row === undefined) {
      if (was.has(id)) removed.push(id);
    } else if (!was.has(id)) added.push(row);
    else if (was.get(id) !== row) edited.push(row);
  }
  return { kind, added, edited, removed };
}

/** Writes the difference a kind at a time: what is referred to comes before what refers, and goes after it. */
export async function storeMerged(
  documents: DocumentRepository,
  before: SurveyDocument,
  after: SurveyDocument,
  changes: Changes,
): Promise<void> {
  const writes = ENTITY_KINDS.map((kind) => writesOf(kind, before, after, changes));
  for (const { kind, added } of writes) await documents.insert(after.surveyId, kind, added);
  for (const { kind, edited } of writes) await documents.update(after.surveyId, kind, edited);
  for (const { kind, removed } of [...writes].reverse()) await documents.remove(after.surveyId, kind, removed);
}
