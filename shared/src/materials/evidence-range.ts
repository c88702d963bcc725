/** How well a heat is known by where it comes from. */
export type HeatEvidence = 'exact' | 'laboratory' | 'class' | 'mixed';

/** Half-width of the range over the value. */
const HEAT_SPREAD: Readonly<Record<HeatEvidence, number>> = {
  exact: 0.01,
  laboratory: 0.03,
  class: 0.07,
  mixed: 0.15,
};

const WORDS: Readonly<Record<HeatEvidence, string>> = {
  exact: 'an exact compound',
  laboratory: 'a laboratory value',
  class: 'a class of goods',
  mixed: 'a mixed product',
};

interface EvidenceRange {
  readonly low_MJ_kg: number;
  readonly high_MJ_kg: number;
  readonly range_basis: string;
}

/** Low and high around a net heat by its evidence. @param least a wider relative half-width that was found, if any */
export function evidenceRange(net_MJ_kg: number, evidence: HeatEvidence, least = 0): EvidenceRange {
  const spread = Math.max(HEAT_SPREAD[evidence], least);
  const pct = Number((spread * 100).toPrecision(2));
  return {
    low_MJ_kg: net_MJ_kg * (1 - spread),
    high_MJ_kg: net_MJ_kg * (1 + spread),
    range_basis:
      least > HEAT_SPREAD[evidence]
        ? `± ${pct} %, the spread that was found`
        : `± ${pct} %, usual for ${WORDS[evidence]}`,
  };
}
