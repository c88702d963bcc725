/** Coefficients of AS 241, highest power first: the centre, the tail, the far tail. */
const A = [
  2509.0809287301226727, 33430.575583588128105, 67265.770927008700853, 45921.953931549871457, 13731.693765509461125,
  1971.5909503065514427, 133.14166789178437745, 3.387132872796366608,
] as const;
const B = [
  5226.495278852854561, 28729.085735721942674, 39307.89580009271061, 21213.794301586595867, 5394.1960214247511077,
  687.1870074920579083, 42.313330701600911252, 1,
] as const;
const C = [
  7.7454501427834140764e-4, 0.0227238449892691845833, 0.24178072517745061177, 1.27045825245236838258,
  3.64784832476320460504, 5.7694972214606914055, 4.6303378461565452959, 1.42343711074968357734,
] as const;
const D = [
  1.05075007164441684324e-9, 5.475938084995344946e-4, 0.0151986665636164571966, 0.14810397642748007459,
  0.68976733498510000455, 1.6763848301838038494, 2.05319162663775882187, 1,
] as const;
const E = [
  2.01033439929228813265e-7, 2.71155556874348757815e-5, 0.0012426609473880784386, 0.026532189526576123093,
  0.29656057182850489123, 1.7848265399172913358, 5.4637849111641143699, 6.6579046435011037772,
] as const;
const F = [
  2.04426310338993978564e-15, 1.4215117583164458887e-7, 1.8463183175100546818e-5, 7.868691311456132591e-4,
  0.0148753612908506148525, 0.13692988092273580531, 0.59983220655588793769, 1,
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
  const r = Math.sqrt(-Math.log(tail));
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
