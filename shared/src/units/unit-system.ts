/** The units a person reads in: `SI`, or `US` customary. Values inside are always SI. */
export type UnitSystem = 'SI' | 'US';
