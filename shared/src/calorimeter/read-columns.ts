import type { CalorimeterChoices } from './calorimeter-choices.ts';
import { cellNumber, clockSeconds } from './cell-number.ts';
import { COLUMN_UNITS, ROLE_WORDS, ROLES, type Role } from './column-units.ts';
import { eachLine } from './each-line.ts';
import type { FaultList } from './fault-list.ts';
import { GrowingNumbers } from './growing-numbers.ts';
import { splitCells } from './split-cells.ts';

/** Rows of the mapped columns, in SI; NaN stands for a blank. */
export interface ReadColumns {
  readonly lines: Float64Array;
  readonly values: Partial<Readonly<Record<Role, Float64Array>>>;
}

const MOST_ROWS = 2_000_000;

interface Column {
  readonly role: Role;
  readonly index: number;
  readonly factor: number;
  readonly clock: boolean;
  readonly into: GrowingNumbers;
}

/** Reads the mapped columns line by line. What is no number is a fault at its line; the row then counts as blank. */
export function readColumns(
  text: string,
  choices: CalorimeterChoices,
  roles: readonly Role[],
  faults: FaultList,
): ReadColumns {
  const columns = ROLES.filter((role) => roles.includes(role)).flatMap((role) => columnOf(choices, role));
  const widest = Math.max(...columns.map(({ index }) => index));
  const lines = new GrowingNumbers();
  eachLine(text, (line, number) => {
    if (number < choices.firstLine || line.trim() === '') return true;
    if (lines.length === MOST_ROWS) {
      faults.add(
        number,
        'too_long',
        () => `The file has more than ${MOST_ROWS.toLocaleString('en')} readings. Thin it out first.`,
      );
      return false;
    }
    const cells = cellsUpTo(line, choices.delimiter, widest);
    if (cells.length <= widest && cells.length > 1 && !columns.every(({ index }) => index < cells.length))
      faults.add(
        number,
        'short_line',
        () => `The line ends after ${cells.length} cells; a chosen column is not there.`,
      );
    lines.push(number);
    for (const column of columns)
      column.into.push(readCell(cells[column.index] ?? '', column, number, choices, faults));
    return true;
  });
  return {
    lines: lines.taken(),
    values: Object.fromEntries(columns.map(({ role, into }) => [role, into.taken()])),
  };
}

function columnOf(choices: CalorimeterChoices, role: Role): Column[] {
  const index = choices.columns[role];
  if (index === undefined) return [];
  const unit = choices.units[role] ?? '';
  const factor = COLUMN_UNITS[role][unit] ?? 1;
  return [{ role, index, factor, clock: unit === 'clock', into: new GrowingNumbers() }];
}

/** The cells up to the last one that is needed: seventy columns are not cut up for two. */
function cellsUpTo(line: string, delimiter: string, widest: number): readonly string[] {
  if (line.includes('"')) return splitCells(line, delimiter);
  const cells: string[] = [];
  let start = 0;
  while (cells.length <= widest) {
    const end = line.indexOf(delimiter, start);
    cells.push((end === -1 ? line.slice(start) : line.slice(start, end)).trim());
    if (end === -1) break;
    start = end + 1;
  }
  return cells;
}

function readCell(cell: string, column: Column, line: number, choices: CalorimeterChoices, faults: FaultList): number {
  const words = ROLE_WORDS[column.role];
  if (column.clock) {
    const seconds = clockSeconds(cell);
    if (seconds === undefined && cell !== '')
      faults.add(line, 'not_a_time', () => `“${cell.slice(0, 40)}” is no time such as 0:07:20.`);
    return seconds ?? Number.NaN;
  }
  const read = cellNumber(cell, choices.decimal);
  if (typeof read === 'number') return read * column.factor;
  if (read === 'text')
    faults.add(
      line,
      'not_a_number',
      () => `“${cell.slice(0, 40)}” is no number for ${words}. Correct it or leave it blank.`,
    );
  if (read === 'ambiguous')
    faults.add(
      line,
      'ambiguous',
      () =>
        `“${cell.slice(0, 40)}” may be a thousand and more, or a decimal. Say whether the comma or the point starts the decimals.`,
    );
  return Number.NaN;
}
