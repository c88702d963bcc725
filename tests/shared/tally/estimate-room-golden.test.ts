import { describe, expect, it } from 'vitest';
import { estimateRoom } from '@embertally/shared/tally/estimate-room';
import { SCENERY_DOCK } from './scenery-dock.ts';

/**
 * One room worked by an independent implementation (origin: independent). Figures are compared to the digits that were
 * printed there.
 */
describe('a scenery dock worked by an independent implementation', () => {
  const tally = estimateRoom(SCENERY_DOCK);
  const { room, load, growth, burnout } = tally;
  const rows: readonly [string, number | null | undefined, number, number][] = [
    ['floor area', room.floorArea.value, 96, 1e-9],
    ['enclosing area', room.enclosingArea.value, 336, 1e-9],
    ['ventilation factor', room.ventilationFactor?.value, 7.4361, 5e-5],
    ['opening factor', room.openingFactor?.value, 0.02213, 5e-6],
    ['fire load', load.total.value, 13_400, 1e-6],
    ['per floor', load.perFloor?.value, 139.58, 5e-3],
    ['per enclosure', load.perEnclosure?.value, 39.88, 5e-3],
    ['combustion factor', load.combustionFactor.value, 0.8, 1e-12],
    ['as kept', load.asKept?.value, 111.67, 5e-3],
    ['design', load.design?.value, 41.38, 5e-3],
    ['heat released', growth.heatReleased?.value, 10_720, 1e-6],
    ['fuel plateau', growth.fuelPlateau?.value, 2500, 1e-9],
    ['openings plateau', growth.openingsPlateau?.value, 10_410.6, 0.05],
    ['growth end', growth.growthEnd?.value, 474.34, 5e-3],
    ['decay start', growth.decayStart?.value, 3317.8, 0.05],
    ['end', growth.end?.value, 5890.6, 0.05],
    ['ventilation limit', room.ventilationLimit?.value, 11_154.2, 0.05],
    ['Thomas', room.flashover.thomas?.value, 5394.2, 0.05],
    ['Babrauskas', room.flashover.babrauskas?.value, 5577.1, 0.05],
    ['McCaffrey, Quintiere and Harkleroad', room.flashover.mqh?.value, 8471.7, 0.2],
    ['hot layer', room.hotLayer?.value, 218.4, 0.05],
    ['thermal inertia', burnout.thermalInertia?.value, 1918.3, 0.05],
    ['equivalent time as kept', burnout.asKept?.equivalentTime?.value, 14.11, 5e-3],
    ['equivalent time, design', burnout.design?.equivalentTime?.value, 5.23, 5e-3],
    ['per enclosure, as kept', burnout.asKept?.loadPerEnclosure?.value, 31.9, 0.05],
    ['per enclosure, design', burnout.design?.loadPerEnclosure?.value, 11.8, 0.05],
  ];
  it.each(rows)('%s', (_name, value, expected, tolerance) => {
    expect(Math.abs((value ?? NaN) - expected)).toBeLessThanOrEqual(tolerance);
  });

  it('does not flash over: the peak of 2500 kW is below every criterion', () => {
    expect(room.flashover.time).toMatchObject({ value: null, unit: 's' });
    expect(room.flashover.time?.never).toMatch(/2500 kW/);
    expect(growth.governedBy).toBe('fuel');
    expect(room.regime).toBe('compartment');
  });

  it('has no parametric curve: the load per enclosure is below 50 MJ/m²', () => {
    expect(burnout.asKept?.parametric).toBeUndefined();
    expect(burnout.design?.parametric).toBeUndefined();
    const paths = tally.missing.map(({ path }) => path);
    expect(paths).toContain('burnout.asKept.parametric');
    expect(paths).toContain('burnout.design.parametric');
  });

  it('stands within its permit', () => {
    expect(tally.limits).toMatchObject([{ quantity: 'load_per_floor_MJ_m2', bound: 900, standing: 'within' }]);
    expect(tally.limits[0]?.ratio).toBeCloseTo(139.583 / 900, 5);
  });

  it('takes 14 of 60 rated minutes', () => {
    expect(burnout.asKept?.standing).toBe('within');
  });
});
