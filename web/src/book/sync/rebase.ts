import { applyChanges } from '@embertally/shared/survey/apply-changes';
import type { Change, Changes } from '@embertally/shared/survey/change';
import { mergeChangeSet } from '@embertally/shared/survey/merge-change-set';
import { rowsOf } from '@embertally/shared/survey/rows';
import type { SurveyDocument } from '@embertally/shared/survey/survey-document';

/**
 * The document as this person sees it: the server's, with the unsent changes on top. What clashes is shown as this person
 * left it until they choose; what has nothing to hold on to any more (its row was deleted) is left out.
 */
export function rebase(base: SurveyDocument, unsent: readonly Changes[]): SurveyDocument {
  return unsent.reduce(putOnTop, base);
}

function putOnTop(document: SurveyDocument, changes: Changes): SurveyDocument {
  const merged = mergeChangeSet(document, changes);
  if (merged.ok) return applyChanges(document, merged.changes);
  return applyChanges(
    document,
    changes.filter((change) => hasPlace(document, change)),
  );
}

function hasPlace(document: SurveyDocument, change: Change): boolean {
  const exists = rowsOf(document, change.kind).has(change.id);
  return change.before === null ? !exists : exists;
}
