import { constantPressure } from '../../methods/calorimetry/constant-pressure.ts';
import { gasMoles } from '../../methods/chemistry/gas-moles.ts';
import { grossDry } from '../../methods/heat/gross-dry.ts';
import { combustionProducts } from '../../chemistry/combustion-products.ts';
import { elementsComposition, formulaComposition, sharesOf, type Composition } from '../composition.ts';
import { evidenceRange } from '../evidence-range.ts';
import type { DraftOf } from '../material-draft.ts';
import type { WayHeat } from '../way-heat.ts';
import { wetShare } from '../wet-share.ts';
import type { Workbook } from '../workbook.ts';
import { bombMean } from './bomb-mean.ts';
import { bombNet } from './bomb-net.ts';

const ROOM_TEMPERATURE_K = 298.15;

/**
 * From runs in an oxygen bomb: gross at constant volume as burnt → dry → constant pressure → net. The formula comes before
 * the elements where both are stated.
 */
export function heatFromBomb(book: Workbook, draft: DraftOf<'bomb'>): WayHeat {
  const composition = compositionOf(draft);
  const { gross_MJ_kg, spread, runs } = bombMean(book, draft);
  const burnt = wetShare(book, draft.analysed, '/analysed');
  const dry =
    burnt === 0
      ? gross_MJ_kg
      : book.run(grossDry, { H_ar: gross_MJ_kg, w: burnt }, { at: '/analysed/pct' }, { origins: { w: 'measured' } });
  const rests_on = `${runs} bomb runs`;
  const suspects = 'the masses of the runs, the water equivalent and the formula';
  const water = draft.received === undefined ? burnt : wetShare(book, draft.received, '/received');
  const stated = draft.received !== undefined || draft.analysed !== undefined;
  const common = {
    state: 'dry',
    measured: 'gross',
    water: stated ? water : null,
    rests_on,
    suspects,
    pointer: '/runs',
  } as const;
  if (!(dry > 0)) {
    book.warn('NO_HEAT', 'The runs gave no heat beyond fuse and aid; the material counts with 0 MJ/kg.');
    const none = { net_MJ_kg: 0, gross_MJ_kg: 0, low_MJ_kg: 0, high_MJ_kg: 0.2 };
    return { ...common, ...none, range_basis: 'up to 0.2 MJ/kg, the range runs may have', composition: null };
  }
  const gross = atConstantPressure(book, dry, composition);
  const net = bombNet(book, draft, gross, burnt, composition);
  return {
    ...common,
    net_MJ_kg: net,
    gross_MJ_kg: gross,
    ...evidenceRange(net, 'laboratory', spread),
    composition,
  };
}

function compositionOf(draft: DraftOf<'bomb'>): Composition | null {
  if (draft.formula !== undefined && draft.formula.trim() !== '') return formulaComposition(draft.formula);
  return draft.elements === undefined ? null : elementsComposition(sharesOf(draft.elements));
}

/** A bomb keeps its volume, a fire its pressure; without a composition the small difference stays, and that is said. */
function atConstantPressure(book: Workbook, gross: number, composition: Composition | null): number {
  if (composition === null || !combustionProducts(composition.atoms).ok) {
    book.warn(
      'CONSTANT_VOLUME',
      'The heat is left at constant volume, because neither a formula nor an analysis is known. For solids and liquids that is less than 0.3 % low.',
    );
    return gross;
  }
  const { atoms, mass_g, pointer, by } = composition;
  const place = { at: pointer };
  const dn = book.run(gasMoles, { ...atoms, phase: 'solid' }, place, {
    origins: { phase: { origin: 'default', note: 'a liquid gives the same' } },
    steps: by === 'elements' ? [{ text: 'Per 100 g of dry material' }] : [],
  });
  const enthalpy = book.run(constantPressure, { dU: -gross * mass_g, dn, T: ROOM_TEMPERATURE_K }, place, {
    origins: { T: 'default' },
    steps: [{ text: by === 'elements' ? 'Per 100 g of dry material' : 'Per mole', value: mass_g, unit: 'g' }],
  });
  return -enthalpy / mass_g;
}
