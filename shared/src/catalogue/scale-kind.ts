import type { Kind, KindPart } from './catalogue-row.ts';

/** How much of a kind stands there, and what follows from it. Fits the fields of an entry. */
export interface KindAmount {
  readonly parts: readonly KindPart[];
  readonly mass_low_kg: number;
  readonly mass_high_kg: number;
  readonly width_m: number;
  readonly depth_m: number;
  readonly height_m: number;
  readonly peak_kW: number | null;
}

/** Moisture of heated rooms, % of dry mass. */
const PALLET_MOISTURE_PCT = 10;

/**
 * Peak heat release of a stack of wooden pallets: 919 (1 + 2.14 h)(1 − 0.027 M) kW per m² of floor. Krasner data with the
 * fit of Babrauskas (from memory; some editions print 0.03 M). Range 0.5 m ≤ h ≤ 4.5 m; outside it null: not known.
 */
function palletStackPeak_kW(height_m: number, floor_m2: number): number | null {
  if (height_m < 0.5 || height_m > 4.5) return null;
  return 919 * (1 + 2.14 * height_m) * (1 - 0.027 * PALLET_MOISTURE_PCT) * floor_m2;
}

/**
 * A kind in another amount than its row stands for: 4 m of shelf, a stack 2.4 m high, 35 L. Masses grow in proportion; a
 * stack grows in height, everything else along its width. The peak grows in proportion, a wooden pallet stack's by its own
 * formula.
 *
 * @param quantity in the unit of `kind.measure`, above 0
 * @throws RangeError for a kind that is counted by the piece (an entry's count multiplies it), or a quantity that is not a
 *   positive number
 */
export function scaleKind(kind: Kind, quantity: number): KindAmount {
  if (kind.measure.by === 'pieces') throw new RangeError(`${kind.label} is counted by the piece.`);
  if (!(quantity > 0) || !Number.isFinite(quantity)) throw new RangeError(`${kind.label} needs an amount above 0.`);
  const ratio = quantity / kind.measure.quantity;
  const upward = kind.measure.by === 'stack height';
  const peak_kW =
    kind.key === 'pallet-stack'
      ? palletStackPeak_kW(quantity, kind.width_m * kind.depth_m)
      : kind.peak_kW === null
        ? null
        : kind.peak_kW * ratio;
  return {
    parts: kind.parts.map((part) => ({ material: part.material, mass_kg: part.mass_kg * ratio })),
    mass_low_kg: kind.mass_low_kg * ratio,
    mass_high_kg: kind.mass_high_kg * ratio,
    width_m: upward ? kind.width_m : kind.width_m * ratio,
    depth_m: kind.depth_m,
    height_m: upward ? kind.height_m * ratio : kind.height_m,
    peak_kW,
  };
}
