import type { PlaceableHit } from '@embertally/shared/catalogue/search-catalogue';
import type { ComboboxItem } from '../../components/combobox.tsx';

/** A row of the catalogue in a list to choose from: the same words on the plan and in the tables. */
export function catalogueItem({ type, row }: PlaceableHit): ComboboxItem {
  const own = 'own' in row && row.own !== null && row.own !== undefined ? ` · own, version ${row.own.version}` : '';
  return { id: `${type} ${row.key}`, label: row.label, detail: `${type} · ${row.group}${own}` };
}
