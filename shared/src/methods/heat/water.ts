/** Heat of vaporisation of water at 25 °C, MJ/kg. */
export const HEAT_OF_VAPORISATION_MJ_KG = 2.442;
/** Water formed per kg of hydrogen: 18.015 / 2.016. */
export const WATER_PER_HYDROGEN = 8.937;
