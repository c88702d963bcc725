/** What a column of a calorimeter's file can be. */
export const ROLES = ['time', 'rate', 'oxygen', 'carbonDioxide', 'carbonMonoxide', 'flow', 'mass', 'massLoss'] as const;
export type Role = (typeof ROLES)[number];

export const ROLE_WORDS: Readonly<Record<Role, string>> = {
  time: 'time',
  rate: 'heat release rate',
  oxygen: 'oxygen',
  carbonDioxide: 'carbon dioxide',
  carbonMonoxide: 'carbon monoxide',
  flow: 'mass flow in the duct',
  mass: 'mass of the test piece',
  massLoss: 'mass loss rate',
};

const GAS: Readonly<Record<string, number>> = { fraction: 1, '%': 0.01, ppm: 1e-6 };
const PER_SECOND: Readonly<Record<string, number>> = { 'kg/s': 1, 'g/s': 0.001 };

/** Units each role may have, and the factor into s, kW (or kW/m²), parts of 1, kg/s and kg. */
export const COLUMN_UNITS: Readonly<Record<Role, Readonly<Record<string, number>>>> = {
  time: { s: 1, min: 60, h: 3600, clock: 1 },
  rate: { kW: 1, W: 0.001, MW: 1000, 'kW/m2': 1, 'W/m2': 0.001, 'MW/m2': 1000 },
  oxygen: GAS,
  carbonDioxide: GAS,
  carbonMonoxide: GAS,
  flow: PER_SECOND,
  mass: { kg: 1, g: 0.001 },
  massLoss: PER_SECOND,
};

/** True for a rate per exposed area. */
export function perArea(rateUnit: string): boolean {
  return rateUnit.endsWith('/m2');
}

/** A raised 2 of a file in an older encoding arrives as the sign for what cannot be read. */
const SPELLINGS: readonly (readonly [RegExp, string])[] = [
  [/^(s|sec|secs|second|seconds)$/, 's'],
  [/^(min|mins|minute|minutes)$/, 'min'],
  [/^(h|hr|hrs|hour|hours)$/, 'h'],
  [/^(h?h:mm:ss|hh:mm:ss|mm:ss)$/, 'clock'],
  [/^(kw|kj(\/|·)?s(-1)?)$/, 'kW'],
  [/^w$/, 'W'],
  [/^mw$/, 'MW'],
  [/^kw(\/|·|\*)?m(2|²|\uFFFD|\^2|\^-2|-2)$/, 'kW/m2'],
  [/^w(\/|·|\*)?m(2|²|\uFFFD|\^2|\^-2|-2)$/, 'W/m2'],
  [/^mw(\/|·|\*)?m(2|²|\uFFFD|\^2|\^-2|-2)$/, 'MW/m2'],
  [/^(volfr|vol\.?fraction|volumefraction|molfr|molefraction|fraction|mol\/mol|-|1)$/, 'fraction'],
  [/^(%|vol%|vol-%|vol\.%|%vol|pct|percent)$/, '%'],
  [/^ppm(v|vol)?$/, 'ppm'],
  [/^kg(\/|·)?s(-1)?$/, 'kg/s'],
  [/^g(\/|·)?s(-1)?$/, 'g/s'],
  [/^kg$/, 'kg'],
  [/^g$/, 'g'],
];

/** A unit as a header spells it, in the book's spelling; null where it is none of those above. */
export function columnUnit(text: string): string | null {
  const plain = text.toLowerCase().replaceAll(/\s+/g, '');
  return SPELLINGS.find(([pattern]) => pattern.test(plain))?.[1] ?? null;
}
