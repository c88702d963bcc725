import type { Flow } from '../layout/flow.ts';
import { SIZE, SOFT } from '../layout/theme.ts';
import { writeHeading } from '../layout/write-heading.ts';
import { writeText } from '../layout/write-text.ts';
import type { ReportBook, RoomReport } from '../report-book.ts';
import type { RoomNotes } from './room-notes.ts';
import { writeFigureList } from './write-figure-list.ts';

/** When sprinklers and detectors would answer to the curve above; nothing where neither is recorded. */
export function writeResponse(flow: Flow, { figures }: ReportBook, { tally }: RoomReport, notes: RoomNotes): void {
  const { sprinkler, detector, heatDetector, smokeDetector } = tally.response;
  if (sprinkler === undefined && detector === undefined) return;
  const both = heatDetector !== undefined && smokeDetector !== undefined;
  writeHeading(flow, 'When it would be noticed', 40);
  writeFigureList(flow, figures, notes, [
    ['First sprinkler opens after', sprinkler],
    ['First detector answers after', both ? undefined : detector],
    ['Smoke detector answers after', both ? smokeDetector : undefined],
    ['Heat detector answers after', both ? heatDetector : undefined],
  ]);
  flow.gap(4);
  const text =
    'The heat release curve goes on as if nothing answered: the design load already counts what is put in to fight a fire. Real heads lose heat to their pipes and answer later.';
  writeText(flow, text, { size: SIZE.table, colour: SOFT });
  flow.gap(SIZE.heading);
}
