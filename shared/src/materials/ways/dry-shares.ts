import type { Shares } from '../composition.ts';
import type { DraftOf } from '../material-draft.ts';

/**
 * Shares of the dry material (ash always per dry mass, as laboratories give it) from shares of the dry material without ash, or of the material as it lies there (its
 * hydrogen and oxygen without those of the water).
 */
export function dryShares(shares: Shares, of: DraftOf<'ultimate'>['of'], water: number): Shares {
  if (of === 'dry') return shares;
  if (of === 'as-received') return scaled(shares, 1 / (1 - water), shares.w_ash / (1 - water));
  return scaled(shares, 1 - shares.w_ash, shares.w_ash);
}

function scaled(shares: Shares, factor: number, w_ash: number): Shares {
  return {
    w_C: shares.w_C * factor,
    w_H: shares.w_H * factor,
    w_O: shares.w_O * factor,
    w_N: shares.w_N * factor,
    w_S: shares.w_S * factor,
    w_Cl: shares.w_Cl * factor,
    w_ash,
  };
}
