export interface StoredGoods {
  readonly key: string;
  readonly name: string;
  /** Height of the test, m; null for a liquid, which has none. */
  readonly height: number | null;
  /** Highest heat release rate per floor area at that height, MW/m². */
  readonly peak: number;
}

/**
 * Stored goods, after NFPA 92B and Alpert & Ward; all from memory. The liquids of the same table stand here for comparison only: pool
 * fires are computed from burning rates.
 */
export const STORED_GOODS: readonly StoredGoods[] = [
  { key: 'mail-bags', name: 'Mail bags', height: 1.5, peak: 0.4 },
  { key: 'cartons', name: 'Cartons, compartmented', height: 4.6, peak: 1.7 },
  { key: 'pe-letter-trays', name: 'Polyethylene letter trays', height: 1.5, peak: 8.5 },
  { key: 'pe-barrels', name: 'Polyethylene barrels in cartons', height: 4.6, peak: 2.8 },
  { key: 'grp-shower-stalls', name: 'Glass-fibre shower stalls in cartons', height: 4.6, peak: 1.4 },
  { key: 'pe-bottles', name: 'Polyethylene bottles in cartons', height: 4.6, peak: 6.2 },
  { key: 'ps-board', name: 'Polystyrene insulation board', height: 4.3, peak: 3.3 },
  { key: 'ps-jars', name: 'Polystyrene jars in cartons', height: 4.6, peak: 14.2 },
  { key: 'ps-tubs', name: 'Polystyrene tubs nested in cartons', height: 4.3, peak: 5.4 },
  { key: 'ps-toy-parts', name: 'Polystyrene toy parts in cartons', height: 4.6, peak: 2.0 },
  { key: 'pvc-bottles', name: 'PVC bottles in cartons', height: 4.6, peak: 3.4 },
  { key: 'pp-tubs', name: 'Polypropylene tubs in cartons', height: 4.6, peak: 4.4 },
  { key: 'film-rolls', name: 'Polypropylene and polyethylene film in rolls', height: 4.3, peak: 6.2 },
  { key: 'pu-board', name: 'Polyurethane insulation board', height: 4.6, peak: 1.9 },
  { key: 'methanol', name: 'Methanol', height: null, peak: 0.74 },
  { key: 'gasoline', name: 'Petrol', height: null, peak: 3.3 },
  { key: 'kerosene', name: 'Kerosene', height: null, peak: 3.3 },
  { key: 'diesel', name: 'Diesel', height: null, peak: 2.0 },
];
