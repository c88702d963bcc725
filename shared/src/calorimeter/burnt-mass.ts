import { formatNumber } from '../units/format-number.ts';
import type { CalorimeterNote } from './calorimeter-reading.ts';
import type { ReadColumns } from './read-columns.ts';

/** A balance that ends this far below 0, as a share of its first reading, cannot be believed. */
const DRIFT = 0.005;
/** More heat per kg burnt than solids and liquids have. */
const MOST_MJ_KG = 50;

/**
 * Mass that burnt, kg: from the mass of the test piece, else from its loss rate; null where neither can be used.
 * @param heat_MJ of the test piece, to hold the mass against; null where it is not known
 */
export function burntMass(read: ReadColumns, heat_MJ: number | null, notes: CalorimeterNote[]): number | null {
  const burnt = byMass(read, notes) ?? byLossRate(read);
  if (burnt === null || heat_MJ === null || heat_MJ <= MOST_MJ_KG * burnt) return burnt;
  notes.push({
    code: 'MASS',
    text: `By the file ${formatNumber(1000 * burnt, 3)} g burnt, which makes ${formatNumber(heat_MJ / burnt, 3)} MJ/kg: more than solids and liquids have. It is not used; enter the mass that burnt by hand.`,
  });
  return null;
}

function byMass({ values }: ReadColumns, notes: CalorimeterNote[]): number | null {
  const { mass } = values;
  if (mass === undefined) return null;
  const known = mass.filter((value) => !Number.isNaN(value));
  const [first = 0] = known;
  const burnt = first - (known.at(-1) ?? 0);
  if (first > 0 && burnt > 0 && known.every((value) => value >= -DRIFT * first)) return burnt;
  if (known.length > 0)
    notes.push({
      code: 'MASS',
      text: 'The mass of the test piece rises or falls below 0: it is not used. Enter the mass that burnt by hand.',
    });
  return null;
}

function byLossRate({ values }: ReadColumns): number | null {
  const { massLoss, time } = values;
  if (massLoss === undefined || time === undefined) return null;
  let burnt = 0;
  for (let i = 1; i < time.length; i += 1) {
    const step = ((massLoss[i]! + massLoss[i - 1]!) / 2) * (time[i]! - time[i - 1]!);
    if (Number.isFinite(step)) burnt += step;
  }
  return burnt > 0 ? burnt : null;
}
