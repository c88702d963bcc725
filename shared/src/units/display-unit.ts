import { findUnit } from './find-unit.ts';
import type { UnitSystem } from './unit-system.ts';
import type { Unit } from './unit-table.ts';

/** SI unit of a value inside → what a person who reads US customary sees. A unit not listed is the same in both. */
const US_CUSTOMARY: Readonly<Record<string, string>> = {
  m: 'ft',
  mm: 'in',
  m2: 'ft2',
  m3: 'ft3',
  L: 'gal',
  kg: 'lb',
  '°C': '°F',
  K: '°F difference',
  MJ: 'million Btu',
  kW: 'Btu/s',
  'kW/s2': 'Btu/s3',
  'MJ/m2': 'Btu/ft2',
  'MJ/kg': 'Btu/lb',
  'MJ/m': 'Btu/ft',
  'MJ/m3': 'Btu/ft3',
  'kW/m2': 'Btu/s ft2',
  'kW/m2K': 'Btu/s ft2 °F',
  'kg/m3': 'lb/ft3',
  'kg/m2': 'lb/ft2',
  'kg/m': 'lb/ft',
  'm^½': 'ft^½',
  'm^5/2': 'ft^5/2',
  '(m s)1/2': '(ft s)1/2',
  'W/mK': 'Btu/h ft °F',
  'J/kgK': 'Btu/lb °F',
};

/** The unit in which a person reads values that are kept in `unit`; undefined when the table does not have `unit`. */
export function displayUnit(unit: string, system: UnitSystem): Unit | undefined {
  const kept = findUnit(unit);
  if (kept === undefined || system === 'SI') return kept;
  const shown = US_CUSTOMARY[kept.key];
  return shown === undefined ? kept : findUnit(shown);
}
