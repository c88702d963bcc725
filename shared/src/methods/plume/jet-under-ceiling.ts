/** Times the rate counts for a fire against a wall or in a corner, whose plume draws air from half or a quarter. */
export const PLACE_FACTOR = { free: 1, wall: 2, corner: 4 } as const;

export interface CeilingJet {
  /** K */
  readonly rise: number;
  /** m/s */
  readonly velocity: number;
}

/**
 * Hottest gas and its velocity under a flat ceiling after Alpert 1972 (from memory), for the TOTAL heat release rate.
 * @param rate kW, already multiplied for a wall or corner
 * @param height from the fuel's surface to the ceiling, m, above 0
 * @param radius from the fire's axis, m, 0 and up; close in, it does not matter
 */
export function jetUnderCeiling(rate: number, height: number, radius: number): CeilingJet {
  return { rise: jetRise(rate, height, radius), velocity: jetVelocity(rate, height, radius) };
}

/** The rise alone, K; for who steps along a curve. */
export function jetRise(rate: number, height: number, radius: number): number {
  return radius / height <= 0.18
    ? (16.9 * rate ** (2 / 3)) / height ** (5 / 3)
    : (5.38 * (rate / radius) ** (2 / 3)) / height;
}

/** The velocity alone, m/s. */
export function jetVelocity(rate: number, height: number, radius: number): number {
  return radius / height <= 0.15
    ? 0.96 * Math.cbrt(rate / height)
    : (0.195 * Math.cbrt(rate) * Math.sqrt(height)) / radius ** (5 / 6);
}

/** Rate at which the gas at a place has risen by `rise` K, kW: the relation above solved for the rate. */
export function rateForRise(rise: number, height: number, radius: number): number {
  return radius / height <= 0.18
    ? ((rise * height ** (5 / 3)) / 16.9) ** 1.5
    : radius * ((rise * height) / 5.38) ** 1.5;
}
