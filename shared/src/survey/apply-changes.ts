import type { Change, Changes } from './change.ts';
import { mapName, type MapName } from './rows.ts';
import type { SurveyDocument } from './survey-document.ts';

interface Outcome {
  readonly changes: Changes;
  readonly before: SurveyDocument;
  readonly after: SurveyDocument;
}

/** The last outcome, because a command looks at it just before the session takes it. One only, so no history is held. */
let last: Outcome | null = null;

/**
 * The document after the changes. Untouched maps and rows are the very same objects as before, so whatever was derived
 * from them stays valid. `sequence` is not raised: the change set's receiver does that.
 *
 * @throws ChangesDoNotFit when an edit names a row the document does not have; merge first
 */
export function applyChanges(document: SurveyDocument, changes: Changes): SurveyDocument {
  if (last?.changes === changes && last.before === document) return last.after;
  const copies = new Map<MapName, Map<string, object>>();
  for (const change of changes) {
    const name = mapName(change.kind);
    let rows = copies.get(name);
    if (rows === undefined) {
      rows = new Map<string, object>(document[name]);
      copies.set(name, rows);
    }
    applyOne(rows, change);
  }
  if (copies.size === 0) return document;
  const after = { ...document, ...(Object.fromEntries(copies) as unknown as Partial<SurveyDocument>) };
  last = { changes, before: document, after };
  return after;
}

function applyOne(rows: Map<string, object>, change: Change): void {
  if (change.after === null) rows.delete(change.id);
  else if (change.before === null) rows.set(change.id, change.after);
  else {
    const row = rows.get(change.id);
    if (row === undefined) throw new ChangesDoNotFit(change);
    rows.set(change.id, { ...row, ...change.after });
  }
}

export class ChangesDoNotFit extends Error {
  constructor(readonly change: Change) {
    super(`The ${change.kind} ${change.id} is not in this document, so a change to it cannot be applied.`);
    this.name = 'ChangesDoNotFit';
  }
}
