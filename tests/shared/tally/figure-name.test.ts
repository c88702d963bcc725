import { describe, expect, it } from 'vitest';
import { estimateRoom } from '@embertally/shared/tally/estimate-room';
import { figureName } from '@embertally/shared/tally/figure-name';
import { ODD_ROOMS } from './odd-rooms.ts';

/** Paths of every estimate of a tally but those of rows, which are named by their row. */
function pathsOf(value: unknown, path = ''): string[] {
  if (value === null || typeof value !== 'object' || Array.isArray(value)) return [];
  if ('method' in value) return [path];
  return Object.entries(value).flatMap(([key, inner]) => pathsOf(inner, path === '' ? key : `${path}.${key}`));
}

describe('the name of a number', () => {
  it.each(Object.entries(ODD_ROOMS))('is never its path: %s', (_name, input) => {
    const paths = pathsOf(estimateRoom(input));
    expect(paths.length).toBeGreaterThan(5);
    expect(paths.filter((path) => figureName(path) === path)).toEqual([]);
  });

  it('says which burn-out it is of', () => {
    expect(figureName('burnout.asKept.equivalentTime')).toBe('Equivalent time of exposure, as kept');
    expect(figureName('burnout.beforeGlass.design.parametric.peak')).toBe(
      'Peak burn-out temperature, design load, before any glass breaks',
    );
  });
});
