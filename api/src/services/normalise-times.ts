import type { Change, Changes } from '@embertally/shared/survey/change';
import { timeFields } from '../repositories/row-columns.ts';

const time = (value: unknown): unknown =>
  typeof value === 'string' && !Number.isNaN(Date.parse(value)) ? new Date(value).toISOString() : value;

/** Times in the one form the database gives back, so that equal times compare equal. */
export function normaliseTimes(changes: Changes): Changes {
  return changes.map((change): Change => {
    const fields = timeFields(change.kind);
    if (fields.length === 0) return change;
    const side = (row: Change['before']): Change['before'] =>
      row === null || !fields.some((field) => field in row)
        ? row
        : Object.fromEntries(
            Object.entries(row).map(([key, value]) => [key, fields.includes(key) ? time(value) : value]),
          );
    return { ...change, before: side(change.before), after: side(change.after) };
  });
}
