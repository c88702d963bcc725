import type { CatalogueHit } from '@embertally/shared/catalogue/search-catalogue';
import type { ComboboxItem } from '../../components/combobox.tsx';

/** A row of the catalogue in a list to choose from: the same words on the plan and in the tables. */
export function catalogueItem({ type, row }: CatalogueHit): ComboboxItem {
  return { id: `${type} ${row.key}`, label: row.label, detail: `${type} · ${row.group}` };
}
