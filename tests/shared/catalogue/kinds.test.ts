import type { Kind } from '@embertally/shared/catalogue/catalogue-row';
import { kindByKey, KINDS } from '@embertally/shared/catalogue/kinds';
import { materialByKey } from '@embertally/shared/catalogue/materials';
import { describe, expect, it } from 'vitest';

function kind(key: string): Kind {
  const row = kindByKey(key);
  if (row === undefined) throw new Error(`The catalogue has no kind ${key}`);
  return row;
}

function mass_kg(row: Kind): number {
  return row.parts.reduce((sum, part) => sum + part.mass_kg, 0);
}

function heat_MJ(row: Kind): number {
  return row.parts.reduce((sum, part) => {
    const material = materialByKey(part.material);
    if (material === undefined) throw new Error(`${row.key} names ${part.material}, which is no material`);
    return sum + part.mass_kg * material.net_heat_MJ_kg;
  }, 0);
}

describe('kinds', () => {
  it('are at least a hundred, each with its own key and label', () => {
    expect(KINDS.length).toBeGreaterThanOrEqual(100);
    expect(new Set(KINDS.map((row) => row.key)).size).toBe(KINDS.length);
    expect(new Set(KINDS.map((row) => row.label.toLowerCase())).size).toBe(KINDS.length);
  });

  it.each(KINDS.map((row) => [row.key, row] as const))('%s: parts, mass, size and source hold together', (_, row) => {
    expect(row.key).toMatch(/^[a-z0-9]+(-[a-z0-9]+)*$/);
    expect(row.parts.length).toBeGreaterThan(0);
    expect(new Set(row.parts.map((part) => part.material)).size).toBe(row.parts.length);
    for (const part of row.parts) {
      expect(materialByKey(part.material), part.material).toBeDefined();
      expect(part.mass_kg).toBeGreaterThan(0);
    }
    expect(mass_kg(row)).toBeGreaterThanOrEqual(row.mass_low_kg);
    expect(mass_kg(row)).toBeLessThanOrEqual(row.mass_high_kg);
    for (const side of [row.width_m, row.depth_m, row.height_m]) {
      expect(side).toBeGreaterThanOrEqual(0.01);
      expect(side).toBeLessThanOrEqual(10);
    }
    if (row.peak_kW !== null) expect(row.peak_kW).toBeGreaterThan(0);
    expect(row.measure.quantity).toBeGreaterThan(0);
    expect(row.source.title).not.toBe('');
    expect(row.source.locator).not.toBe('');
  });

  it('carry the hazard of what they are made of', () => {
    for (const row of KINDS) {
      for (const part of row.parts.filter((candidate) => candidate.mass_kg >= 0.2 * mass_kg(row))) {
        const hazards = materialByKey(part.material)?.hazards ?? [];
        for (const hazard of ['battery', 'gas', 'aerosol', 'oxidiser', 'foam'] as const) {
          if (hazards.includes(hazard)) expect(row.hazards, `${row.key}: ${hazard}`).toContain(hazard);
        }
        if (hazards.includes('liquid')) {
          expect(
            row.hazards.some((own) => ['liquid', 'gas', 'smouldering'].includes(own)),
            row.key,
          ).toBe(true);
        }
      }
    }
  });

  it('cover what a scenery and costume store keeps', () => {
    const needed = [
      'timber-flat',
      'pallet-stack',
      'foam-blocks',
      'eps-blocks',
      'costume-rack-cotton',
      'costume-rack-wool',
      'wigs-on-shelves',
      'solvent-paint-shelf',
      'flammables-cabinet',
      'upholstered-chair',
      'mattress-foam',
      'cable-reel',
      'flight-case',
      'lithium-battery',
      'lithium-charging-shelf',
      'archive-shelving',
      'lever-arch-shelving',
      'desk',
      'workstation',
      'kitchen-units',
      'refrigerator',
      'wheeled-bin',
      'timber-rack',
      'sawdust-bin',
      'shrink-wrapped-pallet',
      'sofa',
      'curtains-synthetic',
      'lpg-cylinder',
      'cleaning-shelf',
      'oil-tank',
    ];
    expect(needed.filter((key) => kindByKey(key) === undefined)).toEqual([]);
  });

  it('has no row for a key it does not know', () => {
    expect(kindByKey('dragon')).toBeUndefined();
  });
});

/** Total heat and peak of one item as published; the source of each row is named in the catalogue row. */
const ITEMS: readonly (readonly [
  key: string,
  heatLow_MJ: number,
  heatHigh_MJ: number,
  peakLow_kW: number,
  peakHigh_kW: number,
])[] = [
  ['upholstered-chair', 200, 500, 1350, 1990],
  ['upholstered-chair-cotton', 250, 450, 290, 370],
  ['sofa', 700, 950, 2400, 3120],
  ['plastic-chair', 60, 120, 80, 300],
  ['mattress-foam', 80, 330, 810, 2630],
  ['mattress-cotton', 150, 200, 40, 970],
  ['double-bed', 750, 1100, 1700, 4700],
  ['desk', 1000, 2000, 500, 1500],
  ['workstation', 2000, 7000, 2800, 6900],
  ['bookcase', 500, 800, 600, 1000],
  ['wardrobe-particleboard', 1300, 1900, 1900, 1900],
  ['wardrobe-plywood', 1000, 1100, 3100, 3500],
  ['wardrobe-steel', 50, 70, 270, 270],
  ['filing-cabinet', 1500, 2400, 1, 100],
  ['computer', 80, 150, 100, 300],
  ['server-rack', 400, 1500, 100, 700],
  ['wastebasket', 10, 20, 4, 50],
  ['waste-bag', 18, 55, 140, 350],
  ['curtains-cotton', 25, 40, 160, 240],
  ['curtains-synthetic', 25, 40, 160, 240],
  ['dry-tree', 100, 250, 3200, 4300],
  ['kitchen-units', 2 * 600, 2 * 1000, 2 * 500, 2 * 1500],
  ['refrigerator', 500, 900, 500, 2000],
  ['market-stall', 2000, 6000, 1200, 6000],
  ['motor-scooter', 700, 1500, 800, 2500],
  ['car', 5000, 10_000, 4000, 10_000],
];

describe('kinds against published items', () => {
  it.each(ITEMS)('%s: heat %d to %d MJ, peak %d to %d kW', (key, heatLow, heatHigh, peakLow, peakHigh) => {
    const row = kind(key);
    expect(heat_MJ(row)).toBeGreaterThanOrEqual(heatLow);
    expect(heat_MJ(row)).toBeLessThanOrEqual(heatHigh);
    expect(row.peak_kW).toBeGreaterThanOrEqual(peakLow);
    expect(row.peak_kW).toBeLessThanOrEqual(peakHigh);
  });

  it('holds 506 MJ in an 11 kg LPG cylinder (46.0 MJ/kg, Babrauskas 1983)', () => {
    expect(heat_MJ(kind('lpg-cylinder'))).toBeCloseTo(506, 6);
  });

  it('holds 30 MJ of cell heat and 110 to 490 kW per kWh in lithium batteries', () => {
    for (const [key, kWh] of [
      ['lithium-battery', 1],
      ['lithium-charging-shelf', 2],
    ] as const) {
      const row = kind(key);
      const cells = row.parts.find((part) => part.material === 'lithium-ion-cell')?.mass_kg ?? 0;
      expect((cells * (materialByKey('lithium-ion-cell')?.net_heat_MJ_kg ?? 0)) / kWh).toBeCloseTo(30, 6);
      expect(row.measure).toEqual({ by: 'kilowatt-hours', quantity: kWh });
      expect(row.peak_kW).toBeGreaterThanOrEqual(110 * kWh);
      expect(row.peak_kW).toBeLessThanOrEqual(490 * kWh);
    }
  });

  /** kg per metre of filled single-sided shelf, drawer or rail (survey practice): typical, low, high. */
  it.each([
    ['bookshelves', 30, 25, 40],
    ['reference-books', 42, 35, 55],
    ['paperbacks', 18, 14, 24],
    ['suspended-files', 32, 25, 40],
    ['discs-on-shelves', 14, 10, 18],
    ['folded-linen', 25, 18, 35],
    ['magazines', 40, 35, 50],
    ['lever-arch-shelving', 38, 30, 45],
    ['archive-shelving', 35, 28, 45],
    ['records-on-shelves', 50, 45, 55],
    ['costume-rack-cotton', 25, 18, 40],
    ['costume-rack-wool', 25, 18, 40],
  ])('%s weighs %d kg per metre (%d to %d)', (key, typical, low, high) => {
    const row = kind(key);
    expect(mass_kg(row) / row.measure.quantity).toBeCloseTo(typical, 6);
    expect(row.mass_low_kg / row.measure.quantity).toBeCloseTo(low, 6);
    expect(row.mass_high_kg / row.measure.quantity).toBeCloseTo(high, 6);
  });

  /** kg/m³ in bulk (survey practice): low, high. */
  it.each([
    ['archive-boxes-stacked', 300, 600],
    ['paper-stacked', 500, 900],
    ['cartons-mixed-goods', 60, 250],
    ['plastic-goods-cartons', 40, 200],
    ['plastic-granulate', 500, 650],
    ['tyre-stack', 100, 250],
    ['carpet-rolls', 200, 400],
    ['upholstered-chairs-stacked', 25, 60],
    ['foam-blocks', 18, 45],
    ['straw-bales', 80, 200],
    ['timber-block-stack', 350, 600],
  ])('%s lies between %d and %d kg/m³', (key, low, high) => {
    const row = kind(key);
    expect(row.measure.by).toBe('volume');
    expect(row.mass_low_kg / row.measure.quantity).toBeCloseTo(low, 6);
    expect(row.mass_high_kg / row.measure.quantity).toBeCloseTo(high, 6);
  });

  it('says liquids by volume: the mass is litres times the density of the liquid, within 5 %', () => {
    for (const row of KINDS.filter((candidate) => candidate.measure.by === 'litres')) {
      const litres = row.parts.reduce((sum, part) => {
        const material = materialByKey(part.material);
        if (material?.group !== 'liquids' && part.material !== 'cooking-oil') return sum;
        return sum + (part.mass_kg / (material?.bulk_density_kg_m3?.typical ?? Number.NaN)) * 1000;
      }, 0);
      expect(Math.abs(litres / row.measure.quantity - 1), `${row.key}: ${litres} L`).toBeLessThan(0.05);
    }
  });
});
