import { liningByKey, LININGS } from '@embertally/shared/catalogue/linings';
import { describe, expect, it } from 'vitest';

describe('linings', () => {
  it('are at least fourteen, each with its own key', () => {
    expect(LININGS.length).toBeGreaterThanOrEqual(14);
    expect(new Set(LININGS.map((row) => row.key)).size).toBe(LININGS.length);
  });

  it.each(LININGS.map((row) => [row.key, row] as const))(
    '%s: layers lie in the range of real building materials',
    (_, row) => {
      expect(row.layers.length).toBeGreaterThan(0);
      for (const layer of row.layers) {
        expect(layer.thickness_m).toBeGreaterThan(0);
        expect(layer.thickness_m).toBeLessThanOrEqual(0.5);
        expect(layer.conductivity_W_mK).toBeGreaterThan(0.01);
        expect(layer.conductivity_W_mK).toBeLessThan(60);
        expect(layer.density_kg_m3).toBeGreaterThanOrEqual(20);
        expect(layer.density_kg_m3).toBeLessThanOrEqual(8000);
        expect(layer.specific_heat_J_kgK).toBeGreaterThanOrEqual(400);
        expect(layer.specific_heat_J_kgK).toBeLessThanOrEqual(2500);
      }
      expect(row.source.title).not.toBe('');
    },
  );

  it('gives concrete the thermal inertia of 1918 J/m²s½K that Annex A examples use', () => {
    const [layer] = liningByKey('concrete')?.layers ?? [];
    if (layer === undefined) throw new Error('concrete has no layer');
    const inertia = Math.sqrt(layer.density_kg_m3 * layer.specific_heat_J_kgK * layer.conductivity_W_mK);
    expect(inertia).toBeCloseTo(1918.3, 1);
    expect(layer.thickness_m).toBe(0.2);
  });

  it('lists the exposed layer first', () => {
    expect(liningByKey('plastered-brick')?.layers.map((layer) => layer.label)).toEqual(['Gypsum plaster', 'Brick']);
  });

  it.each([
    ['brick', 0.8, 2600, 800],
    ['gypsum-board', 0.17, 960, 1100],
    ['plywood', 0.12, 540, 2500],
    ['aerated-concrete', 0.26, 500, 960],
    ['glass', 0.76, 2710, 800],
    ['steel-sheet', 45.8, 7850, 465],
    ['plastered-brick', 0.48, 1440, 840],
  ])('%s has the conductivity, density and heat of the handbook table', (key, k, density, heat) => {
    expect(liningByKey(key)?.layers[0]).toMatchObject({
      conductivity_W_mK: k,
      density_kg_m3: density,
      specific_heat_J_kgK: heat,
    });
  });

  it('has no row for a key it does not know', () => {
    expect(liningByKey('marzipan')).toBeUndefined();
  });
});
