/** Lower edges of the fire load density bands, MJ/m² of floor; the tokens `load-0` … `load-5` colour them. */
export const LOAD_BAND_EDGES: readonly number[] = [0, 200, 450, 700, 1000, 1400];

/** Which band a fire load density falls in, 0 (pale) to 5 (deep). */
export function loadBand(density_MJ_m2: number): number {
  return Math.max(
    0,
    LOAD_BAND_EDGES.findLastIndex((edge) => density_MJ_m2 >= edge),
  );
}
