import type { CatalogueSource, Lining } from './catalogue-row.ts';
import { source } from './source.ts';

const tables = source.memory(
  'SFPE Handbook of Fire Protection Engineering; Karlsson and Quintiere, Enclosure Fire Dynamics',
  'thermal properties of lining materials at ambient temperature; thickness as usually built',
);
const eurocode = source.memory(
  'EN 1992-1-2:2004 and the worked values of EN 1991-1-2:2002 Annex A',
  'normal-weight concrete, 1.6 W/mK, 2300 kg/m³, 1000 J/kgK',
);

type Layer = readonly [
  label: string,
  thickness_m: number,
  conductivity_W_mK: number,
  density_kg_m3: number,
  heat_J_kgK: number,
];

function lining(
  key: string,
  label: string,
  synonyms: readonly string[],
  layers: readonly Layer[],
  from: CatalogueSource = tables,
): Lining {
  return {
    key,
    label,
    synonyms,
    layers: layers.map(([name, thickness, conductivity, density, heat]) => ({
      thickness_m: thickness,
      conductivity_W_mK: conductivity,
      density_kg_m3: density,
      specific_heat_J_kgK: heat,
      label: name,
    })),
    source: from,
  };
}

/** Layers of more than one lining; thickness in metres first. */
const CONCRETE = (thickness_m: number): Layer => ['Concrete', thickness_m, 1.6, 2300, 1000];
const GYPSUM_BOARD = (thickness_m: number): Layer => ['Gypsum board', thickness_m, 0.17, 960, 1100];
const MINERAL_WOOL = (thickness_m: number): Layer => ['Mineral wool', thickness_m, 0.04, 60, 840];
const BRICK = (thickness_m: number): Layer => ['Brick', thickness_m, 0.8, 2600, 800];
const PLASTER = (thickness_m: number): Layer => ['Gypsum plaster', thickness_m, 0.48, 1440, 840];
const TIMBER = (thickness_m: number): Layer => ['Timber', thickness_m, 0.12, 450, 2500];
const STEEL = (thickness_m: number): Layer => ['Steel sheet', thickness_m, 45.8, 7850, 465];

/**
 * What walls, ceilings and floors are made of. Layers are listed exposed side first. The heat of a lining that burns is
 * not in the row: record it as a fixed entry.
 */
export const LININGS: readonly Lining[] = [
  lining('concrete', 'Concrete, 200 mm', ['reinforced concrete', 'slab'], [CONCRETE(0.2)], eurocode),
  lining('concrete-100', 'Concrete, 100 mm', ['screed', 'thin slab'], [CONCRETE(0.1)], eurocode),
  lining(
    'lightweight-concrete',
    'Lightweight concrete, 200 mm',
    ['lightweight blocks'],
    [['Lightweight concrete', 0.2, 0.8, 1600, 840]],
  ),
  lining(
    'aerated-concrete',
    'Aerated concrete, 200 mm',
    ['aerated blocks', 'AAC'],
    [['Aerated concrete', 0.2, 0.26, 500, 960]],
  ),
  lining('brick', 'Brick, 110 mm', ['masonry', 'brickwork'], [BRICK(0.11)]),
  lining('brick-215', 'Brick, 215 mm', ['solid brick wall'], [BRICK(0.215)]),
  lining('plastered-brick', 'Plaster on brick', ['plaster', 'rendered masonry'], [PLASTER(0.016), BRICK(0.11)]),
  lining('plastered-concrete', 'Plaster on concrete', ['plastered slab'], [PLASTER(0.016), CONCRETE(0.2)]),
  lining('stone', 'Natural stone, 300 mm', ['sandstone', 'limestone', 'rubble wall'], [['Stone', 0.3, 1.7, 2200, 900]]),
  lining(
    'gypsum-board',
    'Gypsum board, 12.5 mm, on mineral wool',
    ['plasterboard', 'drywall', 'stud partition'],
    [GYPSUM_BOARD(0.0125), MINERAL_WOOL(0.05)],
  ),
  lining(
    'gypsum-board-double',
    'Gypsum board, 2 × 12.5 mm, on mineral wool',
    ['double plasterboard'],
    [GYPSUM_BOARD(0.025), MINERAL_WOOL(0.05)],
  ),
  lining('gypsum-board-on-brick', 'Gypsum board on brick', ['dry lining'], [GYPSUM_BOARD(0.0125), BRICK(0.11)]),
  lining(
    'calcium-silicate',
    'Calcium silicate board, 20 mm',
    ['fire board'],
    [['Calcium silicate board', 0.02, 0.135, 700, 1120]],
  ),
  lining(
    'mineral-wool',
    'Mineral wool, 100 mm, bare',
    ['rock wool', 'glass wool', 'acoustic lining'],
    [MINERAL_WOOL(0.1)],
  ),
  lining(
    'acoustic-tiles',
    'Mineral fibre ceiling tiles, 19 mm',
    ['suspended ceiling'],
    [['Mineral fibre tile', 0.019, 0.06, 240, 1000]],
  ),
  lining('plywood', 'Plywood, 12 mm', ['wood panelling'], [['Plywood', 0.012, 0.12, 540, 2500]]),
  lining('timber-boards', 'Timber boards, 22 mm', ['floorboards', 'matchboard'], [TIMBER(0.022)]),
  lining('timber-solid', 'Solid timber, 120 mm', ['cross-laminated timber', 'CLT', 'log wall'], [TIMBER(0.12)]),
  lining(
    'timber-on-concrete',
    'Timber boards on concrete',
    ['sprung floor', 'parquet'],
    [TIMBER(0.022), CONCRETE(0.2)],
  ),
  lining('particleboard', 'Particleboard, 18 mm', ['chipboard floor'], [['Particleboard', 0.018, 0.14, 660, 2000]]),
  lining('steel-sheet', 'Steel sheet, bare', ['corrugated steel', 'cladding'], [STEEL(0.001)]),
  lining(
    'steel-mineral-wool',
    'Steel sheet on mineral wool',
    ['sandwich panel, mineral wool', 'insulated cladding'],
    [STEEL(0.0006), MINERAL_WOOL(0.1)],
  ),
  lining(
    'steel-foam',
    'Steel sheet on plastic foam',
    ['sandwich panel, PIR', 'cold store panel'],
    [STEEL(0.0006), ['Rigid foam', 0.1, 0.025, 35, 1400]],
  ),
  lining('glass', 'Glass, 6 mm', ['glazing', 'curtain wall'], [['Glass', 0.006, 0.76, 2710, 800]]),
  lining(
    'ceramic-tiles',
    'Ceramic tiles on concrete',
    ['tiled floor'],
    [['Ceramic tile', 0.01, 1.3, 2300, 840], CONCRETE(0.2)],
  ),
  lining('earth', 'Bare earth', ['soil', 'gravel'], [['Earth', 0.5, 1.2, 1700, 1000]]),
];

const byKey = new Map(LININGS.map((row) => [row.key, row]));

/** The lining with this key; undefined for a key the catalogue does not have. */
export function liningByKey(key: string): Lining | undefined {
  return byKey.get(key);
}
