/**
 * Exponential and logarithm from the four operations alone. Those of `Math` may differ in their last digit from engine to
 * engine, and then so would samples drawn with the same seed. Both are right to a few units in the sixteenth digit.
 */
const LN2_HIGH = 0.6931471803691238;
const LN2_LOW = 1.9082149292705877e-10;
const LOG2_E = 1.4426950408889634;
const SQRT_2 = 1.4142135623730951;
/** Beyond this e^x is no number any more. */
const MOST = 709;

const LEAST_POWER = -1074;
const POWERS_OF_TWO = powersOfTwo();

function powersOfTwo(): Float64Array {
  const powers = new Float64Array(1023 - LEAST_POWER + 1);
  let value = 1;
  for (let k = 0; k <= 1023; k += 1, value *= 2) powers[k - LEAST_POWER] = value;
  value = 1;
  for (let k = 0; k >= LEAST_POWER; k -= 1, value /= 2) powers[k - LEAST_POWER] = value;
  return powers;
}

const number = new Float64Array(1);
const halves = new Uint32Array(number.buffer);
/** Which half of a number holds its exponent. */
const HIGH = new Uint8Array(Uint32Array.of(1).buffer)[0] === 1 ? 1 : 0;

/** e^x: x = k ln 2 + r, then the series of e^r. 0 below −709, infinite above 709. */
export function portableExp(x: number): number {
  if (x > MOST) return Infinity;
  if (x < -MOST) return 0;
  const k = Math.floor(x * LOG2_E + 0.5);
  const r = x - k * LN2_HIGH - k * LN2_LOW;
  // Written out: millions of samples pass through here.
  let sum = 1.6059043836821613e-10 * r + 2.08767569878681e-9;
  sum = sum * r + 2.505210838544172e-8;
  sum = sum * r + 2.755731922398589e-7;
  sum = sum * r + 2.7557319223985893e-6;
  sum = sum * r + 2.48015873015873e-5;
  sum = sum * r + 0.0001984126984126984;
  sum = sum * r + 0.001388888888888889;
  sum = sum * r + 0.008333333333333333;
  sum = sum * r + 0.041666666666666664;
  sum = sum * r + 0.16666666666666666;
  sum = sum * r + 0.5;
  sum = sum * r + 1;
  sum = sum * r + 1;
  return sum * POWERS_OF_TWO[k - LEAST_POWER]!;
}

/** ln x for x > 0: x = 2^e m, then the series of the inverse hyperbolic tangent. −∞ at 0. */
export function portableLog(x: number): number {
  if (!(x > 0)) return x === 0 ? -Infinity : Number.NaN;
  number[0] = x;
  let e = 0;
  if (x < 2.3e-308) {
    number[0] = x * 18014398509481984;
    e = -54;
  }
  const high = halves[HIGH]!;
  e += ((high >>> 20) & 0x7ff) - 1023;
  halves[HIGH] = (high & 0x000fffff) | 0x3ff00000;
  let m = number[0];
  if (m > SQRT_2) {
    m /= 2;
    e += 1;
  }
  return e * LN2_HIGH + (logOfRatio((m - 1) / (m + 1)) + e * LN2_LOW);
}

/** ln(1 + x) for x of 0 and more, without losing a small x beside 1. */
export function portableLog1p(x: number): number {
  return x < 0.4 ? logOfRatio(x / (2 + x)) : portableLog(1 + x);
}

/** ln((1 + s)/(1 − s)) for |s| up to 0.18. */
function logOfRatio(s: number): number {
  const square = s * s;
  let sum = 0;
  for (let n = 23; n >= 3; n -= 2) sum = (sum + 1 / n) * square;
  return 2 * (s + s * sum);
}
