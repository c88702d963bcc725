import { MIXTURE_GAP, mixture } from '../../methods/heat/mixture.ts';
import { figure } from '../../methods/figure.ts';
import { DraftRefused } from '../draft-refused.ts';
import { knownHeat } from '../known-heat.ts';
import type { DraftOf } from '../material-draft.ts';
import type { MaterialFault } from '../material-fault.ts';
import type { KnownHeat, OwnMaterialLookup } from '../material-lookup.ts';
import type { WayHeat } from '../way-heat.ts';
import type { Workbook } from '../workbook.ts';

interface Part extends KnownHeat {
  readonly fraction: number;
}

/** From the heats of other materials by mass, as received. Heats of parts are shared values, so their ranges add up. */
export function heatFromComposition(book: Workbook, draft: DraftOf<'composition'>, lookup: OwnMaterialLookup): WayHeat {
  const parts = partsOf(draft, lookup);
  const inert = (draft.inert_pct ?? 0) / 100;
  const sum = parts.reduce((total, { fraction }) => total + fraction, inert);
  if (Math.abs(sum - 1) > MIXTURE_GAP + 1e-9)
    throw DraftRefused.at(
      '/parts',
      'sum',
      `The shares add up to ${figure(100 * sum)} %, not 100 %. Correct them; what does not burn has a field of its own.`,
    );
  const f = [...parts.map(({ fraction }) => fraction), ...(inert > 0 ? [inert] : [])];
  const heats = (of: (part: Part) => number) => [...parts.map(of), ...(inert > 0 ? [0] : [])];
  const grosses = parts.map(({ gross_MJ_kg }) => gross_MJ_kg);
  const place = { at: '/parts' };
  const gross = grosses.includes(null)
    ? null
    : book.run(mixture, { f, H: heats(({ gross_MJ_kg }) => gross_MJ_kg ?? 0) }, place, {
        origins: { f: 'given', H: 'catalogue' },
        steps: [{ text: 'Gross heats' }],
      });
  const net = book.run(mixture, { f, H: heats(({ net_MJ_kg }) => net_MJ_kg) }, place, {
    origins: { f: 'given', H: 'catalogue' },
    steps: [
      { text: `Net heats: ${parts.map(partWords).join('; ')}${inert > 0 ? `; ${figure(100 * inert)} % inert` : ''}` },
    ],
  });
  const burning = parts.reduce((total, { fraction }) => total + fraction, 0);
  const share = (of: (part: Part) => number) =>
    burning === 0 ? 0 : parts.reduce((total, part) => total + part.fraction * of(part), 0) / burning;
  return {
    state: 'received',
    measured: 'net',
    net_MJ_kg: net,
    gross_MJ_kg: gross,
    low_MJ_kg: mixture.run({ f, H: heats(({ low_MJ_kg }) => low_MJ_kg) }),
    high_MJ_kg: mixture.run({ f, H: heats(({ high_MJ_kg }) => high_MJ_kg) }),
    range_basis: 'the ranges of its parts by mass',
    water: null,
    composition: null,
    rests_on: `a composition of ${parts.map(({ label }) => label).join(', ')}`,
    pointer: '/parts',
    suspects: 'the shares',
    cellulosic: share(({ cellulosic }) => (cellulosic ? 1 : 0)) > 0.5,
    radiative_fraction: share(({ radiative_fraction }) => radiative_fraction),
  };
}

function partsOf(draft: DraftOf<'composition'>, lookup: OwnMaterialLookup): readonly Part[] {
  const faults: MaterialFault[] = [];
  const parts: Part[] = [];
  const seen = new Set<string>();
  draft.parts.forEach(({ material, version, mass_pct }, i) => {
    const known = knownHeat(material, version, lookup);
    if (known === null)
      faults.push({
        pointer: `/parts/${i}/material`,
        code: 'unknown_material',
        message:
          version === null
            ? `The catalogue has no material “${material}”. Choose one from its list.`
            : 'This version of the material is not there, or is not approved. Choose another.',
      });
    else parts.push({ ...known, fraction: mass_pct / 100 });
    if (seen.has(`${material}@${version}`))
      faults.push({
        pointer: `/parts/${i}/material`,
        code: 'twice',
        message: 'This material is listed twice. Put its share in one line.',
      });
    seen.add(`${material}@${version}`);
  });
  if (faults.length > 0) throw new DraftRefused(faults);
  return parts;
}

function partWords({ label, fraction, net_MJ_kg }: Part): string {
  return `${figure(100 * fraction)} % ${label}, ${figure(net_MJ_kg)} MJ/kg`;
}
