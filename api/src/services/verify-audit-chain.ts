import { createHash } from 'node:crypto';
import type { AuditRow } from '../repositories/audit-repository.ts';

export type ChainVerdict =
  | { readonly whole: true; readonly events: number }
  /** The first position that does not follow from what comes before it. */
  | { readonly whole: false; readonly brokenAt: number };

/** Recomputes a chain from its first event and compares the end with the head, so that a cut tail shows too. */
export function verifyAuditChain(
  rows: readonly AuditRow[],
  head: { readonly position: number; readonly hash: string } | null,
): ChainVerdict {
  let previous = '';
  for (const [index, row] of rows.entries()) {
    const position = index + 1;
    const expected = createHash('sha256').update(`${previous}\n${position}\n${row.record}`, 'utf8').digest('hex');
    if (row.position !== position || row.hash !== expected) return { whole: false, brokenAt: position };
    previous = row.hash;
  }
  if ((head?.position ?? 0) !== rows.length || (head?.hash ?? '') !== previous) {
    return { whole: false, brokenAt: rows.length + 1 };
  }
  return { whole: true, events: rows.length };
}
