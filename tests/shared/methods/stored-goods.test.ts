import { describe, expect, it } from 'vitest';
import { poolFire } from '@embertally/shared/methods/pool/pool-fire';
import { POOL_FUELS } from '@embertally/shared/methods/pool/pool-fuels';
import { rangeFaults } from '@embertally/shared/methods/range-faults';
import { STORED_GOODS } from '@embertally/shared/methods/storage/stored-goods';
import { storageHeight } from '@embertally/shared/methods/storage/storage-height';

describe('tables that methods are fed from', () => {
  it('name each row once', () => {
    for (const table of [STORED_GOODS, POOL_FUELS])
      expect(new Set(table.map(({ key }) => key)).size).toBe(table.length);
  });

  it('keep every stored good inside the range of its relation at the height of its test', () => {
    for (const { height, peak } of STORED_GOODS) {
      if (height === null) continue;
      const inputs = { Q_ref: peak, h: height, h_ref: height, ratio: 1 };
      expect(rangeFaults(storageHeight, inputs)).toEqual([]);
      expect(storageHeight.run(inputs)).toBeCloseTo(peak, 12);
    }
  });

  it('keep every pool fuel inside the range of its relation; a wider pool never burns slower per area', () => {
    for (const { rate, kBeta, density, heat } of POOL_FUELS) {
      const by = kBeta === null ? 'is-constant' : 'depends-on-diameter';
      const at = (D: number) => ({ rate, by, kBeta: kBeta ?? 1, D, H: heat, rho: density, V: 10 }) as const;
      expect(rangeFaults(poolFire, at(1))).toEqual([]);
      expect(poolFire.run(at(2)).burning).toBeGreaterThanOrEqual(poolFire.run(at(1)).burning);
      expect(poolFire.run(at(50)).burning).toBeCloseTo(rate, 6);
    }
  });
});
