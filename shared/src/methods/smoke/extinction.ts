/** Specific extinction of smoke from flames, m²/kg (Mulholland & Croarkin 2000, 8.7 ± 1.1 m²/g; from memory). Smouldering 4400. */
export const SPECIFIC_EXTINCTION = 8700;
/** Jin: signs that reflect light, and signs that shine. */
export const REFLECTING = 3;
export const SHINING = 8;
/** Visibility is not stated above this, m. */
export const FARTHEST_M = 30;
