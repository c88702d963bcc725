import type { Change } from '../change.ts';
import type { EntityKind } from '../survey-document.ts';

type Fields = Readonly<Record<string, unknown>>;

/** What version 2 added to rows, and what an older row means by not having it. */
const ADDED: Readonly<Partial<Record<EntityKind, Fields>>> = {
  room: { assumptions: null, photos: [], to_do: '' },
  entry: { measure: null },
};

/**
 * Changes made by an older release, brought to the present form: kept sets on a device, undo steps and the feed hold
 * whole rows of their day. Edits carry touched fields only and stay as they are.
 */
export function stepUpChanges<C extends Change>(changes: readonly C[]): C[] {
  return changes.map((change) => (isOld(change) ? stepUp(change) : change));
}

function isOld({ kind, before, after }: Change): boolean {
  const row = wholeRow(before, after);
  const added = ADDED[kind];
  return row !== null && added !== undefined && Object.keys(added).some((field) => !(field in row));
}

function stepUp<C extends Change>(change: C): C {
  const added = ADDED[change.kind];
  return change.before === null
    ? { ...change, after: { ...added, ...change.after } }
    : { ...change, before: { ...added, ...change.before } };
}

function wholeRow(before: Change['before'], after: Change['after']): Change['before'] {
  if (before === null) return after;
  return after === null ? before : null;
}
