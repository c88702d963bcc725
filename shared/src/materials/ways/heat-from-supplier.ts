import { fromVolume } from '../../methods/heat/from-volume.ts';
import { grossDry } from '../../methods/heat/gross-dry.ts';
import { netFromGross } from '../../methods/heat/net-from-gross.ts';
import { statedHeat } from '../../methods/heat/stated-heat.ts';
import { figure } from '../../methods/figure.ts';
import { elementsComposition, formulaComposition, sharesOf, waterHydrogen, type Composition } from '../composition.ts';
import { DraftRefused } from '../draft-refused.ts';
import { evidenceRange } from '../evidence-range.ts';
import type { DraftOf } from '../material-draft.ts';
import type { OwnMaterialLookup } from '../material-lookup.ts';
import type { WayHeat } from '../way-heat.ts';
import { wetShare } from '../wet-share.ts';
import type { Workbook } from '../workbook.ts';
import { expectationOf } from './expectation-of.ts';

const PER_LITRE = 1000;

/** From a supplier's sheet, brought to net per kilogram; dry or as received, as the sheet states it. */
export function heatFromSupplier(book: Workbook, draft: DraftOf<'supplier'>, lookup: OwnMaterialLookup): WayHeat {
  const composition = compositionOf(draft);
  const water = draft.moisture === undefined ? null : wetShare(book, draft.moisture, '/moisture');
  const perKg = (heat: number) => massHeat(draft, heat);
  const stated = draft.per === 'kg' ? draft.heat_MJ : statedByVolume(book, draft);
  if (draft.state === 'dry' && water === null)
    book.warn(
      'NO_MOISTURE',
      'The heat is for the dry material and no moisture is stated: it is taken as dry, which is the higher heat.',
    );
  const expectation = expectationOf(draft, composition, lookup);
  const common = {
    measured: draft.heat,
    water,
    composition,
    rests_on: `a supplier’s sheet (${draft.heat}, ${draft.state === 'dry' ? 'dry' : 'as received'}, per ${draft.per === 'm3' ? 'm³' : draft.per})`,
    pointer: '/heat_MJ',
    suspects: 'the unit and the basis of the sheet',
    ...(expectation === null ? {} : { expectation }),
  };
  if (draft.heat === 'net') {
    if (draft.per === 'kg')
      book.run(
        statedHeat,
        { H: stated },
        { at: '/heat_MJ' },
        { origins: { H: { origin: 'given', note: draft.source } } },
      );
    return {
      ...common,
      ...rangeOf(draft, stated, perKg),
      state: draft.state === 'dry' ? 'dry' : 'received',
      net_MJ_kg: stated,
      gross_MJ_kg: null,
    };
  }
  if (draft.state === 'as-received' && water === null)
    book.warn('NO_MOISTURE', 'No moisture is stated: the gross heat as received is taken as that of a dry material.');
  const wet = draft.state === 'as-received' ? (water ?? 0) : 0;
  const gross =
    wet === 0
      ? stated
      : book.run(grossDry, { H_ar: stated, w: wet }, { at: '/heat_MJ' }, { origins: { H_ar: 'given', w: 'given' } });
  const w_H = hydrogenOf(draft, composition);
  const net = book.run(
    netFromGross,
    { H_gross: gross, w_H },
    { at: '/heat_MJ', inputs: { w_H: '/hydrogen_pct' } },
    { origins: { w_H: draft.hydrogen_pct === undefined ? 'computed' : 'given' } },
  );
  const netOf = (heat: number) => netFromGross.run({ H_gross: perKg(heat) / (1 - wet), w_H });
  return { ...common, ...rangeOf(draft, net, netOf), state: 'dry', net_MJ_kg: net, gross_MJ_kg: gross };
}

function compositionOf({ formula, elements }: DraftOf<'supplier'>): Composition | null {
  if (formula !== undefined && formula.trim() !== '') return formulaComposition(formula);
  return elements === undefined ? null : elementsComposition(sharesOf(elements));
}

function statedByVolume(book: Workbook, draft: DraftOf<'supplier'>): number {
  if (draft.density_kg_m3 === undefined)
    throw DraftRefused.at(
      '/density_kg_m3',
      'missing',
      `A heat per ${draft.per === 'L' ? 'litre' : 'm³'} needs the density. Take it from the same sheet.`,
    );
  return book.run(
    fromVolume,
    { H_V: draft.heat_MJ * (draft.per === 'L' ? PER_LITRE : 1), rho: draft.density_kg_m3 },
    { at: '/heat_MJ', inputs: { rho: '/density_kg_m3' } },
    { origins: { H_V: { origin: 'given', note: draft.source }, rho: 'given' } },
  );
}

function massHeat({ per, density_kg_m3 = 1 }: DraftOf<'supplier'>, heat: number): number {
  return per === 'kg' ? heat : (heat * (per === 'L' ? PER_LITRE : 1)) / density_kg_m3;
}

function hydrogenOf(draft: DraftOf<'supplier'>, composition: Composition | null): number {
  if (draft.hydrogen_pct !== undefined) return draft.hydrogen_pct / 100;
  if (composition !== null) return waterHydrogen(composition);
  throw DraftRefused.at(
    '/hydrogen_pct',
    'missing',
    'A gross heat needs the hydrogen of the dry material to become a net heat. Enter its share, a formula or an analysis.',
  );
}

function rangeOf({ range, heat_MJ }: DraftOf<'supplier'>, net: number, netOf: (heat: number) => number) {
  if (range.by === 'class') return evidenceRange(net, range.evidence);
  if (!(range.low_MJ <= heat_MJ && heat_MJ <= range.high_MJ))
    throw DraftRefused.at(
      '/range',
      'range',
      `The heat of ${figure(heat_MJ)} MJ does not lie between ${figure(range.low_MJ)} and ${figure(range.high_MJ)} MJ. All three are on the basis of the sheet.`,
    );
  return {
    low_MJ_kg: Math.max(0, netOf(range.low_MJ)),
    high_MJ_kg: netOf(range.high_MJ),
    range_basis: 'low and high of the sheet',
  };
}
