import type { CatalogueSource, GrowthClass, LoadDistribution, Use } from './catalogue-row.ts';
import { source } from './source.ts';

const eurocode = source.memory('EN 1991-1-2:2002', 'Annex E, Tables E.1, E.4 and E.5');
const practice = source.memory(
  'Common practice, no single source',
  'growth class by what is usually kept there; no distribution of loads is claimed',
);
const shopSurvey = source.read(
  'Zalok et al. (2009), survey of fire loads in Canadian shops',
  'abstract: mean 747, standard deviation 833 MJ/m², lognormal',
);

/** Table E.4 prints a mean and an 80 % fractile; every pair is reproduced by a Gumbel distribution with V = 0.30. */
function gumbel(mean_MJ_m2: number): LoadDistribution {
  return { kind: 'gumbel', mean_MJ_m2, cov: 0.3, source: eurocode };
}

function use(
  key: string,
  label: string,
  synonyms: readonly string[],
  growth: GrowthClass,
  rhr_kW_m2: number | null,
  distribution: LoadDistribution | null,
  danger_of_activation: number | null,
  from: CatalogueSource = eurocode,
): Use {
  return { key, label, synonyms, growth, rhr_kW_m2, distribution, danger_of_activation, source: from };
}

/**
 * What a room is used for. Uses that no table has a heat release for (stores, workshops, plant) leave `rhr_kW_m2` null: it
 * is taken from the entries, or asked.
 */
export const USES: readonly Use[] = [
  use('dwelling', 'Dwelling', ['flat', 'living room', 'bedroom'], 'medium', 250, gumbel(780), 1),
  use('hospital', 'Hospital room', ['ward', 'care room'], 'medium', 250, gumbel(230), 1),
  use('hotel', 'Hotel room', ['guest room'], 'medium', 250, gumbel(310), 1),
  use('library', 'Library', ['reading room'], 'fast', 500, gumbel(1500), 1),
  use('office', 'Office', ['meeting room', 'study'], 'medium', 250, gumbel(420), 1),
  use('school', 'Classroom', ['school', 'seminar room'], 'medium', 250, gumbel(285), 1),
  use('shopping-centre', 'Shopping centre', ['mall', 'sales floor'], 'fast', 250, gumbel(600), 1),
  use('theatre', 'Theatre, cinema', ['auditorium', 'stage', 'rehearsal room'], 'fast', 500, gumbel(300), 1),
  use('transport', 'Transport, public space', ['concourse', 'waiting hall', 'station'], 'slow', 250, gumbel(100), 1),
  use(
    'shop',
    'Shop',
    ['retail', 'store front', 'boutique'],
    'fast',
    250,
    { kind: 'lognormal', mean_MJ_m2: 747, cov: 833 / 747, source: shopSurvey },
    1,
    shopSurvey,
  ),
  use('gallery', 'Gallery, museum', ['museum', 'exhibition'], 'medium', null, null, 0.78),
  use('storage', 'Storage', ['store', 'warehouse', 'depot', 'dock'], 'fast', null, null, null, practice),
  use(
    'costume-store',
    'Costume and textile store',
    ['wardrobe', 'clothes store'],
    'ultra-fast',
    null,
    null,
    null,
    practice,
  ),
  use('archive', 'Archive', ['records store', 'file room'], 'slow', null, null, null, practice),
  use('workshop', 'Workshop', ['joinery', 'carpentry', 'maintenance'], 'fast', null, null, 1.22, practice),
  use('machine-works', 'Manufacture of machinery', ['factory', 'engine works'], 'medium', null, null, 1.22),
  use('paint-shop', 'Painting workshop', ['paint store', 'spray booth'], 'ultra-fast', null, null, 1.44),
  use('laboratory', 'Chemical laboratory', ['lab'], 'fast', null, null, 1.44),
  use('paint-works', 'Manufacture of paints or fireworks', ['pyrotechnics'], 'ultra-fast', null, null, 1.66),
  use('plant', 'Plant room', ['boiler room', 'machine room', 'switch room'], 'medium', null, null, null, practice),
  use('server-room', 'Server room', ['data centre', 'telecom room'], 'medium', null, null, null, practice),
  use('electrics-store', 'Electrical store', ['battery charging', 'lamp store'], 'fast', null, null, null, practice),
  use('loading-bay', 'Loading bay', ['goods in', 'dispatch'], 'fast', null, null, null, practice),
  use('corridor', 'Corridor, stair', ['lobby', 'passage', 'escape route'], 'medium', null, null, null, practice),
  use('kitchen', 'Kitchen', ['canteen kitchen', 'tea point'], 'fast', null, null, null, practice),
  use('lounge', 'Lounge, green room', ['break room', 'dressing room'], 'fast', null, null, null, practice),
  use('cleaner', 'Cleaner’s closet', ['cupboard', 'utility room'], 'medium', null, null, null, practice),
  use('washroom', 'Washroom', ['toilet', 'shower', 'changing room'], 'slow', null, null, null, practice),
  use('car-park', 'Car park', ['garage', 'vehicle store'], 'fast', null, null, null, practice),
  use('agriculture', 'Barn, agricultural store', ['farm', 'hay store'], 'fast', null, null, null, practice),
];

const byKey = new Map(USES.map((row) => [row.key, row]));

/** The use with this key; undefined for a person's own word for a use. */
export function useByKey(key: string): Use | undefined {
  return byKey.get(key);
}
