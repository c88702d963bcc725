import type { Changes } from './change.ts';

/** The changes that take a document back to where it was before `changes`, last one first. */
export function invertChanges(changes: Changes): Changes {
  return changes.map(({ kind, id, before, after }) => ({ kind, id, before: after, after: before })).reverse();
}
