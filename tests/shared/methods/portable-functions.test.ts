import { describe, expect, it } from 'vitest';
import { portableExp, portableLog, portableLog1p } from '@embertally/shared/methods/statistics/portable-functions';

describe('exponential and logarithm from the four operations', () => {
  it('are those of the platform to the fifteenth digit', () => {
    for (let x = -700; x <= 700; x += 0.37) expect(Math.abs(portableExp(x) / Math.exp(x) - 1)).toBeLessThan(1e-15);
    for (let x = 1e-300; x < 1e300; x *= 1.7) {
      expect(Math.abs(portableLog(x) - Math.log(x))).toBeLessThanOrEqual(4e-16 * Math.max(1, Math.abs(Math.log(x))));
    }
    for (let x = 0.5; x < 2; x += 0.001) expect(Math.abs(portableLog(x) - Math.log(x))).toBeLessThan(2e-16);
  });
  it('keep a small number beside one', () => {
    for (let x = 1e-300; x < 1e10; x *= 1.9) expect(Math.abs(portableLog1p(x) / Math.log1p(x) - 1)).toBeLessThan(1e-15);
    expect(portableLog1p(0)).toBe(0);
  });
  it('undo each other', () => {
    for (let x = -20; x <= 20; x += 0.11) expect(portableLog(portableExp(x))).toBeCloseTo(x, 13);
  });
  it('know their ends', () => {
    expect(portableExp(0)).toBe(1);
    expect(portableLog(1)).toBe(0);
    expect(portableLog(0)).toBe(-Infinity);
    expect(portableLog(-1)).toBeNaN();
    expect(portableLog(5e-324)).toBeCloseTo(Math.log(5e-324), 9);
    expect(portableExp(710)).toBe(Infinity);
    expect(portableExp(-710)).toBe(0);
  });
});
