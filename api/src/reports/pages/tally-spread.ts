import { GAP_METHOD, SPREAD_METHOD } from '@embertally/shared/methods/models/spread-method';
import type { SpreadTally, SpreadTallyGap } from '@embertally/shared/tally/room-tally';
import type { Flow } from '../layout/flow.ts';
import { SIZE, SOFT } from '../layout/theme.ts';
import { writeHeading } from '../layout/write-heading.ts';
import { writeTable, type TableRow } from '../layout/write-table.ts';
import { writeText } from '../layout/write-text.ts';
import type { ReportBook, RoomReport } from '../report-book.ts';
import { causeWords } from './cause-words.ts';
import type { RoomNotes } from './room-notes.ts';
import { typeset } from './typeset.ts';
import { writeFigureList } from './write-figure-list.ts';

/** Rows that a page still reads well; how many more there are is said below. */
const MOST_EVENTS = 40;
const MOST_GAPS = 25;

/** The order of ignition, the fire that comes of it, the gaps that are too small, and what the model leaves out. */
export function writeSpread(flow: Flow, { figures }: ReportBook, report: RoomReport, notes: RoomNotes): void {
  const { spread } = report.tally;
  if (spread?.events === undefined) return;
  // The number is the ledger's and the plan's: two stacks may have one name.
  const names = new Map(report.entries.map(({ id, label }, index) => [id, `${label} (${index + 1})`]));
  const nameOf = (id: string): string => names.get(id) ?? id;
  writeHeading(flow, 'What sets what alight', 80);
  writeText(flow, firstWords(spread, nameOf), { after: 4 });
  writeFigureList(flow, figures, notes, [
    ['Flashover after', spread.flashover],
    ['Peak heat release', spread.peak],
    ['The fire ends after', spread.end],
    ['Heat released in all', spread.heatReleased],
    ['Heat left unburnt', spread.unburnt],
  ]);
  flow.gap(8);
  const events = spread.events.slice(0, MOST_EVENTS).map((event, index): TableRow => ({
    cells: [
      String(index + 1),
      event.id === null ? 'The fire goes out' : nameOf(event.id),
      causeWords(event, nameOf),
      figures.estimate(event.t),
      event.flux === undefined ? '' : `${figures.bareEstimate(event.flux)}${notes.marks(event.flux)}`,
    ],
  }));
  const columns = [
    { title: '', width: 16, align: 'right' as const },
    { title: 'Entry', width: { share: 1 } },
    { title: 'Lit by', width: { share: 1.2 } },
    { title: 'After', width: 74, align: 'right' as const },
    { title: `Radiation, ${figures.unit('kW/m2')}`, width: 62, align: 'right' as const },
  ];
  writeTable(flow, columns, events);
  more(flow, spread.events.length - events.length, 'entries light after these');
  flow.gap(8);
  writeGaps(flow, figures, notes, spread, nameOf);
  const limits = [...SPREAD_METHOD.limits, ...GAP_METHOD.limits].join(' ');
  writeText(flow, `What this leaves out: ${typeset(limits)}`, { size: SIZE.table, colour: SOFT });
  flow.gap(SIZE.heading);
}

function firstWords({ first, firstChosen, firstTried, firstOf }: SpreadTally, nameOf: (id: string) => string): string {
  const name = first === undefined ? 'An entry' : nameOf(first);
  if (firstChosen === 'given') return `${name} burns first, as chosen for this room.`;
  const tried = firstTried === undefined || firstOf === undefined ? '' : ` of ${firstTried} tried out of ${firstOf}`;
  return `${name} burns first: the worst${tried}.`;
}

function writeGaps(
  flow: Flow,
  figures: ReportBook['figures'],
  notes: RoomNotes,
  { gaps = [], pairs = 0, pairsShort = gaps.length }: SpreadTally,
  nameOf: (id: string) => string,
): void {
  if (gaps.length === 0) {
    const none =
      pairs === 0
        ? 'No two entries on the plan stand within 10 m of each other.'
        : `None of the ${pairs} pairs within 10 m stands nearer than what is enough in this model.`;
    writeText(flow, none, { after: 6 });
    return;
  }
  const text = `${pairsShort} of ${pairs} pairs within 10 m stand nearer than what is enough. Enough counts twice the radiation; however long counts its peak for ever.`;
  writeText(flow, text, { after: 4 });
  const length = (gap: SpreadTallyGap, key: 'gap_m' | 'just_not_m' | 'enough_m' | 'long_exposure_m'): string => {
    const { never } = gap[key];
    return `${figures.bareEstimate(gap[key])}${never === undefined ? '' : notes.marked([never])}`;
  };
  const shown = gaps.slice(0, MOST_GAPS);
  const unit = figures.unit('m');
  const columns = [
    { title: 'From', width: { share: 1 } },
    { title: 'To', width: { share: 1 } },
    { title: `Now, ${unit}`, width: 48, align: 'right' as const },
    { title: `Just not lit, ${unit}`, width: 52, align: 'right' as const },
    { title: `Enough, ${unit}`, width: 52, align: 'right' as const },
    { title: `However long, ${unit}`, width: 58, align: 'right' as const },
  ];
  const rows = shown.map((gap) => ({
    cells: [
      nameOf(gap.from),
      nameOf(gap.to),
      length(gap, 'gap_m'),
      length(gap, 'just_not_m'),
      length(gap, 'enough_m'),
      length(gap, 'long_exposure_m'),
    ],
  }));
  writeTable(flow, columns, rows);
  more(flow, pairsShort - shown.length, 'pairs fall short by less and are not listed');
  flow.gap(6);
}

function more(flow: Flow, count: number, what: string): void {
  if (count > 0) writeText(flow, `${count} ${what}.`, { size: SIZE.table, colour: SOFT });
}
