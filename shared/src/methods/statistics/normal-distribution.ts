/**
 * Standard normal quantile for 0 < p < 1: bisection on {@link normalCdf}, right to 1e-9. Called a handful of times per
 * tally, so plain and certain is better than fast.
 */
export function normalQuantile(p: number): number {
  let low = -9;
  let high = 9;
  while (high - low > 1e-10) {
    const middle = (low + high) / 2;
    if (normalCdf(middle) < p) low = middle;
    else high = middle;
  }
  return (low + high) / 2;
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
