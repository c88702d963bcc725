import type { Estimate } from '@embertally/shared/methods/estimate';
import type { Flow } from '../layout/flow.ts';
import { LEADING, SIZE, SOFT } from '../layout/theme.ts';
import { writeTitle } from '../layout/write-heading.ts';
import { writeText } from '../layout/write-text.ts';
import type { Sheet } from '../pdf/sheet.ts';
import type { RoomReport } from '../report-book.ts';
import { sourceText } from './source-text.ts';
import { typeset } from './typeset.ts';
import { tallyEstimates } from './tally-estimates.ts';

/** Each method that was used, once: its relation, what it takes for granted, why it was chosen, its source. */
export function writeMethodsPage(flow: Flow, rooms: readonly RoomReport[]): Sheet {
  const methods = new Map<string, Estimate>();
  for (const { tally } of rooms) {
    for (const { estimate } of tallyEstimates(tally)) {
      if (!methods.has(estimate.method)) methods.set(estimate.method, estimate);
    }
  }
  const sheet = flow.startSection('Methods');
  writeTitle(
    flow,
    'Methods',
    'Published relations only; each number above names the one it comes from and its version.',
  );
  for (const [id, { title, equation, assumptions, why, sources }] of [...methods].sort(([a], [b]) =>
    a < b ? -1 : 1,
  )) {
    flow.need(SIZE.body * LEADING * 4);
    writeText(flow, title ?? id, { weight: 'bold' });
    const small = { size: SIZE.table, indent: 12 };
    writeText(flow, id, { ...small, colour: SOFT });
    if (equation !== undefined) writeText(flow, equation, small);
    if (why !== undefined) writeText(flow, `Why this one: ${why}`, small);
    for (const assumption of assumptions ?? []) writeText(flow, `Takes for granted: ${typeset(assumption)}`, small);
    writeText(flow, `Source: ${(sources ?? []).map(sourceText).join('; ')}`, { ...small, colour: SOFT, after: 8 });
  }
  return sheet;
}
