import type { DraftOf, MaterialDraft } from '@embertally/shared/materials/material-draft';

export interface DemoMaterial {
  /** Ids are made of it. */
  readonly name: string;
  /** Site role of the person who writes it; the other one of the same organisation decides. */
  readonly by: 'manager' | 'viewer';
  readonly decided: boolean;
  readonly draft: MaterialDraft;
  /** A table kept as evidence. */
  readonly table?: { readonly name: string; readonly text: string };
}

const FLAT: DraftOf<'composition'> = {
  way: 'composition',
  label: 'Painted canvas flat',
  synonyms: ['scenery flat', 'stage flat'],
  source: 'Six flats of the scenery dock weighed apart, workshop book, sheet 14',
  note: 'Frame, cloth and dried paint of a flat as it hangs in the rack. Hinges and braces are left out.',
  group: 'products',
  cellulosic: true,
  ignition_class: 'normal',
  parts: [
    { material: 'softwood', version: null, mass_pct: 68 },
    { material: 'cotton', version: null, mass_pct: 17 },
    { material: 'pva', version: null, mass_pct: 9 },
  ],
  inert_pct: 6,
};

const FOAM_RUNS: DraftOf<'bomb'>['runs'] = [
  { mass_kg: 0.0009012, rise_K: 2.498, fuse_MJ: 0.00005 },
  { mass_kg: 0.0008875, rise_K: 2.456, fuse_MJ: 0.00005 },
  { mass_kg: 0.000912, rise_K: 2.534, fuse_MJ: 0.00005 },
];

const FOAM: DraftOf<'bomb'> = {
  way: 'bomb',
  label: 'Grey carving foam',
  synonyms: ['foam block', 'scenery foam'],
  source: 'Combustion laboratory of the town college, report 31, table 2',
  note: 'From the block that was open in the dock. The supplier names it only as flexible foam.',
  group: 'foams',
  density_kg_m3: 28,
  ignition_class: 'easy',
  hazards: ['foam'],
  calibration: {
    by: 'runs',
    runs: [
      { mass_kg: 0.0010021, rise_K: 2.6225, fuse_MJ: 0.00005 },
      { mass_kg: 0.0009987, rise_K: 2.6131, fuse_MJ: 0.00005 },
      { mass_kg: 0.0010008, rise_K: 2.6197, fuse_MJ: 0.00005 },
    ],
  },
  runs: FOAM_RUNS,
  hydrogen: { by: 'elements' },
  elements: { carbon_pct: 62.5, hydrogen_pct: 8.4, nitrogen_pct: 6.1, ash_pct: 0.8 },
};

const SERGE: DraftOf<'supplier'> = {
  way: 'supplier',
  label: 'Wool serge for drapes',
  synonyms: ['stage drape', 'serge'],
  source: 'Sheet of the weaver, edition of last spring, page 2',
  group: 'textiles',
  ignition_class: 'hard',
  heat_MJ: 21.4,
  per: 'kg',
  heat: 'net',
  state: 'as-received',
  range: { by: 'class', evidence: 'class' },
  counterpart: 'wool',
};

/** Invented materials of the Trust: two in use, one waiting for its second person. */
export const DEMO_MATERIALS: readonly DemoMaterial[] = [
  { name: 'flat', by: 'manager', decided: true, draft: FLAT },
  {
    name: 'foam',
    by: 'manager',
    decided: true,
    draft: FOAM,
    table: {
      name: 'Report 31, table 2.csv',
      text: `run,mass_g,rise_K\n${FOAM_RUNS.map(({ mass_kg, rise_K }, run) => `${run + 1},${(mass_kg * 1000).toFixed(4)},${rise_K.toFixed(3)}`).join('\n')}\n`,
    },
  },
  { name: 'serge', by: 'viewer', decided: false, draft: SERGE },
];
