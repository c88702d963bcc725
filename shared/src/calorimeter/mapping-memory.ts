import type { CalorimeterChoices, CalorimeterMapping } from './calorimeter-choices.ts';
import { COLUMN_UNITS, ROLES } from './column-units.ts';
import type { CalorimeterDescription } from './describe-calorimeter-csv.ts';

/** A person's choices as something to keep for the next file with the same headers. */
export function rememberMapping({ columns }: CalorimeterDescription, choices: CalorimeterChoices): CalorimeterMapping {
  const named: Record<string, string> = {};
  const units: Record<string, string> = {};
  for (const role of ROLES) {
    const column = columns[choices.columns[role] ?? -1];
    if (column === undefined) continue;
    named[role] = column.name;
    units[role] = choices.units[role] ?? '';
  }
  return { delimiter: choices.delimiter, decimal: choices.decimal, from: choices.from, columns: named, units };
}

/** The proposal with a kept mapping in place of its columns; the proposal itself where a kept header is not there. */
export function recallMapping(
  { columns, proposed }: CalorimeterDescription,
  mapping: CalorimeterMapping,
): CalorimeterChoices {
  const mapped: Partial<Record<(typeof ROLES)[number], number>> = {};
  const units: Partial<Record<(typeof ROLES)[number], string>> = {};
  for (const role of ROLES) {
    const name = mapping.columns[role];
    if (name === undefined) continue;
    const column = columns.find((one) => one.name === name && !one.empty);
    const unit = mapping.units[role] ?? '';
    if (column === undefined || !(unit in COLUMN_UNITS[role])) return proposed;
    mapped[role] = column.index;
    units[role] = unit;
  }
  return { ...proposed, decimal: mapping.decimal ?? proposed.decimal, from: mapping.from, columns: mapped, units };
}
