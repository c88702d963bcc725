import { describe, expect, it } from 'vitest';
import { GAP_METHOD, SPREAD_METHOD } from '@embertally/shared/methods/models/spread-method';
import { SPREAD_DEFAULTS } from '@embertally/shared/spread/spread-defaults';

describe.each([SPREAD_METHOD, GAP_METHOD])('$ref', ({ id, version, ref, sources, assumptions, limits }) => {
  it('says where it comes from, what it assumes and what it leaves out, in whole sentences', () => {
    expect(ref).toBe(`${id}@${version}`);
    for (const { title, locator } of sources) expect(`${title}|${locator}`).toMatch(/^.{3,}\|.{3,}$/);
    for (const sentence of [...assumptions, ...limits]) expect(sentence).toMatch(/^[A-Z].+\.$/);
    expect(limits.length).toBeGreaterThan(1);
  });
});

describe('what the model leaves out', () => {
  it.each([
    'room',
    'shading',
    'draught',
    'floor or linings',
    'falls, melts',
    'smouldering',
    'suppression',
    'factor of two',
  ])('is said: %s', (words) => {
    expect(SPREAD_METHOD.limits.join(' ')).toContain(words);
  });

  it('calls nothing safe', () => {
    const words = [
      ...SPREAD_METHOD.limits,
      ...GAP_METHOD.limits,
      ...SPREAD_METHOD.assumptions,
      ...GAP_METHOD.assumptions,
    ];
    expect([...words, ...Object.values(SPREAD_DEFAULTS)].join(' ')).not.toMatch(/\bsafe\b/i);
  });
});
