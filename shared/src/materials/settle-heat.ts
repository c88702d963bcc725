import { basisCorrection } from '../methods/chemistry/basis-correction.ts';
import { netAsReceived } from '../methods/heat/net-as-received.ts';
import { formatNumber } from '../units/format-number.ts';
import type { DerivedMaterial, MaterialBasis } from './derived-material.ts';
import { DraftRefused } from './draft-refused.ts';
import type { MaterialDraft } from './material-draft.ts';
import { materialBasis, type FoundBasis } from './material-basis.ts';
import { receivedHeat } from './received-heat.ts';
import type { WayHeat } from './way-heat.ts';
import type { Workbook } from './workbook.ts';

type Settled = Pick<DerivedMaterial, 'net_MJ_kg' | 'low_MJ_kg' | 'high_MJ_kg' | 'gross_MJ_kg' | 'basis'>;

const MOST_MJ_KG = 150;
/** How far an accepted factor may be from the one proposed now. */
const SAME_FACTOR = 0.001;

/** Checks the basis of a way's heat, applies a proposal only where a person took it over, and counts the water. */
export function settleHeat(book: Workbook, draft: MaterialDraft, heat: WayHeat): Settled {
  const found = materialBasis(book, draft.way, heat);
  const factor = acceptedFactor(draft, found);
  const stated = heat.net_MJ_kg;
  const corrected =
    factor === null
      ? stated
      : book.run(basisCorrection, { H: stated, k: factor }, { at: '/accepted' }, { origins: { k: 'given' } });
  const water = heat.state === 'dry' ? (heat.water ?? 0) : 0;
  const net =
    water > 0
      ? book.run(netAsReceived, { H_dry: corrected, w: water }, { at: heat.pointer }, { origins: { w: 'given' } })
      : corrected;
  if (net > MOST_MJ_KG)
    throw DraftRefused.at(
      heat.pointer,
      'too_high',
      `${formatNumber(net, 3)} MJ/kg is more than any fuel has (hydrogen: 120 net).${found?.proposal ? ` ${found.text}` : ' Check the value and its unit.'}`,
    );
  if (net < 0 && heat.water === null)
    throw DraftRefused.at(
      heat.pointer,
      'no_heat',
      `It gives no heat (${formatNumber(net, 3)} MJ/kg). Check ${heat.suspects}.`,
    );
  if (net < 0) book.warn('NO_HEAT', 'The water takes more heat than the material gives; it counts with 0 MJ/kg.');
  const k = factor ?? 1;
  const settledNet = Math.max(0, net);
  return {
    net_MJ_kg: settledNet,
    low_MJ_kg: Math.min(settledNet, Math.max(0, receivedHeat(heat, heat.low_MJ_kg * k))),
    high_MJ_kg: Math.max(settledNet, receivedHeat(heat, heat.high_MJ_kg * k)),
    gross_MJ_kg: grossOf(draft, heat, corrected, water),
    basis: basisOf(book, found, factor, stated),
  };
}

/** The factor a person took over; null where none was. @throws DraftRefused where it is no longer what is proposed */
function acceptedFactor({ accepted }: MaterialDraft, found: FoundBasis | null): number | null {
  if (accepted === undefined) return null;
  const proposed = found?.proposal?.factor;
  if (
    proposed === undefined ||
    found?.finding !== accepted.finding ||
    Math.abs(accepted.factor / proposed - 1) > SAME_FACTOR
  )
    throw DraftRefused.at(
      '/accepted',
      'not_proposed',
      'The figures have changed since the correction was taken over, and it is no longer proposed. Take it back, and look at what the check says now.',
    );
  return proposed;
}

/** Taken for net, the stated heat is the gross one; else gross stays above net by the heat in the water. */
function grossOf(draft: MaterialDraft, heat: WayHeat, corrected: number, water: number): number | null {
  const received = (gross: number) => gross * (1 - water);
  if (draft.accepted?.finding === 'gross-for-net') return received(heat.net_MJ_kg);
  if (heat.gross_MJ_kg === null) return null;
  return received(corrected + heat.gross_MJ_kg - heat.net_MJ_kg);
}

function basisOf(
  book: Workbook,
  found: FoundBasis | null,
  factor: number | null,
  stated: number,
): MaterialBasis | null {
  if (found === null) return null;
  if (factor !== null) {
    book.warn('BASIS_CORRECTED', `Corrected from ${formatNumber(stated, 3)} MJ/kg as stated. ${found.text}`);
    return { ...found, proposal: null, accepted: { factor, stated_net_MJ_kg: stated } };
  }
  if (found.proposal !== null || found.finding === 'implausible') book.warn('BASIS', found.text);
  return { ...found, accepted: null };
}
