import { describe, expect, it } from 'vitest';
import { heatFromFormation } from '@embertally/shared/methods/chemistry/heat-from-formation';
import { atoms } from './atoms.ts';

/** Seven-term NASA polynomials of GRI-Mech 3.0, 200 to 1000 K: h/RT = a1 + a2 T/2 + a3 T²/3 + a4 T³/4 + a5 T⁴/5 + a6/T. */
const GRI30 = {
  CH4: [5.14987613, -0.0136709788, 4.91800599e-5, -4.84743026e-8, 1.66693956e-11, -10246.6476],
  C3H8: [0.93355381, 0.026424579, 6.1059727e-6, -2.1977499e-8, 9.5149253e-12, -13958.52],
  H2: [2.34433112, 0.00798052075, -1.9478151e-5, 2.01572094e-8, -7.37611761e-12, -917.935173],
  CO: [3.57953347, -0.00061035368, 1.01681433e-6, 9.07005884e-10, -9.04424499e-13, -14344.086],
  O2: [3.78245636, -0.00299673416, 9.84730201e-6, -9.68129509e-9, 3.24372837e-12, -1063.94356],
  CO2: [2.35677352, 0.00898459677, -7.12356269e-6, 2.45919022e-9, -1.43699548e-13, -48371.9697],
  H2O: [4.19864056, -0.0020364341, 6.52040211e-6, -5.48797062e-9, 1.77197817e-12, -30293.7267],
} as const;

function enthalpy(species: keyof typeof GRI30): number {
  const T = 298.15;
  const [a1, a2, a3, a4, a5, a6] = GRI30[species];
  const overRT = a1 + (a2 * T) / 2 + (a3 * T ** 2) / 3 + (a4 * T ** 3) / 4 + (a5 * T ** 4) / 5 + a6 / T;
  return (overRT * 8.314462618 * T) / 1000;
}

describe('net heats against NASA polynomials', () => {
  it.each([
    ['CH4', atoms({ C: 1, H: 4 }), -74.6, 2],
    ['C3H8', atoms({ C: 3, H: 8 }), -103.8, 5],
    ['H2', atoms({ H: 2 }), 0, 0.5],
    ['CO', atoms({ C: 1, O: 1 }), -110.5, 0.5],
  ] as const)('%s', (species, formula, dH_f, oxygen) => {
    const water = formula.H / 2;
    const expected =
      enthalpy(species) + oxygen * enthalpy('O2') - formula.C * enthalpy('CO2') - water * enthalpy('H2O');
    const { netPerMole } = heatFromFormation.run({ ...formula, dH_f });
    expect(netPerMole / expected).toBeCloseTo(1, 3);
  });
});
