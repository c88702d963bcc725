import { materialByKey } from '@embertally/shared/catalogue/materials';
import type { PlaceableMaterial } from '@embertally/shared/catalogue/placeable-material';
import { searchCatalogue, type PlaceableHit } from '@embertally/shared/catalogue/search-catalogue';
import { newEntryFromKind, newEntryFromMaterial } from '@embertally/shared/survey/new-entry';
import type { Entry } from '@embertally/shared/survey/survey-document';

/** Mass a heap of a bare material starts with, kg; the person says how much it is right after placing it. */
const FIRST_MASS_KG = 100;
const NOWHERE = { id: '', room_id: '', x_m: 0, y_m: 0, recorded_by: null, recorded_at: null };

/** The catalogue as placing needs it; its own chunk, because the plan can be drawn without it. */
export const catalogueTools = {
  /** `own`: approved materials of the person's organisation, searched with the built-in ones. */
  search: (query: string, own: readonly PlaceableMaterial[]) => searchCatalogue(query, { limit: 12, own }),
  entryOf: (hit: PlaceableHit): Entry =>
    hit.type === 'kind'
      ? newEntryFromKind(hit.row, materialByKey, NOWHERE)
      : newEntryFromMaterial(hit.row, FIRST_MASS_KG, NOWHERE),
};
