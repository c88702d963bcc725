import type { Flow } from '../layout/flow.ts';
import { writeTable, type Column, type TableRow } from '../layout/write-table.ts';
import type { ReportBook, RoomReport } from '../report-book.ts';

const WEAK: readonly string[] = ['estimated', 'hearsay'];

/** Every entry with its heat and the sum so far; amounts that nobody weighed or counted are underlined with dots. */
export function writeLedger(flow: Flow, { figures }: ReportBook, { entries, tally }: RoomReport): void {
  if (entries.length === 0) return;
  const unit = figures.unit('MJ');
  const columns: Column[] = [
    { title: '', width: 18, align: 'right' },
    { title: 'Entry', width: { share: 1 } },
    { title: 'Quantity', width: 84, align: 'right' },
    { title: 'Kept', width: 38 },
    { title: 'How known', width: 50 },
    { title: `Heat, ${unit}`, width: 54, align: 'right' },
    { title: `Running, ${unit}`, width: 58, align: 'right' },
  ];
  writeTable(flow, columns, ledgerRows(), { gutter: 12 });
  flow.gap(14);

  function* ledgerRows(): Generator<TableRow> {
    const heats = new Map(tally.load.byEntry.map((share) => [share.id, share.heat]));
    let running = 0;
    for (const [index, entry] of entries.entries()) {
      const heat = heats.get(entry.id)?.value ?? 0;
      running += heat;
      const each = entry.parts.reduce((sum, part) => sum + part.mass_kg, 0);
      const enclosed = entry.enclosure === 'open' ? '' : `, ${entry.enclosure}`;
      yield {
        cells: [
          String(index + 1),
          `${entry.label}${enclosed}`,
          `${figures.asEntered(entry.count, '')} × ${figures.asEntered(each, 'kg')}`,
          entry.keeping,
          { text: entry.evidence, dotted: WEAK.includes(entry.evidence) },
          figures.bare(heat, 'MJ'),
          figures.bare(running, 'MJ'),
        ],
      };
    }
    yield {
      kind: 'total',
      cells: ['', 'Heat kept in this room', '', '', '', figures.bareEstimate(tally.load.total), ''],
    };
  }
}
