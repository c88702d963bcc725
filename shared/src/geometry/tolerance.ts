/** The one tolerance of the plan: two places closer than this are the same place, m. Boundary included. */
export const TOLERANCE_M = 0.001;

/**
 * Added where a distance between places on the 1 mm grid is compared with {@link TOLERANCE_M}, so that exactly 1 mm
 * counts as within although 0.001 has no exact binary form. Far below anything the grid can hold.
 */
export const ROUNDING_M = 1e-9;
