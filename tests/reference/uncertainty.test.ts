import { describe, expect, it } from 'vitest';
import { fractile, loadOf, momentsOfSamples, sampled } from '../shared/uncertainty/load-models.ts';
import { checkRow, expectOutput, rowTitle } from './check-row.ts';
import { MONTE_CARLO_ROWS } from './rows/monte-carlo-rows.ts';
import { UNCERTAINTY_ROWS } from './rows/uncertainty-rows.ts';

const SAMPLES = 200_000;

describe('uncertainty against the outside world', () => {
  it.each(UNCERTAINTY_ROWS.map((row) => [rowTitle(row), row] as const))('%s', (_title, row) => checkRow(row));

  it.each(MONTE_CARLO_ROWS)('$id: $method ($origin: $source)', ({ items, expected, tolerance }) => {
    const { total } = sampled(loadOf(items), SAMPLES);
    const found = momentsOfSamples(total);
    if (expected.mean !== undefined) expectOutput(found.mean, expected.mean, tolerance, 'mean');
    if (expected.deviation !== undefined) expectOutput(found.deviation, expected.deviation, tolerance, 'deviation');
    for (const [p, value] of expected.fractiles ?? []) expectOutput(fractile(total, p), value, tolerance, `at ${p}`);
    expect(total).toHaveLength(SAMPLES);
  });
});
