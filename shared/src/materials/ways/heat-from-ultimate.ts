import { boie } from '../../methods/chemistry/boie.ts';
import { channiwalaParikh } from '../../methods/chemistry/channiwala-parikh.ts';
import { oxygenDemand } from '../../methods/chemistry/oxygen-demand.ts';
import { netFromGross } from '../../methods/heat/net-from-gross.ts';
import { rangeFaults } from '../../methods/range-faults.ts';
import { elementsComposition, sharesOf, waterHydrogen } from '../composition.ts';
import { evidenceRange } from '../evidence-range.ts';
import type { DraftOf } from '../material-draft.ts';
import type { WayHeat } from '../way-heat.ts';
import { wetShare } from '../wet-share.ts';
import type { Workbook } from '../workbook.ts';
import { dryShares } from './dry-shares.ts';

const MEASURED = {
  w_C: 'measured',
  w_H: 'measured',
  w_O: 'measured',
  w_N: 'measured',
  w_S: 'measured',
  w_ash: 'measured',
} as const;

/** From an ultimate analysis by a published correlation: gross, then net, dry. */
export function heatFromUltimate(book: Workbook, draft: DraftOf<'ultimate'>): WayHeat {
  const water = wetShare(book, draft.moisture, '/moisture');
  const { ash_pct = 0 } = draft.elements;
  const ashFree = draft.of === 'dry-ash-free';
  const stated = sharesOf(
    ashFree ? { ...draft.elements, ash_pct: 0 } : draft.elements,
    '/elements',
    draft.of === 'as-received' ? 100 * water : 0,
  );
  const shares = dryShares(ashFree ? { ...stated, w_ash: ash_pct / 100 } : stated, draft.of, water);
  const composition = elementsComposition(shares);
  const { w_C, w_H, w_O, w_N, w_S, w_ash, w_Cl } = shares;
  const fractions = { w_C, w_H, w_O, w_N, w_S };
  const place = { at: '/elements' };
  book.run(oxygenDemand, fractions, place, { origins: MEASURED });
  const outside = draft.correlation === 'boie' ? [] : rangeFaults(channiwalaParikh, { ...fractions, w_ash });
  const gross =
    draft.correlation === 'boie'
      ? book.run(boie, fractions, place, { origins: MEASURED })
      : book.run(channiwalaParikh, { ...fractions, w_ash }, place, { origins: MEASURED });
  if (w_Cl > 0)
    book.warn(
      'CHLORINE',
      'The correlation knows no chlorine; what it binds of the hydrogen is taken off. A measured heat is better here.',
    );
  const net = book.run(
    netFromGross,
    { H_gross: gross, w_H: waterHydrogen(composition) },
    { at: '/elements/hydrogen_pct' },
    { origins: { w_H: 'measured' } },
  );
  const uncertain = outside.length > 0 || w_Cl > 0;
  return {
    state: 'dry',
    measured: 'gross',
    net_MJ_kg: net,
    gross_MJ_kg: gross,
    ...evidenceRange(net, uncertain ? 'class' : 'laboratory'),
    water: draft.moisture === undefined ? null : water,
    composition,
    rests_on: `an ultimate analysis by the correlation of ${draft.correlation === 'boie' ? 'Boie' : 'Channiwala and Parikh'}`,
    pointer: '/elements',
    suspects: 'the shares, and what they are shares of',
  };
}
