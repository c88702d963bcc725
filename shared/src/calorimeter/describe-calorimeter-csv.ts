import type { CalorimeterChoices, Delimiter } from './calorimeter-choices.ts';
import type { CalorimeterColumn } from './calorimeter-column.ts';
import { cellNumber, clockSeconds } from './cell-number.ts';
import { columnUnit } from './column-units.ts';
import { decimalMark } from './decimal-mark.ts';
import { eachLine } from './each-line.ts';
import { findDelimiter } from './find-delimiter.ts';
import { proposeColumns } from './propose-columns.ts';
import { splitCells } from './split-cells.ts';

export interface CalorimeterDescription {
  readonly columns: readonly CalorimeterColumn[];
  readonly proposed: CalorimeterChoices;
  /** What was assumed, and what a person should look at before going on. */
  readonly notes: readonly string[];
}

const LOOK_AT = 500;
const SHOWN = 3;

/**
 * Looks at the first lines of a calorimeter's file and proposes how to read it: delimiter, decimal mark, where the readings
 * begin, which column is what. Columns are proposed by their own names only, never because of where they stand.
 * @param delimiter only where a person has chosen one
 */
export function describeCalorimeterCsv(text: string, delimiter?: Delimiter): CalorimeterDescription {
  const lines: string[] = [];
  const numbers: number[] = [];
  eachLine(text, (line, number) => {
    if (line.trim() !== '' && !/^sep=.$/i.test(line)) {
      lines.push(line);
      numbers.push(number);
    }
    return lines.length < LOOK_AT;
  });
  const mark = delimiter ?? findDelimiter(lines);
  const rows = lines.map((line) => splitCells(line, mark));
  const first = firstReadings(rows);
  const readings = rows.slice(first);
  const decimal = mark === ',' ? 'point' : decimalMark(readings);
  const columns = columnsOf(rows.slice(0, first), readings);
  const { columns: mapped, units, notes } = proposeColumns(columns);
  return {
    columns,
    proposed: {
      delimiter: mark,
      decimal,
      firstLine: numbers[first] ?? 1,
      columns: mapped,
      units,
      from: mapped.rate === undefined && mapped.oxygen !== undefined && mapped.flow !== undefined ? 'gases' : 'rate',
    },
    notes,
  };
}

const isReading = (cell: string): boolean =>
  typeof cellNumber(cell, null) === 'number' ||
  cellNumber(cell, null) === 'ambiguous' ||
  clockSeconds(cell) !== undefined;

/** The first of three lines in a row, as wide as each other, most of whose filled cells are numbers. */
function firstReadings(rows: readonly (readonly string[])[]): number {
  const holds = rows.map((cells) => {
    const filled = cells.filter((cell) => cell !== '');
    return filled.length > 0 && filled.filter(isReading).length * 2 >= filled.length;
  });
  const found = rows.findIndex((cells, i) => {
    const next = rows.slice(i, i + 3);
    return next.every((other, k) => holds[i + k] && other.length === cells.length);
  });
  return found === -1 ? rows.length : found;
}

function columnsOf(head: readonly (readonly string[])[], readings: readonly (readonly string[])[]) {
  const width = Math.max(0, ...readings.slice(0, 10).map((cells) => cells.length), head.at(-1)?.length ?? 0);
  const last = head.at(-1) ?? [];
  const unitsLine = head.length > 1 && isUnitsLine(last) ? last : undefined;
  const names = (unitsLine === undefined ? last : head.at(-2)) ?? [];
  return Array.from({ length: width }, (_, index): CalorimeterColumn => {
    const cells = readings.map((row) => row[index] ?? '').filter((cell) => cell !== '');
    const { name, unitText } = nameAndUnit(names[index] ?? '');
    const spelled = unitsLine?.[index]?.replaceAll(/^[([]|[)\]]$/g, '') ?? unitText;
    return {
      index,
      name: name === '' ? `Column ${index + 1}` : name,
      unitText: spelled,
      unit: columnUnit(spelled),
      samples: cells.slice(0, SHOWN),
      empty: cells.length === 0,
    };
  });
}

/** A second header line that holds units only: `s;kW;%`. */
function isUnitsLine(cells: readonly string[]): boolean {
  const filled = cells.filter((cell) => cell !== '').map((cell) => cell.replaceAll(/^[([]|[)\]]$/g, ''));
  return filled.length > 0 && filled.filter((cell) => columnUnit(cell) !== null).length * 2 > filled.length;
}

/** `HRR (kW/m2)`, `HRR [kW]`, `HRR in kW` */
function nameAndUnit(header: string): { readonly name: string; readonly unitText: string } {
  const match = /^(.*?)\s*(?:[([]([^)\]]*)[)\]]|\s(?:in|\/)\s(\S+))\s*$/.exec(header);
  if (match === null) return { name: header.trim(), unitText: '' };
  return { name: (match[1] ?? '').trim(), unitText: (match[2] ?? match[3] ?? '').trim() };
}
