const POWERS: Readonly<Record<string, string>> = { '2': '²', '3': '³' };

/** A sentence of a method as print sets its units: `500 m2` as 500 m², `m1/2` as m^½, `m-1/2` as m^−½. */
export function typeset(text: string): string {
  return text
    .replace(/\b(m|s)(-?)1\/2\b/gu, (_, unit: string, minus: string) => `${unit}^${minus === '' ? '' : '−'}½`)
    .replace(/\bm5\/2\b/gu, 'm^5/2')
    .replace(/\b(m|s)([23])(?![\w/])/gu, (_, unit: string, power: string) => `${unit}${POWERS[power] ?? power}`);
}
