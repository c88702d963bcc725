import { channiwalaParikh } from '../../methods/chemistry/channiwala-parikh.ts';
import { netDry } from '../../methods/heat/net-dry.ts';
import { netFromGross } from '../../methods/heat/net-from-gross.ts';
import { sharesOf, waterHydrogen, type Composition } from '../composition.ts';
import { DraftRefused } from '../draft-refused.ts';
import { knownHeat } from '../known-heat.ts';
import type { DraftOf } from '../material-draft.ts';
import type { OwnMaterialLookup } from '../material-lookup.ts';
import type { Expectation } from '../way-heat.ts';

/** Dry net and gross heat that a stated one is held against: by its analysis, else by a like material of the catalogue. */
export function expectationOf(
  draft: DraftOf<'supplier'>,
  composition: Composition | null,
  lookup: OwnMaterialLookup,
): Expectation | null {
  if (draft.elements !== undefined && composition?.by === 'elements') {
    const { w_C, w_H, w_O, w_N, w_S, w_ash } = sharesOf(draft.elements);
    const gross = channiwalaParikh.run({ w_C, w_H, w_O, w_N, w_S, w_ash });
    const net = netFromGross.run({ H_gross: gross, w_H: waterHydrogen(composition) });
    return { name: 'the analysis', net, gross };
  }
  if (draft.counterpart === undefined) return null;
  const known = knownHeat(draft.counterpart, null, lookup);
  if (known === null)
    throw DraftRefused.at(
      '/counterpart',
      'unknown_material',
      `The catalogue has no material “${draft.counterpart}”. Choose one from its list.`,
    );
  const w = (known.moisture_pct_wet ?? 0) / 100;
  const w_H = hydrogenOf(draft, composition);
  const net = netDry.run({ H_ar: known.net_MJ_kg, w });
  const stated = known.gross_MJ_kg === null ? null : known.gross_MJ_kg / (1 - w);
  return {
    name: `“${known.label}” of the catalogue`,
    net,
    gross: stated ?? (w_H === null ? null : net + (net - netFromGross.run({ H_gross: net, w_H }))),
  };
}

function hydrogenOf(draft: DraftOf<'supplier'>, composition: Composition | null): number | null {
  if (draft.hydrogen_pct !== undefined) return draft.hydrogen_pct / 100;
  return composition === null ? null : waterHydrogen(composition);
}
