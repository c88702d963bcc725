import { materialByKey } from '@embertally/shared/catalogue/materials';
import { searchCatalogue, type CatalogueHit } from '@embertally/shared/catalogue/search-catalogue';
import { newEntryFromKind, newEntryFromMaterial } from '@embertally/shared/survey/new-entry';
import type { Entry } from '@embertally/shared/survey/survey-document';

/** Mass a heap of a bare material starts with, kg; the person says how much it is right after placing it. */
const FIRST_MASS_KG = 100;
const NOWHERE = { id: '', room_id: '', x_m: 0, y_m: 0, recorded_by: null, recorded_at: null };

/** The catalogue as placing needs it; its own chunk, because the plan can be drawn without it. */
export const catalogueTools = {
  search: (query: string) => searchCatalogue(query, { limit: 12 }),
  entryOf: (hit: CatalogueHit): Entry =>
    hit.type === 'kind'
      ? newEntryFromKind(hit.row, materialByKey, NOWHERE)
      : newEntryFromMaterial(hit.row, FIRST_MASS_KG, NOWHERE),
};
