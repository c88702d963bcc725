import { materialRows } from '../material-row.ts';
import { source } from '../source.ts';

const ranges = source.read(
  'IPCC default net calorific values and biomass fuel tables',
  'solid fuels, net, as received',
);

/** Coal, coke, charcoal and peat. */
export const CARBON = materialRows({ group: 'carbon', cellulosic: false, radiative: 0.35, hazards: ['smouldering'] }, [
  {
    key: 'charcoal',
    label: 'Charcoal',
    synonyms: ['barbecue coal'],
    heat_MJ_kg: [29.5, 27, 33],
    ignition: 'hard',
    density_kg_m3: [250, 150, 400],
    moisture_pct_dry: 4,
    source: source.handbook(30),
  },
  {
    key: 'hard-coal',
    label: 'Hard coal',
    synonyms: ['coal', 'bituminous coal'],
    heat_MJ_kg: [28, 24, 33],
    ignition: 'hard',
    density_kg_m3: [850, 800, 900],
    moisture_pct_dry: 5,
    source: ranges,
  },
  {
    key: 'anthracite',
    label: 'Anthracite',
    heat_MJ_kg: [31.5, 29, 34],
    ignition: 'resistant',
    density_kg_m3: [850, 800, 900],
    moisture_pct_dry: 3,
    source: ranges,
  },
  {
    key: 'coke',
    label: 'Coke',
    heat_MJ_kg: [28.5, 23, 32],
    ignition: 'resistant',
    density_kg_m3: [480, 400, 550],
    moisture_pct_dry: 3,
    source: ranges,
  },
  {
    key: 'lignite',
    label: 'Lignite briquettes',
    synonyms: ['brown coal', 'briquettes'],
    heat_MJ_kg: [19, 8, 22],
    ignition: 'hard',
    density_kg_m3: [700, 650, 750],
    moisture_pct_dry: 15,
    source: ranges,
  },
  {
    key: 'peat',
    label: 'Peat, air dry',
    synonyms: ['turf'],
    heat_MJ_kg: [16, 12, 20],
    ignition: 'normal',
    density_kg_m3: [300, 200, 400],
    moisture_pct_dry: 30,
    source: source.handbook(),
  },
  {
    key: 'graphite',
    label: 'Carbon, graphite',
    synonyms: ['carbon black', 'toner'],
    heat_MJ_kg: [32.8, 32.7, 32.8],
    gross_MJ_kg: 32.76,
    formula: 'C',
    ignition: 'resistant',
    density_kg_m3: [450, 300, 900],
    hazards: ['dust', 'smouldering'],
    source: source.formation(0, 'solid'),
  },
]);
