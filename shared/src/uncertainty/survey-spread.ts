import type { Evidence } from '../survey/survey-document.ts';
import type { Distribution } from './distribution.ts';

/** Relative standard deviation of a mass by how it was come to know; counting adds 2 % for the count itself. */
export const MASS_SPREAD: Readonly<Record<Evidence, number>> = {
  weighed: 0.03,
  counted: Math.sqrt(0.1 * 0.1 + 0.02 * 0.02),
  measured: 0.2,
  estimated: 0.3,
  hearsay: 0.5,
};

/** What a recorded mass is multiplied by: a scale errs to both sides alike, a guess errs by a factor. */
export function massDistribution(evidence: Evidence): Distribution {
  const kind = evidence === 'weighed' ? 'normal' : 'lognormal';
  return { kind, mean: 1, deviation: MASS_SPREAD[evidence] };
}

/** A heat measured in a laboratory. */
export const LABORATORY_HEAT_SPREAD = 0.03;

/** Moisture is known to three points of the wet mass. */
export const MOISTURE_SPREAD = 0.03;

/** Floor area is known to 1 %. */
export const AREA_SPREAD = 0.01;

/** Share of the load a survey overlooks: least, most likely, most. */
export const OVERLOOKED = { low: 0, mode: 0.05, high: 0.15 } as const;

/** What a closed cabinet lets into the fire: least, most likely, most. */
export const CABINET = { low: 0, mode: 0.85, high: 1 } as const;

/** Relative standard deviations of what else a fire in the room depends on. */
export const OPENING_SPREAD = 0.03;
export const HEIGHT_SPREAD = 0.02;
export const PEAK_SPREAD = 0.25;
export const GROWTH_SPREAD = 0.3;
