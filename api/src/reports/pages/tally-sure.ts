import type { Flow } from '../layout/flow.ts';
import { SIZE, SOFT } from '../layout/theme.ts';
import { writeHeading } from '../layout/write-heading.ts';
import { writeTable, type Column } from '../layout/write-table.ts';
import { writeText } from '../layout/write-text.ts';
import type { ReportBook, RoomReport } from '../report-book.ts';

const LISTED = 6;
const BANDS = [
  ['perFloor', 'Fire load density'],
  ['total', 'Heat kept in this room'],
  ['peak', 'Peak heat release'],
  ['equivalentTime', 'Equivalent time, as kept'],
] as const;

/** How sure the numbers are, what matters most and what would make them surer; nothing where nothing was sampled. */
export function writeSure(flow: Flow, { figures }: ReportBook, { tally: { uncertainty } }: RoomReport): void {
  if (uncertainty === undefined || uncertainty.shares.length === 0) return;
  const { bands, shares, advice, samples, seed } = uncertainty;
  writeHeading(flow, 'How sure');
  const columns: Column[] = [
    { title: `Lower in so many of ${samples} samples, seed ${seed}`, width: { share: 1 } },
    ...['5 %', 'Middle', '80 %', '95 %'].map((title) => ({ title, width: 62, align: 'right' as const })),
  ];
  const rows = BANDS.flatMap(([key, label]) => {
    const band = bands[key];
    if (band === undefined) return [];
    const cells = [band.p5, band.p50, band.p80, band.p95].map((place) => figures.bareEstimate(place));
    return [{ cells: [`${label}, ${figures.unit(band.p5.unit)}`, ...cells] }];
  });
  writeTable(flow, columns, rows);
  flow.gap(10);
  const matters: Column[] = [
    { title: 'What matters most', width: { share: 1 } },
    { title: 'Share of the variance', width: 110, align: 'right' },
  ];
  writeTable(
    flow,
    matters,
    shares.slice(0, LISTED).map(({ label, share }) => ({ cells: [label, figures.estimate(share)] })),
  );
  flow.gap(6);
  for (const { text } of advice) writeText(flow, text, { size: SIZE.table, colour: SOFT, after: 3 });
  flow.gap(10);
}
