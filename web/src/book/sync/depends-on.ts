import type { Changes } from '@embertally/shared/survey/change';

/**
 * Whether a later change set builds on an earlier one that is held: it touches or names a row the earlier one made or
 * deleted, or edits a field the earlier one edited. Such a set cannot go on alone.
 */
export function dependsOn(later: Changes, earlier: Changes): boolean {
  const whole = new Set<string>();
  const fields = new Set<string>();
  for (const change of earlier)
    if (change.before === null || change.after === null) whole.add(change.id);
    else for (const field of Object.keys(change.after)) fields.add(`${change.id} ${field}`);
  return later.some(
    (change) =>
      whole.has(change.id) ||
      names(change.after, whole) ||
      Object.keys(change.after ?? change.before ?? {}).some((field) => fields.has(`${change.id} ${field}`)),
  );
}

/** Whether a value holds one of the ids anywhere inside: a room of an entry, a corner of a ring. */
function names(value: unknown, ids: ReadonlySet<string>): boolean {
  if (typeof value === 'string') return ids.has(value);
  if (typeof value !== 'object' || value === null) return false;
  return Object.values(value).some((inner) => names(inner, ids));
}
