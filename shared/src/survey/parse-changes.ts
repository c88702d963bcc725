import type { Change, Changes } from './change.ts';
import { patchFaults, rowFaults, type RowFault } from './row-fault.ts';
import { stepUpChanges } from './versions/step-up.ts';

export interface ChangesFault {
  /** JSON pointer into the change set's body. */
  readonly pointer: string;
  readonly code: string;
  readonly message: string;
}

export type ParsedChanges =
  { readonly ok: true; readonly value: Changes } | { readonly ok: false; readonly errors: readonly ChangesFault[] };

/**
 * Holds the rows and fields of a change set against the schema of their kind: a create carries a whole row of its own
 * id, an edit the same known fields on both sides, a delete a whole row before. Two changes to one row are refused.
 * Every fault is listed. Whole rows of an older release are brought to the present form first.
 */
export function parseChanges(given: Changes): ParsedChanges {
  const changes = stepUpChanges(given);
  const errors: ChangesFault[] = [];
  const seen = new Set<string>();
  for (const [index, change] of changes.entries()) {
    const at = `/changes/${index}`;
    if (seen.has(change.id)) {
      errors.push({ pointer: at, code: 'ROW_TWICE', message: 'One change set changes a row once only.' });
    }
    seen.add(change.id);
    errors.push(...faultsOf(change, at));
  }
  return errors.length === 0 ? { ok: true, value: changes } : { ok: false, errors };
}

function faultsOf({ kind, id, before, after }: Change, at: string): ChangesFault[] {
  if (before === null && after === null) {
    return [{ pointer: at, code: 'CHANGE_EMPTY', message: 'A change needs a row before, a row after, or both.' }];
  }
  if (before !== null && after !== null) {
    const same = Object.keys(before).sort().join() === Object.keys(after).sort().join();
    const message = 'An edit carries the same fields before and after.';
    const lopsided = same ? [] : [{ pointer: at, code: 'EDIT_LOPSIDED', message }];
    return [
      ...lopsided,
      ...listed(patchFaults(kind, before), `${at}/before`),
      ...listed(patchFaults(kind, after), `${at}/after`),
    ];
  }
  const [side, row] = before === null ? (['after', after] as const) : (['before', before] as const);
  const faults = listed(rowFaults(kind, row), `${at}/${side}`);
  if (row?.['id'] !== id) {
    faults.push({
      pointer: `${at}/${side}/id`,
      code: 'ID_DIFFERS',
      message: 'The row has another id than its change.',
    });
  }
  return faults;
}

function listed(faults: readonly RowFault[], at: string): ChangesFault[] {
  return faults.map(({ pointer, message }) => ({ pointer: at + pointer, code: 'FIELD_OUT_OF_RANGE', message }));
}
