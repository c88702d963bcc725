/** The lengths of an entry, rounded when a command commits them. */
export const ENTRY_LENGTHS = ['x_m', 'y_m', 'base_height_m', 'width_m', 'depth_m', 'height_m'] as const;
