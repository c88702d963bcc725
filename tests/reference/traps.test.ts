import { describe, expect, it } from 'vitest';
import { openingsPlateau } from '@embertally/shared/methods/growth/openings-plateau';
import { parametricCurve, parametricTemperature } from '@embertally/shared/methods/burnout/parametric-curve';
import { thermalInertia } from '@embertally/shared/methods/burnout/thermal-inertia';
import { heatFromEquation } from '@embertally/shared/methods/chemistry/heat-from-equation';
import { heatFromFormation } from '@embertally/shared/methods/chemistry/heat-from-formation';
import { airBuoyancy } from '@embertally/shared/methods/calorimetry/air-buoyancy';
import { constantVolume } from '@embertally/shared/methods/calorimetry/constant-pressure';
import { gradingClass } from '@embertally/shared/methods/load/grading-class';
import { olderUnits } from '@embertally/shared/methods/load/older-units';
import { ceilingJet } from '@embertally/shared/methods/plume/ceiling-jet';
import { rtiFromFeet } from '@embertally/shared/methods/plume/rti-from-feet';
import { POOL_FUELS } from '@embertally/shared/methods/pool/pool-fuels';
import { viewCylinder } from '@embertally/shared/methods/radiation/view-cylinder';
import { visibility } from '@embertally/shared/methods/smoke/visibility';
import { lithiumBattery } from '@embertally/shared/methods/storage/lithium-battery';
import { palletStack } from '@embertally/shared/methods/storage/pallet-stack';
import { rangeFaults } from '@embertally/shared/methods/range-faults';
import { pointSource } from '@embertally/shared/methods/radiation/point-source';
import { growthCoefficient } from '@embertally/shared/methods/growth/growth-coefficient';
import { moistureEn } from '@embertally/shared/methods/heat/moisture-en';
import { moistureWetBasis } from '@embertally/shared/methods/heat/moisture-wet-basis';
import { netAsReceived } from '@embertally/shared/methods/heat/net-as-received';
import { liningHeatTransfer } from '@embertally/shared/methods/room/lining-heat-transfer';
import { openings } from '@embertally/shared/methods/room/openings';
import { ventilationLimit } from '@embertally/shared/methods/room/ventilation-limit';
import { estimateRoom } from '@embertally/shared/tally/estimate-room';
import type { RoomInput } from '@embertally/shared/tally/room-input';
import { atoms } from './atoms.ts';
import { SCENERY_DOCK } from '../shared/tally/scenery-dock.ts';

const withOptions = (options: RoomInput['options']): RoomInput => ({
  ...SCENERY_DOCK,
  options: { ...SCENERY_DOCK.options, ...options },
});

/** Mistakes that are easy to make in this trade and give a number that looks right. */
describe('traps', () => {
  it('the printed moisture relation and the exact balance are two things', () => {
    expect(moistureEn.run({ H_u0: 18.5, u: 12 })).toBeCloseTo(15.98, 2);
    expect(netAsReceived.run({ H_dry: 18.5, w: moistureWetBasis.run({ u: 0.12 }) })).toBeCloseTo(16.26, 2);
  });

  it('the combustion factor is not counted a second time in the plateau of the openings', () => {
    const one = estimateRoom(withOptions({ combustion_factor: 1 }));
    const less = estimateRoom(withOptions({ combustion_factor: 0.8 }));
    expect(one.growth.openingsPlateau?.value).toBe(less.growth.openingsPlateau?.value);
    expect(one.growth.heatReleased?.value).toBeCloseTo((less.growth.heatReleased?.value ?? 0) / 0.8, 6);
  });

  it('the plateau of the openings stays below the oxygen limit', () => {
    expect(openingsPlateau.run({ F: 7.4 })).toBeLessThan(ventilationLimit.run({ F: 7.4, O: 0.02 }));
  });

  it('a load measured as it burns is not reduced again', () => {
    const [entry] = SCENERY_DOCK.contents;
    if (!entry) throw new Error('The dock has one entry.');
    const parts = entry.parts.map((part) => ({ ...part, heat_basis: 'effective' as const }));
    const tally = estimateRoom({ ...withOptions({ combustion_factor: null }), contents: [{ ...entry, parts }] });
    expect(tally.load.combustionFactor.value).toBe(1);
  });

  it('floor area and enclosing area are a factor of 3.5 apart in this room', () => {
    const { load } = estimateRoom(SCENERY_DOCK);
    expect((load.perFloor?.value ?? 0) / (load.perEnclosure?.value ?? 1)).toBeCloseTo(336 / 96, 9);
  });

  it('the two growth conventions are 5.5 % apart under the same name', () => {
    const en = growthCoefficient.run({ growth: 'fast', convention: 'EN' });
    expect(growthCoefficient.run({ growth: 'fast', convention: 'NFPA' }) / en).toBeCloseTo(1.055, 9);
  });

  it('the parametric curve jumps at its time limit: 555 °C, then 790 °C', () => {
    const at = (q_td: number) => parametricCurve.run({ O: 0.04, b: 1160, q_td, t_lim: 20 / 60 }).peak;
    expect(at(66)).toBeCloseTo(554.9, 1);
    expect(at(67)).toBeCloseTo(789.5, 1);
  });

  it('the fuel controls when the two times are exactly equal, whatever the floating point', () => {
    const t_lim = 20 / 60;
    const O = 0.05;
    const q_td = (t_lim * O) / 0.2e-3;
    const fire = parametricCurve.run({ O, b: 1160, q_td, t_lim });
    expect(fire.timeOfPeak).toBeCloseTo(20, 9);
    expect(parametricTemperature(fire, fire.timeOfPeak)).toBeCloseTo(fire.peak, 9);
  });

  it('a fuel controlled fire cools from its own peak without a step', () => {
    const fire = parametricCurve.run({ O: 0.1, b: 800, q_td: 60, t_lim: 20 / 60 });
    expect(fire.fuelControlled).toBe(true);
    expect(parametricTemperature(fire, fire.timeOfPeak + 1e-6)).toBeCloseTo(fire.peak, 3);
    expect(fire.x * fire.coolingTime).toBeCloseTo((20 / 60) * fire.gamma, 9);
  });

  it('thickness matters only where the exposed layer is the heavier one', () => {
    const light = { lambda: 0.25, rho: 900, c: 1000 };
    const heavy = { lambda: 1.6, rho: 2300, c: 1000 };
    const b = (first: typeof light, second: typeof light, s: number) =>
      thermalInertia.run({
        t_max: 1,
        s: [s, 0.2],
        rho: [first.rho, second.rho],
        c: [first.c, second.c],
        lambda: [first.lambda, second.lambda],
      }).b;
    expect(b(light, heavy, 0.005)).toBe(b(light, heavy, 0.05));
    expect(b(heavy, light, 0.005)).toBeLessThan(b(heavy, light, 0.03));
  });

  it('heat transfer comes out in kilowatts, thin linings switch at the penetration time', () => {
    const at = (t: number) => liningHeatTransfer.run({ t, k: [0.48], rho: [1440], c: [840], d: [0.016] });
    expect(at(100).h_k).toBeLessThan(1);
    expect(at(161).h_k).toBeGreaterThan(at(162).h_k);
    expect(at(162).h_k).toBeCloseTo(0.03, 9);
  });

  it('the openings taken together are not the sum of A √h', () => {
    const { factor } = openings.run({ A: [2.4, 1.89], h: [1.2, 2.1] });
    expect(factor).toBeCloseTo(5.4205, 3);
    expect(factor).toBeGreaterThan(2.4 * Math.sqrt(1.2) + 1.89 * Math.sqrt(2.1));
  });

  it('the flashover criteria take the lining area without openings, the opening factor takes the area with them', () => {
    const { room } = estimateRoom(SCENERY_DOCK, { workings: true });
    const input = (name: string, of: 'thomas') => room.flashover[of]?.inputs?.find((one) => one.name === name)?.value;
    expect(input('A_T', 'thomas')).toBeCloseTo(331.2, 9);
    expect(room.openingFactor?.inputs?.find((one) => one.name === 'A_t')?.value).toBe(336);
  });

  it('all three flashover criteria are shown, each with its range', () => {
    const { flashover } = estimateRoom(SCENERY_DOCK).room;
    expect([flashover.thomas, flashover.babrauskas, flashover.mqh].every((one) => (one?.range.length ?? 0) > 0)).toBe(
      true,
    );
  });

  it('an equation for two moles is divided by two once, not never and not twice', () => {
    const octane = atoms({ C: 8, H: 18 });
    const { net } = heatFromEquation.run({ ...octane, n: 2, dH: -10_148.8, water: 'vapour' });
    expect(net).toBeCloseTo(44.42, 1);
    expect(heatFromEquation.run({ ...octane, n: 1, dH: -10_148.8, water: 'vapour' }).net).toBeCloseTo(88.84, 1);
  });

  it('gross and net are 18 % apart for hydrogen, 11 % for methane', () => {
    const gap = (formula: ReturnType<typeof atoms>, dH_f: number) => {
      const { gross, net } = heatFromFormation.run({ ...formula, dH_f });
      return gross / net - 1;
    };
    expect(gap(atoms({ H: 2 }), 0)).toBeCloseTo(0.182, 2);
    expect(gap(atoms({ C: 1, H: 4 }), -74.6)).toBeCloseTo(0.11, 2);
  });

  it('from a table to a bomb: isooctane passes 47.81, 47.71 and 47.79 MJ/kg on the way to the printed value', () => {
    const { grossPerMole, gross } = heatFromFormation.run({ ...atoms({ C: 8, H: 18 }), dH_f: -259.2 });
    expect(gross).toBeCloseTo(47.809, 2);
    const inBomb = -constantVolume.run({ dH: -grossPerMole, dn: -4.5, T: 298.15 }) * (gross / grossPerMole);
    expect(inBomb).toBeCloseTo(47.712, 2);
    expect(airBuoyancy.run({ H_vac: inBomb, rho_s: 0.6878, rho_w: 8.4, rho_a: 0.0012 })).toBeCloseTo(47.788, 2);
  });

  it('kilocalories and British units of one table are 1.3 % apart and can fall into other classes', () => {
    const kcal = olderUnits.run({ value: 275_000, unit: 'kcal-thermochemical/m2' });
    expect(kcal / olderUnits.run({ value: 100_000, unit: 'Btu/ft2' })).toBeCloseTo(1.013, 3);
    expect(gradingClass.run({ q: kcal }).grade).toBe('moderate');
  });

  it('the ceiling jet counts the whole rate: the convective share alone would read 20 % low', () => {
    const rise = (Q: number) => ceilingJet.run({ Q, H: 4, r: 3, place: 'free' }).rise;
    expect(rise(1000)).toBeCloseTo(64.66, 1);
    expect(rise(700) / rise(1000)).toBeCloseTo(0.788, 2);
  });

  it('a response time index in feet is nearly half as large in metres', () => {
    expect(rtiFromFeet.run({ RTI_ft: 1 })).toBeCloseTo(0.552, 3);
  });

  it('the distance to a cylinder of flame counts from its axis', () => {
    const at = (L: number) => viewCylinder.run({ L, H: 9, D: 4 }).most;
    expect(at(6)).toBeCloseTo(0.18301, 4);
    expect(at(8)).toBeLessThan(at(6) * 0.8);
    expect(() => at(2)).toThrow(/axis/);
  });

  it('optical density to base ten and extinction are 2.303 apart', () => {
    const { extinction, density } = visibility.run({ m: 0.05, V: 150 });
    expect(extinction / density).toBeCloseTo(2.303, 3);
  });

  it('alcohols in the table of pools carry no kβ of 100, liquid hydrogen is 0.169', () => {
    const fuel = (key: string) => POOL_FUELS.find((one) => one.key === key);
    expect(fuel('methanol')?.kBeta).toBeNull();
    expect(fuel('ethanol')?.kBeta).toBeNull();
    expect(fuel('liquid-hydrogen')?.rate).toBe(0.169);
    expect(POOL_FUELS.every(({ kBeta }) => kBeta === null || kBeta < 10)).toBe(true);
  });

  it('both moisture coefficients of pallets are kept apart: 2 % at 6 %, 5 % at 12 %', () => {
    const ratio = (M: number) =>
      palletStack.run({ h_p: 2, M, A: 1, reading: '0.027' }).perArea /
      palletStack.run({ h_p: 2, M, A: 1, reading: '0.03' }).perArea;
    expect(ratio(6) - 1).toBeCloseTo(0.022, 3);
    expect(ratio(12) - 1).toBeCloseTo(0.056, 3);
  });

  it('the heat of a lithium battery knows no state of charge', () => {
    expect(Object.keys(lithiumBattery.inputs)).toEqual(['E']);
  });

  it('a relation outside its range still gives a plausible number, so its range is named', () => {
    const faults = rangeFaults(pointSource, { Q: 1000, chi_r: 0.35, R: 0.5, ratio: 0.5 });
    expect(faults.map(({ input }) => input)).toEqual(['ratio']);
  });
});
