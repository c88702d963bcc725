import { calorimeterMappingSchema, type CalorimeterMapping } from '@embertally/shared/calorimeter/calorimeter-choices';

const KEY = 'embertally.calorimeter-mapping';

/** The columns of the last file that was kept, for the next one of the same instrument. In this browser only. */
export const mappingStore = {
  read(): CalorimeterMapping | null {
    try {
      const stored = calorimeterMappingSchema.safeParse(JSON.parse(window.localStorage.getItem(KEY) ?? 'null'));
      return stored.success ? stored.data : null;
    } catch {
      // Forbidden or damaged storage: the file's own headers propose the columns.
      return null;
    }
  },
  keep(mapping: CalorimeterMapping): void {
    try {
      window.localStorage.setItem(KEY, JSON.stringify(mapping));
    } catch {
      // Forbidden or full: the next file is proposed from its headers.
    }
  },
};
