import type { CatalogueSource } from './catalogue-row.ts';

const WITHOUT_CLASS = 'net heat as received; EN 1991-1-2:2002 Table E.3 has no row';

/** The sources that many rows share; each title is written once here, so that the same source always reads the same. */
export const source = {
  /** A net heat that handbooks agree on within the row's range, without one page to point at. */
  handbook(classValue_MJ_kg: number | null = null): CatalogueSource {
    return {
      title: 'Usual handbook range for the material as found; no single source',
      locator:
        classValue_MJ_kg === null
          ? WITHOUT_CLASS
          : `net heat as received; EN 1991-1-2:2002 Table E.3 gives the class value ${classValue_MJ_kg} MJ/kg`,
      fromMemory: true,
    };
  },

  /** Per mole from the enthalpy of formation at 298.15 K; products CO2, H2O as vapour, N2, SO2, HX. */
  formation(enthalpy_kJ_mol: number, phase: 'gas' | 'liquid' | 'solid'): CatalogueSource {
    return {
      title:
        'Computed from the enthalpy of formation, CRC Handbook of Chemistry and Physics (data set chemicals 1.5.2)',
      locator: `${phase} at 298.15 K, ${enthalpy_kJ_mol} kJ/mol`,
      fromMemory: false,
    };
  },

  /** The usual value, checked against the net heat of the repeat unit: gross by oxygen consumption, ± 4.4 %. */
  polymer(unit: string): CatalogueSource {
    return {
      title:
        'Handbook value held against Walters, Hackbarth and Lyon, Heats of combustion of high temperature polymers',
      locator: `p. 10, repeat unit ${unit}; net from gross with 2.442 MJ per kg of water formed`,
      fromMemory: false,
    };
  },

  /** The named source was not read again when the row was written. */
  memory(title: string, locator: string): CatalogueSource {
    return { title, locator, fromMemory: true };
  },

  /** Masses and sizes as surveyors meet them; nobody's table. */
  practice(locator: string): CatalogueSource {
    return { title: 'Common survey practice, no single source', locator, fromMemory: true };
  },

  read(title: string, locator: string): CatalogueSource {
    return { title, locator, fromMemory: false };
  },
};
