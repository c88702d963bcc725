import { applyChanges } from '../apply-changes.ts';
import { MAX_CHANGES, MAX_CHANGE_SET_BYTES, type Changes } from '../change.ts';
import { checkInvariants } from '../check-invariants.ts';
import type { Done, Refusal } from '../command.ts';
import type { Violation } from '../invariants/violation.ts';
import { refuse } from '../refuse.ts';
import type { SurveyDocument } from '../survey-document.ts';
import { entryWords, listed } from '../words.ts';
import type { SurveyDraft } from './survey-draft.ts';

/** Above this many changes their size is measured as well. */
const MANY_CHANGES = 200;

/**
 * Ends a command: its changes, or why they cannot be.
 *
 * @param check the rules to hold the outcome against; by default all rules of the storeys named
 */
export function finish(
  draft: SurveyDraft,
  storeyIds: readonly string[],
  check: (outcome: SurveyDocument) => readonly Violation[] = (outcome) => checkInvariants(outcome, storeyIds),
): Done | Refusal {
  const changes = draft.changes();
  if (changes.length === 0) return { refused: false, changes };
  const tooLarge = sizeRefusal(changes);
  if (tooLarge !== null) return tooLarge;
  const violations = check(applyChanges(draft.base, changes));
  const [violation] = violations;
  return violation === undefined ? { refused: false, changes } : refusalOf(violation, violations, draft);
}

/** The first broken rule; of entries left outside their room all are named, because a person has to move them all. */
function refusalOf(first: Violation, all: readonly Violation[], draft: SurveyDraft): Refusal {
  const { code, message, field, ids } = first;
  const alike = all.filter((violation) => violation.code === code);
  if (code === 'ENTRY_OUTSIDE_ROOM' && alike.length > 1) {
    const entryIds = alike.flatMap((violation) => violation.ids.slice(0, 1));
    const names = entryIds.flatMap((id) => draft.get('entry', id) ?? []).map(entryWords);
    return refuse(code, `${listed(names)} would stand outside their rooms.`, { ids: entryIds });
  }
  return refuse(code, message, field === undefined ? { ids } : { field, ids });
}

function sizeRefusal(changes: Changes): Refusal | null {
  if (changes.length > MAX_CHANGES) {
    const message = `This would change ${changes.length} things at once; at most ${MAX_CHANGES} can go together. Do it in parts.`;
    return refuse('TOO_MANY_CHANGES', message);
  }
  if (changes.length < MANY_CHANGES || JSON.stringify(changes).length < MAX_CHANGE_SET_BYTES - 1024) return null;
  return refuse('TOO_MANY_CHANGES', 'This would change more than can be sent at once (2 MB). Do it in parts.');
}
