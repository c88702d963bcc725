import { applyChanges } from './apply-changes.ts';
import type { Done, Refusal } from './command.ts';
import { SurveyDraft } from './draft/survey-draft.ts';
import { finish } from './draft/finish.ts';
import { ENTITY_KINDS, type SurveyDocument } from './survey-document.ts';
import { rowsOf } from './rows.ts';

/**
 * Several commands as one gesture, each on the outcome of the one before: one change set, one undo step, and when one is
 * refused none happens.
 */
export function inSequence(
  document: SurveyDocument,
  steps: readonly ((document: SurveyDocument) => Done | Refusal)[],
): Done | Refusal {
  let outcome = document;
  const touched = new Map(ENTITY_KINDS.map((kind) => [kind, new Set<string>()]));
  for (const step of steps) {
    const done = step(outcome);
    if (done.refused) return done;
    for (const { kind, id } of done.changes) touched.get(kind)?.add(id);
    outcome = applyChanges(outcome, done.changes);
  }
  const draft = new SurveyDraft(document);
  for (const [kind, ids] of touched) {
    for (const id of ids) {
      const row = rowsOf(outcome, kind).get(id);
      if (row === undefined) draft.remove(kind, id);
      else draft.put(kind, row);
    }
  }
  return finish(draft, []);
}
