import { describe, expect, it } from 'vitest';
import { materialByKey } from '@embertally/shared/catalogue/materials';
import { conversionFactor } from '@embertally/shared/methods/burnout/conversion-factor';
import { meanThermalInertia } from '@embertally/shared/methods/burnout/mean-thermal-inertia';
import { parametricCurve } from '@embertally/shared/methods/burnout/parametric-curve';
import { heatFromFormation } from '@embertally/shared/methods/chemistry/heat-from-formation';
import { airBuoyancy } from '@embertally/shared/methods/calorimetry/air-buoyancy';
import { constantPressure } from '@embertally/shared/methods/calorimetry/constant-pressure';
import { grossAshFree } from '@embertally/shared/methods/heat/gross-ash-free';
import { netFromGross } from '@embertally/shared/methods/heat/net-from-gross';
import { deltaQ1 } from '@embertally/shared/methods/load/delta-q1';
import { designLoadItalian } from '@embertally/shared/methods/load/design-load-italian';
import { enclosureFactor } from '@embertally/shared/methods/load/enclosure-factor';
import { protectedLoads } from '@embertally/shared/methods/load/protected-loads';
import { ceilingJet } from '@embertally/shared/methods/plume/ceiling-jet';
import { plumeTemperature } from '@embertally/shared/methods/plume/plume-temperature';
import { poolFire } from '@embertally/shared/methods/pool/pool-fire';
import { POOL_FUELS } from '@embertally/shared/methods/pool/pool-fuels';
import { rangeFaults } from '@embertally/shared/methods/range-faults';
import { flashoverBabrauskas } from '@embertally/shared/methods/room/flashover-babrauskas';
import { flashoverMqh } from '@embertally/shared/methods/room/flashover-mqh';
import { flashoverThomas } from '@embertally/shared/methods/room/flashover-thomas';
import { hotLayerMqh } from '@embertally/shared/methods/room/hot-layer-mqh';
import { ventilationLimit } from '@embertally/shared/methods/room/ventilation-limit';
import { gumbelFractile } from '@embertally/shared/methods/statistics/gumbel-fractile';
import { lognormalFractile } from '@embertally/shared/methods/statistics/lognormal-fractile';
import { fireLoadUncertainty } from '@embertally/shared/methods/uncertainty/fire-load-uncertainty';
import { estimateRoom } from '@embertally/shared/tally/estimate-room';
import { SCENERY_DOCK } from '../shared/tally/scenery-dock.ts';
import { atoms } from './atoms.ts';

const heatOf = (key: string): number => {
  const material = materialByKey(key);
  if (!material) throw new Error(`No material ${key}.`);
  return material.net_heat_MJ_kg;
};

/** Numbers in circulation that are old, misprinted or meant for something else. */
describe('traps of data and of editions', () => {
  it('the duration follows 0.2e-3 q/O, not the 0.13e-3 of the pre-standard: 60 and not 39 minutes', () => {
    expect(parametricCurve.run({ O: 0.04, b: 1160, q_td: 200, t_lim: 1 / 3 }).timeOfPeak).toBeCloseTo(60, 9);
  });

  it('610 and 1500 are the published constants, not 624 and 1518', () => {
    expect(flashoverMqh.run({ h_k: 0.03, A_T: 100, F: 3, A_f: 12, H: 2.4 })).toBeCloseTo(610 * 3, 9);
    expect(hotLayerMqh.run({ Q: 610 * 3, h_k: 0.03, A_T: 100, F: 3, position: 'centre' })).toBeLessThan(500);
    expect(ventilationLimit.run({ F: 2, O: 0.05 })).toBe(3000);
  });

  it('the plume takes the convective share: the whole rate would read 27 % high', () => {
    const rise = (Q_c: number) => plumeTemperature.run({ Q_c, z: 5, z_0: 0.295, T_0: 293, rho_0: 1.2 });
    expect(rise(700)).toBeCloseTo(149.23, 0);
    expect(rise(1000) / rise(700)).toBeCloseTo((10 / 7) ** (2 / 3), 6);
  });

  it('benzoic acid: 26.42 at constant pressure, 26.434 in a bomb, 26.454 by weight in air', () => {
    const { gross } = heatFromFormation.run({ ...atoms({ C: 7, H: 6, O: 2 }), dH_f: -385.2 });
    expect(gross).toBeCloseTo(26.42, 2);
    const inAir = airBuoyancy.run({ H_vac: 26.434, rho_s: 1.32, rho_w: 8.4, rho_a: 0.0012 });
    expect(inAir).toBeCloseTo(26.454, 3);
    expect(constantPressure.run({ dU: -3225.62, dn: -0.5, T: 298.15 })).toBeCloseTo(-3226.86, 2);
  });

  it('heats of the catalogue are those at 298 K from undisturbed sources', () => {
    // At 0 K methane is 66.6 kJ/mol; averages of old data put styrene at 87.7 and diethyl ether at -271.2.
    const net = (formula: ReturnType<typeof atoms>, dH_f: number) => heatFromFormation.run({ ...formula, dH_f }).net;
    for (const [key, formula, right, wrong] of [
      ['methane', atoms({ C: 1, H: 4 }), -74.6, -66.6],
      ['styrene', atoms({ C: 8, H: 8 }), 103.8, 87.7],
      ['diethyl-ether', atoms({ C: 4, H: 10, O: 1 }), -279.5, -271.2],
    ] as const) {
      const apart = (dH_f: number) => Math.abs(heatOf(key) - net(formula, dH_f));
      expect(apart(right), key).toBeLessThan(apart(wrong));
    }
  });

  it('class values of the standard are no fuel data: methanol 30, PVC 20, cork 20, plastics 40', () => {
    expect(heatOf('methanol')).toBeCloseTo(19.9, 1);
    expect(heatOf('polyethylene')).toBeGreaterThan(42);
    for (const key of ['pvc-rigid', 'cork']) expect(Math.abs(heatOf(key) - 20), key).toBeGreaterThan(2);
  });

  it('the heats of the pool table stay in the pool table: acetone 25.8 and transformer oil 46.4', () => {
    const pool = (key: string) => POOL_FUELS.find((one) => one.key === key)?.heat;
    expect([pool('acetone'), pool('transformer-oil')]).toEqual([25.8, 46.4]);
    expect(heatOf('acetone')).toBeCloseTo(28.5, 1);
    expect(heatOf('transformer-oil')).toBeLessThan(44);
  });

  it('gross and net are 7 % apart for polyethylene and for wood: web tables mostly print gross', () => {
    for (const [gross, w_H] of [
      [46.4, 0.1437],
      [19.9, 0.06],
    ] as const)
      expect(gross / netFromGross.run({ H_gross: gross, w_H }) - 1).toBeCloseTo(0.07, 2);
  });

  it('the three flashover criteria are far apart in a large room, so none of them is left out', () => {
    const [A_T, F] = [490, 15.8114];
    expect(flashoverThomas.run({ A_T, F, A_f: 150 })).toBeCloseTo(9798.7, 0);
    expect(flashoverBabrauskas.run({ F, A_T_per_F: A_T / F })).toBeCloseTo(11_858.5, 0);
    expect(flashoverMqh.run({ h_k: 0.03, A_T, F, A_f: 150, H: 4 })).toBeCloseTo(9299.8, 0);
  });

  it('relations give plausible numbers far outside their tests, so each says where it was left', () => {
    const left = [
      rangeFaults(flashoverThomas, { A_T: 900, F: 10, A_f: 400 }),
      rangeFaults(flashoverBabrauskas, { F: 1, A_T_per_F: 120 }),
      rangeFaults(flashoverMqh, { h_k: 0.03, A_T: 900, F: 10, A_f: 400, H: 6 }),
      rangeFaults(ceilingJet, { Q: 1000, H: 25, r: 3, place: 'free' }),
      rangeFaults(poolFire, { rate: 0.05, by: 'depends-on-diameter', kBeta: 2, D: 0.1, H: 40, rho: 740, V: 1 }),
    ];
    expect(left.map((faults) => faults.map(({ input }) => input).join())).toEqual([
      'A_f',
      'A_T_per_F',
      'A_f,H',
      'H',
      'D',
    ]);
  });

  it('gross heat per dry mass and per dry mass without ash are two things', () => {
    expect(grossAshFree.run({ H_gross: 19.41, a: 0.033 })).toBeCloseTo(20.07, 2);
  });

  it('b is averaged without the openings, O divides by the area with them', () => {
    const b = meanThermalInertia.run({ b: [1000, 500], A: [90, 90] });
    expect(b).toBe(750);
    const { room, burnout } = estimateRoom(SCENERY_DOCK, { workings: true });
    expect(room.openingFactor?.value).toBeCloseTo(7.4361 / 336, 5);
    const areas = burnout.thermalInertia?.inputs?.find(({ name }) => name === 'A')?.value;
    expect(
      String(areas)
        .split('; ')
        .reduce((sum, one) => sum + Number(one), 0),
    ).toBeCloseTo(331.2, 6);
  });

  it('the size of a compartment has three readings: 1.62 in a line, 1.9 in steps, 1.2 in Italy', () => {
    expect(deltaQ1.run({ A_f: 900, reading: 'linear' })).toBeCloseTo(1.6156, 4);
    expect(deltaQ1.run({ A_f: 900, reading: 'step-up' })).toBe(1.9);
    const none = { suppression: 'none', smoke: 'no', detection: 'no', team: 'no', hydrants: 'none' } as const;
    expect(designLoadItalian.run({ q_f: 1, A: 900, risk: 'II', ...none, routes: 'no', access: 'no' }).size).toBe(1.2);
  });

  it('a closed steel cabinet lets 0, 0.85 or a tenth into the fire, by the code', () => {
    expect(enclosureFactor.run({ enclosure: 'cabinet', rated: 'no', hazardous: 'no' })).toBe(0.85);
    expect(enclosureFactor.run({ enclosure: 'sealed', rated: 'yes', hazardous: 'no' })).toBe(0);
    expect(protectedLoads.run({ Q: new Array<number>(20).fill(50) })).toBe(100);
  });

  it('a shared heat makes errors of items move together: 287 and not 258 MJ', () => {
    const items = { M: [100, 80], H: [17.5, 17.5], u_M: [10, 8], u_H: [1, 1], entry: [0, 1], u_psi: [] };
    expect(fireLoadUncertainty.run({ ...items, material: [0, 0] })).toBeCloseTo(287.446, 2);
    expect(fireLoadUncertainty.run({ ...items, material: [0, 1] })).toBeCloseTo(258.118, 2);
  });

  it('mixed shops are lognormal: median 499 and 80 % at 1063, where Gumbel would go below zero', () => {
    const shops = { mean: 747, V: 833 / 747 };
    expect(lognormalFractile.run({ ...shops, p: 0.5 })).toBeCloseTo(498.7, 0);
    expect(lognormalFractile.run({ ...shops, p: 0.8 })).toBeCloseTo(1062.7, 0);
    expect(() => gumbelFractile.run({ ...shops, p: 0.05 })).toThrow(/lognormal/);
  });

  it('the conversion factor takes b as it is, not clipped to the range of the curve', () => {
    expect(conversionFactor.run({ b: 2600, table: 'EN' })).toBe(0.04);
    expect(conversionFactor.run({ b: 719.9, table: 'EN' })).toBe(0.07);
  });
});
