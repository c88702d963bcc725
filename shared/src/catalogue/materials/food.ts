import { materialRows } from '../material-row.ts';
import { source } from '../source.ts';

const plant = source.handbook(20);
const food = source.handbook();

/** Food, fodder and plant goods. Sugar comes pure and dry; the others with their usual moisture. */
export const FOOD = [
  ...materialRows({ group: 'food', cellulosic: true, radiative: 0.35 }, [
    {
      key: 'straw',
      label: 'Straw, hay',
      synonyms: ['bales', 'fodder'],
      heat_MJ_kg: [15, 13.5, 17.5],
      ignition: 'easy',
      density_kg_m3: [130, 80, 200],
      moisture_pct_dry: 12,
      hazards: ['smouldering'],
      source: source.read('Phyllis2 database of biomass', 'record 1303: straw 16.98 MJ/kg gross as received'),
    },
    {
      key: 'grain',
      label: 'Grain',
      synonyms: ['wheat', 'maize', 'rice', 'cereal'],
      heat_MJ_kg: [15.3, 14, 17.5],
      ignition: 'hard',
      density_kg_m3: [760, 720, 800],
      moisture_pct_dry: 13,
      hazards: ['dust', 'smouldering'],
      source: food,
    },
    {
      key: 'flour',
      label: 'Flour, starch',
      synonyms: ['meal', 'cornflour'],
      heat_MJ_kg: [15.8, 14.5, 17],
      ignition: 'hard',
      density_kg_m3: [550, 500, 650],
      moisture_pct_dry: 13,
      hazards: ['dust'],
      source: food,
    },
    {
      key: 'tobacco-tea-coffee',
      label: 'Tobacco, tea, coffee',
      synonyms: ['tobacco', 'tea', 'coffee', 'dried herbs', 'spices'],
      heat_MJ_kg: [16.5, 15, 19],
      ignition: 'hard',
      density_kg_m3: [300, 150, 400],
      moisture_pct_dry: 10,
      hazards: ['smouldering'],
      source: plant,
    },
  ]),
  ...materialRows({ group: 'food', cellulosic: false, radiative: 0.35 }, [
    {
      key: 'sugar',
      label: 'Sugar',
      synonyms: ['sucrose'],
      heat_MJ_kg: [15.1, 15, 16.5],
      gross_MJ_kg: 16.48,
      formula: 'C12H22O11',
      ignition: 'hard',
      density_kg_m3: [850, 800, 950],
      moisture_pct_dry: 0,
      hazards: ['dust'],
      source: source.formation(-2226.1, 'solid'),
    },
    {
      key: 'glucose',
      label: 'Glucose',
      synonyms: ['dextrose'],
      heat_MJ_kg: [14.1, 14, 14.3],
      gross_MJ_kg: 15.56,
      formula: 'C6H12O6',
      ignition: 'hard',
      moisture_pct_dry: 0,
      hazards: ['dust'],
      source: source.memory(
        'CRC Handbook of Chemistry and Physics',
        'enthalpy of formation of alpha-D-glucose, solid, -1273.3 kJ/mol',
      ),
    },
    {
      key: 'cooking-oil',
      label: 'Cooking oil, fat',
      synonyms: ['frying oil', 'vegetable oil', 'lard', 'butter'],
      heat_MJ_kg: [37, 36, 39.5],
      ignition: 'hard',
      density_kg_m3: [918, 910, 925],
      hazards: ['liquid'],
      source: food,
    },
    {
      key: 'nuts-and-chocolate',
      label: 'Nuts, chocolate, snacks',
      synonyms: ['crisps', 'confectionery'],
      heat_MJ_kg: [22, 18, 27],
      ignition: 'hard',
      density_kg_m3: [500, 300, 650],
      source: food,
    },
  ]),
];
