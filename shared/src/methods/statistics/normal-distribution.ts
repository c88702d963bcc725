import { portableLog } from './portable-functions.ts';

/** Coefficients of AS 241, highest power first: the centre, the tail, the far tail. */
const A = [
  2509.0809287301227, 33430.57558358813, 67265.7709270087, 45921.95393154987, 13731.69376550946, 1971.5909503065513,
  133.14166789178438, 3.3871328727963665,
] as const;
const B = [
  5226.495278852854, 28729.085735721943, 39307.89580009271, 21213.794301586597, 5394.196021424751, 687.1870074920579,
  42.31333070160091, 1,
] as const;
const C = [
  0.0007745450142783414, 0.022723844989269184, 0.2417807251774506, 1.2704582524523684, 3.6478483247632045,
  5.769497221460691, 4.630337846156546, 1.4234371107496835,
] as const;
const D = [
  1.0507500716444169e-9, 0.0005475938084995345, 0.015198666563616457, 0.14810397642748008, 0.6897673349851,
  1.6763848301838038, 2.053191626637759, 1,
] as const;
const E = [
  2.0103343992922881e-7, 2.7115555687434876e-5, 0.0012426609473880784, 0.026532189526576124, 0.29656057182850487,
  1.7848265399172913, 5.463784911164114, 6.657904643501103,
] as const;
const F = [
  2.0442631033899397e-15, 1.421511758316446e-7, 1.8463183175100548e-5, 0.0007868691311456133, 0.014875361290850615,
  0.1369298809227358, 0.599832206555888, 1,
] as const;
type Coefficients = readonly [number, number, number, number, number, number, number, number];

/** Horner's scheme, written out: millions of samples pass through here. */
function polynomial(c: Coefficients, x: number): number {
  return ((((((c[0] * x + c[1]) * x + c[2]) * x + c[3]) * x + c[4]) * x + c[5]) * x + c[6]) * x + c[7];
}

/**
 * Standard normal quantile for 0 < p < 1, right to about 1e-15: M. J. Wichura, Algorithm AS 241 (PPND16), Applied
 * Statistics 37 (1988) 477. Uses no function but square root and logarithm. At 0 and 1 it is infinite.
 */
export function normalQuantile(p: number): number {
  const q = p - 0.5;
  if (Math.abs(q) <= 0.425) {
    const r = 0.180625 - q * q;
    return (q * polynomial(A, r)) / polynomial(B, r);
  }
  const tail = q < 0 ? p : 1 - p;
  if (tail <= 0) return q < 0 ? -Infinity : Infinity;
  const r = Math.sqrt(-portableLog(tail));
  const z = r <= 5 ? polynomial(C, r - 1.6) / polynomial(D, r - 1.6) : polynomial(E, r - 5) / polynomial(F, r - 5);
  return q < 0 ? -z : z;
}

/** Standard normal distribution function, right to 1e-12: series near the middle, continued fraction in the tails. */
export function normalCdf(z: number): number {
  const size = Math.abs(z);
  const density = Math.exp(-(size * size) / 2) / Math.sqrt(2 * Math.PI);
  const tail = size < 3 ? 0.5 - density * oddSeries(size) : density * millsFraction(size);
  return z < 0 ? tail : 1 - tail;
}

/** x + x³/3 + x⁵/(3·5) + … */
function oddSeries(x: number): number {
  let term = x;
  let sum = x;
  for (let n = 3; term > 1e-17 * sum; n += 2) {
    term *= (x * x) / n;
    sum += term;
  }
  return sum;
}

/** 1/(x + 1/(x + 2/(x + 3/(x + …)))) */
function millsFraction(x: number): number {
  let below = x;
  for (let n = 60; n >= 1; n -= 1) below = x + n / below;
  return 1 / below;
}
