import type { KeptSet } from './kept-set.ts';

/** Hands the unsent changes to the person as a file, so that they are not lost when the server will never take them. */
export function saveUnsent(sets: readonly KeptSet[]): void {
  const text = JSON.stringify(
    sets.map(({ body, held }) => ({ ...body, reason: held?.reason ?? null })),
    null,
    2,
  );
  const url = URL.createObjectURL(new Blob([text], { type: 'application/json' }));
  const link = document.createElement('a');
  link.href = url;
  link.download = 'unsent-changes.json';
  link.click();
  URL.revokeObjectURL(url);
}
