import { defineMethod } from '../define-method.ts';
import { OutOfRangeError } from '../estimate.ts';
import { figure } from '../figure.ts';
import { en1991 } from '../sources.ts';

export interface ParametricCurve {
  /** °C */
  readonly peak: number;
  /** min */
  readonly timeOfPeak: number;
  /** Back at 20 °C, min. */
  readonly end: number;
  readonly fuelControlled: boolean;
  readonly gamma: number;
  /** Γ_lim, k included, for a fuel controlled fire; else null. */
  readonly gammaLimit: number | null;
  readonly k: number;
  /** t*_max of the cooling phase, h: always from Γ and 0.2e-3 q/O. */
  readonly coolingTime: number;
  readonly x: number;
  /** K/min */
  readonly coolingRate: number;
}

const AMBIENT_C = 20;
const HEATING_POINTS = 30;

/** Gas temperature of a fully developed fire by the parametric curve; hours inside, minutes outside. */
export const parametricCurve = defineMethod({
  id: 'burnout.parametric-2002',
  version: 2,
  title: 'Parametric temperature-time curve',
  symbol: 'Θ_g',
  unit: '°C',
  inputs: {
    O: { symbol: 'O', unit: 'm1/2', quantity: 'Opening factor', valid: [0.02, 0.2] },
    b: { symbol: 'b', unit: 'J/m2s1/2K', quantity: 'Thermal inertia', valid: [100, 2200] },
    q_td: { symbol: 'q_t,d', unit: 'MJ/m2', quantity: 'Load per enclosing area', valid: [50, 1000] },
    t_lim: { symbol: 't_lim', unit: 'h', quantity: 'Least time of the heating phase', valid: [0.05, 8] },
  },
  equation:
    'Γ = (O/b)²/(0.04/1160)²; t_max = max(0.2e-3 q_t,d/O; t_lim); Θ_g = 20 + 1325 (1 − 0.324 e^(−0.2 t*) − 0.204 e^(−1.7 t*) − 0.472 e^(−19 t*))',
  sources: [en1991('Annex A(1)-(11), equations (A.1) to (A.12)')],
  assumptions: [
    'Cellulosic load that burns completely; floor up to 500 m2, height up to 4 m, no roof opening.',
    'Cooling uses t*_max of the ventilation controlled fire, also when the fuel controls.',
    'Large openings, light linings and a small load together take the printed k of a fuel controlled fire below 0; then there is no curve.',
  ],
  why: 'It knows the load, the openings and the walls; the standard curve knows none of them.',
  outOfRange: 'refuse',
  outputs: {
    peak: { symbol: 'Θ_max', unit: '°C', quantity: 'Highest gas temperature' },
    timeOfPeak: { symbol: 't_max', unit: 'min', quantity: 'Time of the highest temperature' },
    end: { symbol: 't_end', unit: 'min', quantity: 'Back at 20 °C' },
  },
  run({ O, b, q_td, t_lim }) {
    const fuelControlled = (0.2e-3 * q_td) / O <= t_lim;
    if (fuelControlled && !(fuelCorrection(O, b, q_td) > 0)) throw new OutOfRangeError(NO_CORRECTION);
    return parametricFire(O, b, q_td, t_lim, fuelControlled);
  },
  explain: (_inputs, fire) => [
    { text: 'Γ', value: fire.gamma, unit: '' },
    {
      text: fire.fuelControlled
        ? `0.2e-3 q_t,d/O is below t_lim: the fuel controls, Γ_lim = ${figure(fire.gammaLimit ?? 0)}, k = ${figure(fire.k)}`
        : '0.2e-3 q_t,d/O is above t_lim: the openings control',
    },
    { text: 'Cooling: t*_max', value: fire.coolingTime, unit: 'h' },
    { text: 'Cooling: x', value: fire.x, unit: '' },
    { text: 'Cooling rate', value: fire.coolingRate, unit: 'K/min' },
  ],
});

/** Why there is no curve where {@link fuelCorrection} is not above 0. */
export const NO_CORRECTION =
  'The factor k of a fuel controlled fire is not above 0 for openings this large, linings this light and a load this small: check them; the printed curve has no answer here.';

/**
 * Factor k on Γ_lim, equation (A.10): 1 unless O > 0.04, q_t,d < 75 and b < 1160. It falls below 0 inside the printed
 * ranges (O = 0.2, b = 100, q_t,d = 50 gives −0.2), where the curve would go below absolute zero.
 */
export function fuelCorrection(O: number, b: number, q: number): number {
  return O > 0.04 && q < 75 && b < 1160 ? 1 + ((O - 0.04) / 0.04) * ((q - 75) / 75) * ((1160 - b) / 1160) : 1;
}

/**
 * The curve with the branch given from outside, so that both sides of the jump at t_max = t_lim can be shown. The branch
 * is a flag: comparing two floating-point times later on would be a coin toss at the jump.
 */
export function parametricFire(
  O: number,
  b: number,
  q: number,
  tLimit: number,
  fuelControlled: boolean,
): ParametricCurve {
  const gamma = gammaOf(O, b);
  const ventilationTime = (0.2e-3 * q) / O;
  const tMax = fuelControlled ? tLimit : ventilationTime;
  const k = fuelControlled ? fuelCorrection(O, b, q) : 1;
  const gammaLimit = fuelControlled ? gammaOf((0.1e-3 * q) / tLimit, b) * k : null;
  const peak = heating(tMax * (gammaLimit ?? gamma));
  const coolingTime = ventilationTime * gamma;
  const x = fuelControlled ? (tLimit * gamma) / coolingTime : 1;
  const perHour = coolingTime <= 0.5 ? 625 : coolingTime < 2 ? 250 * (3 - coolingTime) : 250;
  const coolingRate = (perHour * gamma) / 60;
  return {
    peak,
    timeOfPeak: tMax * 60,
    end: tMax * 60 + (peak - AMBIENT_C) / coolingRate,
    fuelControlled,
    gamma,
    gammaLimit,
    k,
    coolingTime,
    x,
    coolingRate,
  };
}

/** Gas temperature at a time in minutes, °C; 20 °C after the end. */
export function parametricTemperature(fire: ParametricCurve, minutes: number): number {
  if (minutes <= fire.timeOfPeak) {
    return heating((minutes / 60) * (fire.gammaLimit ?? fire.gamma));
  }
  return Math.max(AMBIENT_C, fire.peak - fire.coolingRate * (minutes - fire.timeOfPeak));
}

/** `[[min, °C], …]`, denser at the start where the gas heats fast; joined by straight lines. */
export function parametricPoints(fire: ParametricCurve): (readonly [number, number])[] {
  const heatingPoints = Array.from({ length: HEATING_POINTS + 1 }, (_, i) => {
    const minutes = fire.timeOfPeak * (i / HEATING_POINTS) ** 2;
    return [minutes, parametricTemperature(fire, minutes)] as const;
  });
  return [...heatingPoints, [fire.end, AMBIENT_C] as const];
}

function gammaOf(O: number, b: number): number {
  return (O / b / (0.04 / 1160)) ** 2;
}

function heating(t: number): number {
  return AMBIENT_C + 1325 * (1 - 0.324 * Math.exp(-0.2 * t) - 0.204 * Math.exp(-1.7 * t) - 0.472 * Math.exp(-19 * t));
}
