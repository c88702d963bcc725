import { materialRows } from '../material-row.ts';
import { source } from '../source.ts';

const handbook = source.handbook();

/** Rubber and elastomers, solid. */
export const RUBBER = materialRows({ group: 'rubber', cellulosic: false, radiative: 0.45 }, [
  {
    key: 'rubber',
    label: 'Natural rubber, SBR',
    synonyms: ['gum rubber', 'latex'],
    heat_MJ_kg: [41.5, 40, 44.5],
    ignition: 'hard',
    density_kg_m3: [500, 400, 940],
    source: handbook,
  },
  {
    key: 'tyre-rubber',
    label: 'Tyres',
    synonyms: ['tires', 'rubber tyre', 'castors'],
    heat_MJ_kg: [31, 27, 35],
    ignition: 'hard',
    density_kg_m3: [130, 100, 400],
    source: source.handbook(30),
  },
  {
    key: 'neoprene',
    label: 'Neoprene',
    synonyms: ['polychloroprene', 'wetsuit'],
    heat_MJ_kg: [24, 20, 27],
    ignition: 'hard',
    density_kg_m3: [600, 200, 1500],
    source: handbook,
  },
  {
    key: 'epdm',
    label: 'EPDM compound',
    synonyms: ['seals', 'roof membrane'],
    heat_MJ_kg: [28, 18, 38],
    ignition: 'hard',
    density_kg_m3: [1250, 1100, 1400],
    source: handbook,
  },
  {
    key: 'silicone-rubber',
    label: 'Silicone rubber',
    synonyms: ['silicone'],
    heat_MJ_kg: [15, 10, 19],
    ignition: 'resistant',
    radiative: 0.31,
    soot: 0.065,
    co: 0.021,
    density_kg_m3: [1200, 1100, 1300],
    source: handbook,
  },
  {
    key: 'linoleum',
    label: 'Linoleum',
    synonyms: ['lino', 'floor covering'],
    heat_MJ_kg: [19.5, 17, 21],
    ignition: 'hard',
    radiative: 0.35,
    density_kg_m3: [1200, 1150, 1250],
    source: source.handbook(20),
  },
]);
