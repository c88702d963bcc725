const SQRT6_OVER_PI = Math.sqrt(6) / Math.PI;
const EULER_GAMMA = 0.577_215_664_901_532_9;

/** Location and scale of a Gumbel distribution (largest values) from its mean and coefficient of variation. */
export function gumbelParameters(mean: number, V: number): { u: number; beta: number } {
  const beta = SQRT6_OVER_PI * V * mean;
  return { u: mean - EULER_GAMMA * beta, beta };
}
