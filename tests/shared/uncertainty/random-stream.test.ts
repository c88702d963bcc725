import { describe, expect, it } from 'vitest';
import { fillUniform, randomStream } from '@embertally/shared/uncertainty/random-stream';

const TWO_TO_32 = 2 ** 32;

describe('a random stream', () => {
  it('gives the numbers of the reference implementation from the state 1, 2, 3, 4', () => {
    // Output of xoshiro128starstar.c, version 1.1, by its authors.
    const expected = [
      11520, 0, 5927040, 70819200, 2031721883, 1637235492, 1287239034, 3734860849, 3729100597, 4258142804,
    ];
    const out = new Float64Array(expected.length);
    fillUniform(Uint32Array.of(1, 2, 3, 4), out, expected.length);
    expect([...out].map((u) => u * TWO_TO_32 - 0.5)).toEqual(expected);
  });

  it('is the same however many are taken at once', () => {
    const whole = new Float64Array(1000);
    fillUniform(randomStream(7, 'mass:a'), whole, 1000);
    const state = randomStream(7, 'mass:a');
    const part = new Float64Array(1000);
    const pieces: number[] = [];
    for (const count of [1, 2, 997]) {
      fillUniform(state, part, count);
      pieces.push(...part.subarray(0, count));
    }
    expect(pieces).toEqual([...whole]);
  });

  it('differs by name and by seed, also in the seed’s high bits', () => {
    const first = (seed: number, name: string) => {
      const out = new Float64Array(4);
      fillUniform(randomStream(seed, name), out, 4);
      return out.join();
    };
    const all = [
      first(1, 'a'),
      first(1, 'b'),
      first(2, 'a'),
      first(1 + TWO_TO_32, 'a'),
      first(1, 'ab'),
      first(1, 'ba'),
      first(1, ''),
    ];
    expect(new Set(all).size).toBe(all.length);
    expect(first(1, 'a')).toBe(first(1, 'a'));
  });

  it('stays strictly between 0 and 1, evenly, and streams do not follow each other', () => {
    const count = 100_000;
    const a = new Float64Array(count);
    const b = new Float64Array(count);
    fillUniform(randomStream(1, 'mass:1'), a, count);
    fillUniform(randomStream(1, 'mass:2'), b, count);
    expect(Math.min(...a.subarray(0, 50_000))).toBeGreaterThan(0);
    expect(Math.max(...a.subarray(0, 50_000))).toBeLessThan(1);
    const bins = new Float64Array(100);
    let product = 0;
    for (let i = 0; i < count; i += 1) {
      bins[Math.floor(a[i]! * 100)]! += 1;
      product += (a[i]! - 0.5) * (b[i]! - 0.5);
    }
    // χ² with 99 degrees of freedom: 148.2 is passed once in a thousand (tables).
    const chi = bins.reduce((sum, found) => sum + (found - 1000) ** 2 / 1000, 0);
    expect(chi).toBeLessThan(148.2);
    // Correlation of independent streams: standard deviation 1/√N.
    expect(Math.abs((product / count) * 12)).toBeLessThan(4 / Math.sqrt(count));
  });
});
