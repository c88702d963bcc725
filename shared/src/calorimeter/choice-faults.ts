import type { CalorimeterChoices } from './calorimeter-choices.ts';
import type { CalorimeterFault } from './calorimeter-fault.ts';
import { COLUMN_UNITS, ROLE_WORDS, ROLES } from './column-units.ts';

const MOST_COLUMNS = 2000;

/** What is missing in the choices before a line is read: never another column in place of the one that is not there. */
export function choiceFaults(choices: CalorimeterChoices): CalorimeterFault[] {
  const { columns, units, from, specimen_m2, burnt_kg, humidity } = choices;
  const faults: CalorimeterFault[] = [];
  const add = (code: string, message: string) => faults.push({ line: null, code, message });
  if (columns.time === undefined)
    add('no_time', 'No column is chosen for time. Choose the one with seconds or minutes since ignition.');
  if (from === 'rate' && columns.rate === undefined)
    add(
      'no_rate',
      'The file has no column named as heat release rate, and none is taken in its place. Choose it if it goes by another name, or work it out from oxygen and the flow in the duct.',
    );
  if (from === 'gases') {
    const missing = (['oxygen', 'flow'] as const).filter((role) => columns[role] === undefined);
    if (missing.length > 0)
      add(
        'no_gases',
        `To work the rate out, ${missing.map((role) => ROLE_WORDS[role]).join(' and ')} must be in the file too. Choose the column, or read the rate itself.`,
      );
  }
  const used = new Map<number, string>();
  for (const role of ROLES) {
    const column = columns[role];
    if (column === undefined) continue;
    if (!(Number.isInteger(column) && column >= 0 && column < MOST_COLUMNS))
      add('no_column', `There is no column ${column + 1} for ${ROLE_WORDS[role]}.`);
    if (!Object.hasOwn(COLUMN_UNITS[role], units[role] ?? ''))
      add('no_unit', `Choose the unit of ${ROLE_WORDS[role]}: ${Object.keys(COLUMN_UNITS[role]).join(', ')}.`);
    const other = used.get(column);
    if (other !== undefined)
      add('column_twice', `Column ${column + 1} is chosen for ${other} and for ${ROLE_WORDS[role]}.`);
    used.set(column, ROLE_WORDS[role]);
  }
  if (specimen_m2 !== undefined && !(specimen_m2 > 0 && Number.isFinite(specimen_m2)))
    add('specimen', 'Enter the exposed area of the test piece in m², above 0.');
  if (burnt_kg !== undefined && !(burnt_kg > 0 && Number.isFinite(burnt_kg)))
    add('burnt', 'Enter the mass that burnt in kg, above 0.');
  if (humidity !== undefined && !(humidity >= 0 && humidity <= 0.1))
    add('humidity', 'Enter the water vapour of the air as parts of 1, from 0 to 0.1.');
  return faults;
}
