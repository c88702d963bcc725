import type { EntityKind } from '../survey-document.ts';
import { sameValue } from '../same-value.ts';
import { mergeRing } from './merge-ring.ts';

type Merged = { readonly clash: false; readonly value: unknown } | { readonly clash: true };

/**
 * One field of an edit against the value it meets. It merges when the stored value is what the edit started from, or
 * already what the edit wants, whatever happened in between. Nested values are one field, except rings, whose corners
 * merge when they were put in or taken out in different walls.
 */
export function mergeField(kind: EntityKind, field: string, base: unknown, stored: unknown, wanted: unknown): Merged {
  if (sameValue(stored, base) || sameValue(stored, wanted)) return { clash: false, value: wanted };
  if (kind === 'room' && field === 'ring') return outcome(mergeRings([base], [stored], [wanted])?.[0]);
  if (kind === 'room' && field === 'holes') return outcome(mergeRings(base, stored, wanted));
  return { clash: true };
}

function outcome(value: unknown): Merged {
  return value === undefined || value === null ? { clash: true } : { clash: false, value };
}

/** Several rings side by side; only while their number and order stay the same. */
function mergeRings(base: unknown, stored: unknown, wanted: unknown): string[][] | null {
  if (!isRings(base) || !isRings(stored) || !isRings(wanted)) return null;
  if (base.length !== stored.length || base.length !== wanted.length) return null;
  const merged: string[][] = [];
  for (const [index, ring] of base.entries()) {
    const one = mergeRing(ring, stored[index] ?? [], wanted[index] ?? []);
    if (one === null) return null;
    merged.push(one);
  }
  return merged;
}

function isRings(value: unknown): value is string[][] {
  return (
    Array.isArray(value) && value.every((ring) => Array.isArray(ring) && ring.every((id) => typeof id === 'string'))
  );
}
