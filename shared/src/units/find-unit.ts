import { UNIT_TABLE, type Unit } from './unit-table.ts';

/** One spelling for what may be written in several: superscripts, middle dots, doubled blanks, capitals. */
function spelling(text: string): string {
  return text
    .trim()
    .replaceAll('²', '2')
    .replaceAll('³', '3')
    .replaceAll('·', ' ')
    .replaceAll(/\s+/g, ' ')
    .toLowerCase();
}

const exact = new Map(UNIT_TABLE.map((unit) => [unit.key, unit]));
const loose = new Map<string, Unit>();
for (const unit of UNIT_TABLE) {
  for (const name of [unit.key, unit.symbol, ...unit.aliases]) {
    if (!loose.has(spelling(name))) loose.set(spelling(name), unit);
  }
}

/** The unit written so, by key, symbol or a word for it; undefined when there is none. */
export function findUnit(text: string): Unit | undefined {
  return exact.get(text) ?? loose.get(spelling(text));
}
