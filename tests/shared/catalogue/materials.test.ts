import { materialByKey, MATERIALS } from '@embertally/shared/catalogue/materials';
import { describe, expect, it } from 'vitest';

function material(key: string) {
  const row = materialByKey(key);
  if (row === undefined) throw new Error(`The catalogue has no material ${key}`);
  return row;
}

describe('materials', () => {
  it('are at least a hundred and twenty, each with its own key', () => {
    expect(MATERIALS.length).toBeGreaterThanOrEqual(120);
    expect(new Set(MATERIALS.map((row) => row.key)).size).toBe(MATERIALS.length);
  });

  it('have labels that no other material has', () => {
    expect(new Set(MATERIALS.map((row) => row.label.toLowerCase())).size).toBe(MATERIALS.length);
  });

  it.each(MATERIALS.map((row) => [row.key, row] as const))('%s: ranges, factor and source hold together', (_, row) => {
    expect(row.key).toMatch(/^[a-z0-9]+(-[a-z0-9]+)*$/);
    expect(row.key.length).toBeLessThanOrEqual(80);
    expect(row.low_MJ_kg).toBeGreaterThanOrEqual(0);
    expect(row.low_MJ_kg).toBeLessThanOrEqual(row.net_heat_MJ_kg);
    expect(row.net_heat_MJ_kg).toBeLessThanOrEqual(row.high_MJ_kg);
    expect(row.high_MJ_kg).toBeLessThanOrEqual(150);
    expect(row.combustion_factor).toBe(row.cellulosic ? 0.8 : 1);
    expect(row.radiative_fraction).toBeGreaterThan(0);
    expect(row.radiative_fraction).toBeLessThanOrEqual(0.6);
    if (row.bulk_density_kg_m3 !== null) {
      expect(row.bulk_density_kg_m3.low).toBeGreaterThan(0);
      expect(row.bulk_density_kg_m3.low).toBeLessThanOrEqual(row.bulk_density_kg_m3.typical);
      expect(row.bulk_density_kg_m3.typical).toBeLessThanOrEqual(row.bulk_density_kg_m3.high);
    }
    if (row.gross_heat_MJ_kg !== null) expect(row.gross_heat_MJ_kg).toBeGreaterThanOrEqual(row.net_heat_MJ_kg - 0.05);
    expect(row.source.title).not.toBe('');
    expect(row.source.locator).not.toBe('');
    expect(row.source.locator.length + row.source.title.length).toBeLessThanOrEqual(450);
  });

  it('all liquids, gases and foams say what they are', () => {
    for (const row of MATERIALS) {
      if (row.group === 'gases') expect(row.hazards, row.key).toContain('gas');
      if (row.group === 'foams') expect(row.hazards, row.key).toContain('foam');
      if (row.group === 'liquids' && row.net_heat_MJ_kg > 10) expect(row.hazards, row.key).toContain('liquid');
    }
  });

  it('has no row for a key it does not know', () => {
    expect(materialByKey('unobtainium')).toBeUndefined();
  });

  it('keeps timber at 16.8 MJ/kg, the value its estimates are checked with', () => {
    expect(material('timber')).toMatchObject({ net_heat_MJ_kg: 16.8, cellulosic: true, combustion_factor: 0.8 });
  });

  it('brings dry wood to 10 % moisture by the exact balance: H(1 - w) - 2.442 w with w = u/(1 + u)', () => {
    const wet = 0.1 / 1.1;
    for (const [used, dry] of [
      ['softwood', 'softwood-oven-dry'],
      ['hardwood', 'hardwood-oven-dry'],
    ] as const) {
      const expected = material(dry).net_heat_MJ_kg * (1 - wet) - 2.442 * wet;
      expect(Math.abs(material(used).net_heat_MJ_kg - expected)).toBeLessThan(0.06);
    }
  });

  it('takes 40 % spirits as the ethanol less the heat its water needs', () => {
    const ethanol = 0.333 * 26.81 - 0.667 * 2.442;
    expect(Math.abs(material('spirits-40').net_heat_MJ_kg - ethanol)).toBeLessThan(0.05);
  });

  it('agrees with EN 1991-1-2:2002 Table E.3 to within a quarter where its class value is not a rounding of fuels', () => {
    const classes: [string, number][] = [
      ['timber', 17.5],
      ['cotton', 20],
      ['paper', 20],
      ['charcoal', 30],
      ['polyethylene', 40],
      ['polystyrene', 40],
      ['abs', 35],
      ['pu-foam-flexible', 25],
      ['bitumen', 40],
      ['leather', 20],
      ['linoleum', 20],
      ['tyre-rubber', 30],
    ];
    for (const [key, value] of classes) {
      expect(Math.abs(material(key).net_heat_MJ_kg / value - 1), key).toBeLessThan(0.25);
    }
  });

  it('keeps gases at the density an ideal gas has at 15 °C and 1 atm, within 4 %', () => {
    const atomic: Record<string, number> = { H: 1.008, C: 12.011, N: 14.007, O: 15.999, S: 32.06 };
    for (const row of MATERIALS.filter((candidate) => candidate.group === 'gases' && candidate.formula !== null)) {
      let molar = 0;
      for (const [, element, count] of (row.formula ?? '').matchAll(/([A-Z][a-z]?)(\d*)/g)) {
        molar += (atomic[element ?? ''] ?? Number.NaN) * Number(count === '' ? 1 : count);
      }
      const ideal = (molar / 1000) * (101_325 / (8.314462618 * 288.15));
      expect(Math.abs((row.bulk_density_kg_m3?.typical ?? 0) / ideal - 1), row.key).toBeLessThan(0.04);
    }
  });
});
