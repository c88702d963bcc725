import { abs, evaluate, intersect, multiply, polynomialRoot, solveODE, transpose, type Unit } from 'mathjs';
import { MF } from 'mf-parser';
import { describe, expect, it } from 'vitest';
import { parseFormula } from '@embertally/shared/chemistry/parse-formula';
import { insetRing } from '@embertally/shared/geometry/inset-ring';
import { substanceMass } from '@embertally/shared/methods/chemistry/substance-mass';
import { constantPressure } from '@embertally/shared/methods/calorimetry/constant-pressure';
import { designFire, designFireCurve } from '@embertally/shared/methods/growth/design-fire';
import { detectorResponse } from '@embertally/shared/methods/plume/detector-response';
import { openingRadiation } from '@embertally/shared/methods/radiation/opening-radiation';
import { carbonMonoxide } from '@embertally/shared/methods/smoke/carbon-monoxide';
import { closedRoom } from '@embertally/shared/methods/temperature/closed-room';
import { fireLoadUncertainty } from '@embertally/shared/methods/uncertainty/fire-load-uncertainty';
import { squareFire } from './square-fire.ts';

interface Solution {
  readonly t: number[];
  readonly y: number[];
}

/** y over a span, from `start`, by the adaptive Runge-Kutta solver of mathjs. */
function solved(slope: (t: number, y: number) => number, span: readonly [number, number], start = 0): Solution {
  const { t, y } = solveODE((time: number, [value]: number[]) => [slope(time, value!)], [...span], [start], {
    method: 'RK45',
    tol: 1e-7,
    maxIter: 1e5,
  });
  return { t, y: y.map(([value]) => value!) };
}

/** Value of a constant of mathjs in SI units. */
const constant = (name: string, unit: string): number => (evaluate(name) as Unit).toNumber(unit);

describe('differential equations and sums that mathjs solves', () => {
  it.each([
    [0.0117222, 4, 3, 100, 68],
    [0.0468889, 6, 3, 50, 68],
    [0.0444444, 8, 5, 120, 74],
    [0.1777778, 3.5, 0.4, 35, 57],
  ])('a device under a fire of %d t² responds when its own equation says so (H %d, r %d, RTI %d)', (...given) => {
    const [alpha, H, r, RTI, T_act] = given;
    const near = r / H <= 0.18;
    const gas = (Q: number) => (near ? 16.9 * Q ** (2 / 3) * H ** (-5 / 3) : (5.38 * (Q / r) ** (2 / 3)) / H);
    const speed = (Q: number) =>
      r / H <= 0.15 ? 0.96 * (Q / H) ** (1 / 3) : (0.195 * Q ** (1 / 3) * Math.sqrt(H)) / r ** (5 / 6);
    const { t, y } = solved(
      (time, rise) => (Math.sqrt(speed(alpha * time * time)) / RTI) * (gas(alpha * time * time) - rise),
      [1e-6, 900],
    );
    const after = y.findIndex((rise) => rise >= T_act - 20);
    const share = (T_act - 20 - y[after - 1]!) / (y[after]! - y[after - 1]!);
    const expected = t[after - 1]! + share * (t[after]! - t[after - 1]!);
    const { time } = detectorResponse.run({ ...squareFire(alpha, 900), H, r, place: 'free', RTI, T_a: 20, T_act });
    expect(Math.abs((time ?? Infinity) - expected)).toBeLessThan(0.5);
  });

  it('the closed room follows m c_p dΔT/dt = Q − 0.4 √(k ρ c/t) A_T ΔT', () => {
    const room = { Q: 100, k: 1.6, rho: 2400, c: 750, A_T: 97.548, m: 76.456, c_p: 1 };
    const inertia = (0.4 * Math.sqrt(room.k * room.rho * room.c)) / 1000;
    // In s = √t, because the coefficient is infinite at t = 0.
    const { y } = solved(
      (s, rise) => (2 * s * room.Q) / (room.m * room.c_p) - ((2 * inertia * room.A_T) / (room.m * room.c_p)) * rise,
      [0, Math.sqrt(300)],
    );
    expect(closedRoom.run({ ...room, t: 300 }).rise).toBeCloseTo(y.at(-1)!, 3);
  });

  it.each([
    [18_396, 9000, 0.0111111],
    [9000, 100_000, 0.0444444],
    [23_700, 4115.143, 0.0111111],
  ])('the design fire of %d MJ under %d kW releases that heat', (E, Q_max, alpha) => {
    const points = designFireCurve(designFire.run({ E, Q_max, alpha }));
    const rate = (t: number): number => {
      const i = Math.max(
        1,
        points.findIndex(([time]) => time >= t),
      );
      const [[t0, q0], [t1, q1]] = [points[i - 1]!, points[i]!];
      return q0 + ((q1 - q0) * (t - t0)) / (t1 - t0);
    };
    let heat = 0;
    for (let i = 1; i < points.length; i += 1)
      heat += solved((t) => rate(t), [points[i - 1]![0], points[i]![0]]).y.at(-1)!;
    expect(Math.abs(heat / 1000 / E - 1)).toBeLessThan(1e-3);
  });

  it('a fire that never reaches its plateau grows to the root of α t³/3 = 0.7 E', () => {
    const [E, alpha] = [9000, 0.0444444];
    const roots = polynomialRoot(-0.7 * E * 1000, 0, 0, alpha / 3) as unknown as (
      number | { re: number; im: number }
    )[];
    const real = roots.map((root) => (typeof root === 'number' ? root : Math.abs(root.im) < 1e-6 ? root.re : NaN));
    expect(designFire.run({ E, Q_max: 1e5, alpha }).growthEnd).toBeCloseTo(Math.max(...real.filter((x) => x > 0)), 6);
  });

  it('the uncertainty of a load is J Σ Jᵀ with the covariances of shared heats', () => {
    const [M, H, u_M, u_H] = [
      [100, 80, 50],
      [17.5, 17.5, 42],
      [10, 8, 5],
      [1, 1, 2],
    ];
    // Order of the inputs: three masses, then three heats; the first two heats are one value.
    const J = [[...H, ...M]];
    const covariance = Array.from({ length: 6 }, (_, i) =>
      Array.from({ length: 6 }, (_unused, j) => {
        if (i < 3 || j < 3) return i === j ? u_M[i]! ** 2 : 0;
        const shared = i === j || (i < 5 && j < 5);
        return shared ? u_H[i - 3]! * u_H[j - 3]! : 0;
      }),
    );
    const [[variance]] = multiply(multiply(J, covariance), transpose(J)) as unknown as [[number]];
    const ours = fireLoadUncertainty.run({
      M: M,
      H: H,
      u_M: u_M,
      u_H: u_H,
      entry: [0, 1, 2],
      material: [0, 0, 1],
      u_psi: [],
    });
    expect(ours).toBeCloseTo(Math.sqrt(variance), 9);
  });
});

describe('constants of nature as mathjs has them', () => {
  it('Stefan and Boltzmann', () => {
    const sigma = constant('stefanBoltzmann', 'W/(m^2 K^4)');
    expect(openingRadiation.run({ F: 0.4, epsilon: 0.9, T: 1100 })).toBeCloseTo((0.36 * sigma * 1100 ** 4) / 1000, 6);
  });

  it('the gas constant, in a bomb and in the smoke', () => {
    const R = constant('gasConstant', 'J/(mol K)');
    const dH = constantPressure.run({ dU: -3225.62, dn: -0.5, T: 298.15 });
    expect(dH).toBeCloseTo(-3225.62 - (0.5 * R * 298.15) / 1000, 6);
    const moles = (0.024 * 2000) / new MF('CO').getInfo().mass;
    const air = (101_325 * 150) / (R * 298.15);
    expect(carbonMonoxide.run({ y: 0.024, m: 2, V: 150, T: 25 }) / ((1e6 * moles) / air)).toBeCloseTo(1, 3);
  });
});

describe('formulas as mf-parser reads them', () => {
  it.each([
    'CH4',
    'C8H18',
    'C2H5OH',
    'CH3(CH2)6CH3',
    'C6H5COOH',
    'C12H22O11',
    'C3H6N6',
    'CH3NO2',
    'C2H3Cl',
    'C2F4',
    'CH3Br',
    '(CH3)2SO',
    'C(CH2OH)4',
    'C16H14O3',
  ])('%s has the same molar mass', (formula) => {
    const parsed = parseFormula(formula);
    if (!parsed.ok) throw new Error(parsed.message);
    expect(substanceMass.run({ ...parsed.atoms }) / new MF(formula).getInfo().mass).toBeCloseTo(1, 3);
  });
});

describe('geometry by mathjs', () => {
  it('the clear ring of a room has its corners where its shifted walls meet', () => {
    const ring = [
      [0, 0],
      [7, 1],
      [6, 5],
      [1, 4],
    ] as const;
    const shift = 0.15;
    const line = (a: readonly [number, number], b: readonly [number, number]) => {
      const length = Math.hypot(b[0] - a[0], b[1] - a[1]);
      const [nx, ny] = [(-(b[1] - a[1]) / length) * shift, ((b[0] - a[0]) / length) * shift];
      return [
        [a[0] + nx, a[1] + ny],
        [b[0] + nx, b[1] + ny],
      ] as const;
    };
    const lines = ring.map((point, i) => line(point, ring[(i + 1) % ring.length]!));
    const expected = lines.map((one, i) => {
      const before = lines.at(i - 1)!;
      return intersect([...before[0]], [...before[1]], [...one[0]], [...one[1]]) as unknown as [number, number];
    });
    const inset = insetRing(
      ring.map(([x_m, y_m]) => ({ x_m, y_m })),
      shift,
    )!;
    for (const [x, y] of expected)
      expect(inset.some((point) => abs(point.x_m - x) < 1e-9 && abs(point.y_m - y) < 1e-9)).toBe(true);
    expect(inset).toHaveLength(expected.length);
  });
});
