import type { CalorimeterChoices } from './calorimeter-choices.ts';
import { COLUMN_UNITS, ROLE_WORDS, ROLES, type Role } from './column-units.ts';
import type { CalorimeterColumn } from './calorimeter-column.ts';

/** The whole of a column's name has to be one of these: “Wall heat flux” is no heat release rate. */
const NAMES: Readonly<Record<Role, RegExp>> = {
  time: /^(test |elapsed )?time$|^t$/,
  rate: /^(total )?(hrr|rhr|heat release rate|rate of heat release)( per (unit )?area)?$|^hrrpua$|^heat release$/,
  oxygen: /^(o2|oxygen)$/,
  carbonDioxide: /^(co2|carbon dioxide)$/,
  carbonMonoxide: /^(co|carbon monoxide)$/,
  flow: /^(mfr|(exhaust |duct )?mass flow( rate)?|(exhaust|duct) flow( rate)?)$/,
  mass: /^((specimen|sample) )?(mass|weight)$/,
  massLoss: /^(mlr|mass loss rate)$/,
};

/** Units taken where a header names none; a role that is not here is then not proposed. */
const ASSUMED: Partial<Readonly<Record<Role, string>>> = { time: 's', rate: 'kW' };

interface Proposal extends Pick<CalorimeterChoices, 'columns' | 'units'> {
  readonly notes: readonly string[];
}

/** Columns by what their headers call them. A column without readings, or with a unit its role cannot have, is passed over. */
export function proposeColumns(columns: readonly CalorimeterColumn[]): Proposal {
  const mapped: Partial<Record<Role, number>> = {};
  const units: Partial<Record<Role, string>> = {};
  const notes: string[] = [];
  for (const role of ROLES) {
    const fitting = columns.filter((column) => fits(column, role));
    const best = fitting.find(({ unit }) => unit !== null) ?? fitting[0];
    if (best === undefined) {
      // Gases and masses matter where the rate itself is missing; beside a rate they would only be noise.
      if (mapped.rate === undefined)
        notes.push(...columns.filter((column) => isNamed(column, role)).map((column) => passedOver(column, role)));
      continue;
    }
    mapped[role] = best.index;
    units[role] = unitOf(best, role);
    if (best.unit === null && role === 'rate')
      notes.push(`“${best.name}” names no unit: kW is assumed. Check it before you go on.`);
    if (best.unit === null && role === 'time' && units.time === 's')
      notes.push(`“${best.name}” names no unit: seconds are assumed.`);
    if (fitting.length > 1)
      notes.push(
        `${fitting.length} columns are called ${ROLE_WORDS[role]}: “${best.name}” (column ${best.index + 1}) is proposed.`,
      );
  }
  return { columns: mapped, units, notes };
}

function isNamed({ name }: CalorimeterColumn, role: Role): boolean {
  const plain = name.toLowerCase().replaceAll(/[_.\s]+/g, ' ');
  return NAMES[role].test(plain.trim());
}

/** Why a column that bears the name is not proposed. */
function passedOver({ name, unitText, empty, index }: CalorimeterColumn, role: Role): string {
  const which = `“${name}” (column ${index + 1}) is not proposed as ${ROLE_WORDS[role]}`;
  if (empty) return `${which}: it has no readings.`;
  const units = Object.keys(COLUMN_UNITS[role]).join(', ');
  return unitText === ''
    ? `${which}: it names no unit. Choose it with one of ${units}.`
    : `${which}: “${unitText}” is none of ${units}.`;
}

function fits(column: CalorimeterColumn, role: Role): boolean {
  if (column.empty || !isNamed(column, role)) return false;
  if (column.unit === null) return column.unitText === '' && ASSUMED[role] !== undefined;
  return column.unit in COLUMN_UNITS[role];
}

function unitOf(column: CalorimeterColumn, role: Role): string {
  if (column.unit !== null) return column.unit;
  if (role === 'time' && column.samples.some((cell) => cell.includes(':'))) return 'clock';
  return ASSUMED[role] ?? '';
}
