/** The lengths of an opening, rounded when a command commits them. */
export const OPENING_LENGTHS = ['offset_m', 'width_m', 'height_m', 'sill_m'] as const;
