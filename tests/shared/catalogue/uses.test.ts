import { useByKey, USES } from '@embertally/shared/catalogue/uses';
import { describe, expect, it } from 'vitest';

/** EN 1991-1-2:2002 Tables E.4 and E.5 (from memory): mean, 80 % fractile MJ/m², growth, RHR_f kW/m². */
const TABLE: readonly (readonly [key: string, mean: number, p80: number, growth: string, rhr: number])[] = [
  ['dwelling', 780, 948, 'medium', 250],
  ['hospital', 230, 280, 'medium', 250],
  ['hotel', 310, 377, 'medium', 250],
  ['library', 1500, 1824, 'fast', 500],
  ['office', 420, 511, 'medium', 250],
  ['school', 285, 347, 'medium', 250],
  ['shopping-centre', 600, 730, 'fast', 250],
  ['theatre', 300, 365, 'fast', 500],
  ['transport', 100, 122, 'slow', 250],
];

describe('uses', () => {
  it('are at least fourteen, each with its own key', () => {
    expect(USES.length).toBeGreaterThanOrEqual(14);
    expect(new Set(USES.map((row) => row.key)).size).toBe(USES.length);
  });

  it.each(TABLE)(
    '%s reproduces its row of the tables, the 80 %% fractile within 1 MJ/m²',
    (key, mean, p80, growth, rhr) => {
      const row = useByKey(key);
      expect(row).toMatchObject({ growth, rhr_kW_m2: rhr, danger_of_activation: 1 });
      if (row?.distribution?.kind !== 'gumbel') throw new Error(`${key} has no Gumbel distribution`);
      expect(row.distribution.mean_MJ_m2).toBe(mean);
      const scale = (Math.sqrt(6) / Math.PI) * row.distribution.cov * mean;
      const mode = mean - 0.5772156649 * scale;
      expect(Math.abs(mode - scale * Math.log(-Math.log(0.8)) - p80)).toBeLessThan(1);
    },
  );

  it('gives shops the lognormal distribution of the survey: median 499, 80 % 1063 MJ/m²', () => {
    const distribution = useByKey('shop')?.distribution;
    if (distribution?.kind !== 'lognormal') throw new Error('shop has no lognormal distribution');
    const variance = Math.log(1 + distribution.cov ** 2);
    const median = distribution.mean_MJ_m2 / Math.exp(variance / 2);
    expect(median).toBeCloseTo(498.7, 0);
    expect(median * Math.exp(0.8416212 * Math.sqrt(variance))).toBeCloseTo(1062.7, 0);
  });

  it('offers no heat release and no distribution where no table has one', () => {
    for (const key of ['storage', 'workshop', 'plant', 'corridor', 'archive', 'loading-bay']) {
      expect(useByKey(key), key).toMatchObject({ rhr_kW_m2: null, distribution: null });
    }
  });

  it.each([
    ['gallery', 0.78],
    ['office', 1],
    ['machine-works', 1.22],
    ['paint-shop', 1.44],
    ['laboratory', 1.44],
    ['paint-works', 1.66],
  ])('%s has the danger of activation of Table E.1', (key, danger) => {
    expect(useByKey(key)?.danger_of_activation).toBe(danger);
  });

  it('has no row for a person’s own word', () => {
    expect(useByKey('observatory')).toBeUndefined();
  });
});
