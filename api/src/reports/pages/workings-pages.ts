import type { Flow } from '../layout/flow.ts';
import { SIZE, SOFT } from '../layout/theme.ts';
import { writeHeading, writeTitle } from '../layout/write-heading.ts';
import { writeTable } from '../layout/write-table.ts';
import { writeText } from '../layout/write-text.ts';
import type { Sheet } from '../pdf/sheet.ts';
import type { ReportBook, RoomReport } from '../report-book.ts';
import { groupWorkings } from './group-workings.ts';
import { tallyEstimates } from './tally-estimates.ts';
import { workingFigure } from './working-figure.ts';
import { writeWorking } from './write-working.ts';

/** All workings of one room: every number with its relation, inputs and where they came from. Returns the first sheet. */
export function writeWorkingsPages(flow: Flow, report: ReportBook, room: RoomReport): Sheet {
  const sheet = flow.startSection(`Workings · ${room.room.name}`);
  const engine = `Room ${room.number} · engine ${room.tally.engine} · in SI, as the methods are written`;
  writeTitle(flow, `Workings: ${room.room.name}`, engine);
  writeEntries(flow, room);
  writeMaterials(flow, room);
  writeHeading(flow, 'Every number of the tally');
  for (const group of groupWorkings(tallyEstimates(room.tally))) writeWorking(flow, group);
  return sheet;
}

/** The inputs of each entry's heat, part by part, with where the heat of combustion came from. */
function writeEntries(flow: Flow, { entries, tally }: RoomReport): void {
  const heats = new Map(tally.load.byEntry.map(({ id, heat }) => [id, heat]));
  const method = tally.load.byEntry[0]?.heat.method;
  if (method === undefined) return;
  writeHeading(flow, 'Heat of each entry');
  const note = `${method}: pieces × mass of one × net heat × enclosure factor, part by part. Entry numbers are the ledger’s.`;
  writeText(flow, note, { size: SIZE.table, colour: SOFT, after: 4 });
  const columns = [
    { title: '', width: 18, align: 'right' as const },
    { title: 'Entry and its parts', width: { share: 1 } },
    { title: 'n', width: 30, align: 'right' as const },
    { title: 'M, kg', width: 48, align: 'right' as const },
    { title: 'H, MJ/kg', width: 48, align: 'right' as const },
    { title: 'ψ', width: 28, align: 'right' as const },
    { title: 'Heat', width: 62, align: 'right' as const },
    { title: 'Source of H', width: 50, align: 'right' as const },
  ];
  const sources = [...new Set(entries.flatMap(({ parts }) => parts.map(({ heat_source }) => heat_source)))];
  writeTable(flow, columns, rows(), { size: SIZE.note });
  flow.gap(5);
  for (const [index, source] of sources.entries()) {
    const text = source === '' ? 'no source recorded' : source;
    writeText(flow, `Source ${index + 1}: ${text}`, { size: SIZE.note, colour: SOFT });
  }

  function* rows() {
    for (const [index, entry] of entries.entries()) {
      const heat = heats.get(entry.id);
      const input = (name: string) => workingFigure(heat?.inputs?.find((one) => one.name === name)?.value);
      const parts = entry.parts.map(({ label }) => label).join('; ');
      const numbers = [...new Set(entry.parts.map(({ heat_source }) => sources.indexOf(heat_source) + 1))];
      yield {
        cells: [
          String(index + 1),
          parts === entry.label ? entry.label : `${entry.label}: ${parts}`,
          String(entry.count),
          input('M'),
          input('H'),
          input('psi'),
          workingFigure(heat?.value, heat?.unit),
          numbers.join('; '),
        ],
      };
    }
  }
}

function writeMaterials(flow: Flow, { tally }: RoomReport): void {
  if (tally.load.byMaterial.length === 0) return;
  flow.gap(12);
  writeHeading(flow, 'Heat of each material');
  const columns = [
    { title: 'Material', width: { share: 1 } },
    { title: 'Mass', width: 80, align: 'right' as const },
    { title: 'Heat', width: 80, align: 'right' as const },
    { title: 'Share', width: 60, align: 'right' as const },
  ];
  const rows = tally.load.byMaterial.map(({ label, mass_kg, heat, share }) => ({
    cells: [
      label,
      workingFigure(mass_kg, 'kg'),
      workingFigure(heat.value, heat.unit),
      `${workingFigure(Number((share * 100).toPrecision(3)))} %`,
    ],
  }));
  writeTable(flow, columns, rows, { size: SIZE.note });
  flow.gap(14);
}
