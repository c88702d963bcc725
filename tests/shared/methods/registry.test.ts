import { readdirSync, readFileSync } from 'node:fs';
import { dirname, join } from 'node:path';
import { fileURLToPath } from 'node:url';
import { describe, expect, it } from 'vitest';
import { methodByRef, METHODS, MODELS } from '@embertally/shared/methods/registry';
import { BURNOUT_ROWS } from '../../reference/rows/burnout-rows.ts';
import { CALORIMETRY_ROWS } from '../../reference/rows/calorimetry-rows.ts';
import { CHEMISTRY_ROWS } from '../../reference/rows/chemistry-rows.ts';
import { GROWTH_ROWS } from '../../reference/rows/growth-rows.ts';
import { HEAT_ROWS } from '../../reference/rows/heat-rows.ts';
import { LOAD_ROWS } from '../../reference/rows/load-rows.ts';
import { MATERIAL_ROWS } from '../../reference/rows/material-rows.ts';
import { ROOM_ROWS } from '../../reference/rows/room-rows.ts';
import { STATISTICS_ROWS } from '../../reference/rows/statistics-rows.ts';
import { TEMPERATURE_ROWS } from '../../reference/rows/temperature-rows.ts';
import { PLUME_ROWS } from '../../reference/rows/plume-rows.ts';
import { RADIATION_ROWS } from '../../reference/rows/radiation-rows.ts';
import { POOL_ROWS } from '../../reference/rows/pool-rows.ts';
import { SMOKE_ROWS } from '../../reference/rows/smoke-rows.ts';
import { WATER_ROWS } from '../../reference/rows/water-rows.ts';
import { STORAGE_ROWS } from '../../reference/rows/storage-rows.ts';
import { SCHEME_ROWS } from '../../reference/rows/scheme-rows.ts';
import { DISTRIBUTION_ROWS } from '../../reference/rows/distribution-rows.ts';
import { FURTHER_ROWS } from '../../reference/rows/further-rows.ts';
import { HOW_MANY_ROWS, WHAT_CHANGES_ROWS } from '../../reference/rows/question-rows.ts';
import { GAP_ROWS, SPREAD_ROWS } from '../../reference/rows/spread-rows.ts';
import { UNCERTAINTY_ROWS } from '../../reference/rows/uncertainty-rows.ts';

const rows = [
  ...BURNOUT_ROWS,
  ...CALORIMETRY_ROWS,
  ...CHEMISTRY_ROWS,
  ...GROWTH_ROWS,
  ...HEAT_ROWS,
  ...LOAD_ROWS,
  ...MATERIAL_ROWS,
  ...ROOM_ROWS,
  ...STATISTICS_ROWS,
  ...TEMPERATURE_ROWS,
  ...PLUME_ROWS,
  ...RADIATION_ROWS,
  ...POOL_ROWS,
  ...SMOKE_ROWS,
  ...WATER_ROWS,
  ...STORAGE_ROWS,
  ...SCHEME_ROWS,
  ...DISTRIBUTION_ROWS,
  ...UNCERTAINTY_ROWS,
  ...SPREAD_ROWS,
  ...GAP_ROWS,
  ...FURTHER_ROWS,
  ...HOW_MANY_ROWS,
  ...WHAT_CHANGES_ROWS,
];
const folder = join(dirname(fileURLToPath(import.meta.url)), '../../../shared/src/methods');

describe.each([...METHODS, ...MODELS].map((method) => [method.ref, method] as const))('%s', (ref, method) => {
  it('has a source with a place in it, a reason, an equation and a range for every number', () => {
    expect(method.sources.length).toBeGreaterThan(0);
    for (const { title, locator } of method.sources) expect(`${title}|${locator}`).toMatch(/^.{3,}\|.{3,}$/);
    expect(method.why.length).toBeGreaterThan(10);
    expect(method.equation.length).toBeGreaterThan(3);
    for (const input of Object.values(method.inputs)) {
      if ('choices' in input) continue;
      expect(input.valid[0]).toBeLessThan(input.valid[1]);
    }
  });

  it('is held to at least one value from outside', () => {
    expect(rows.filter((row) => row.method === method.id).length).toBeGreaterThan(0);
  });

  it('is found by the name that stands beside its numbers', () => {
    expect(methodByRef(ref)).toBe(method);
  });
});

describe('the list of methods', () => {
  it('has each id once', () => {
    expect(new Set([...METHODS, ...MODELS].map(({ id }) => id)).size).toBe(METHODS.length + MODELS.length);
  });

  it('holds every declared method', () => {
    const declared = readdirSync(folder, { recursive: true, encoding: 'utf8' })
      .filter((name) => name.endsWith('.ts') && name !== 'define-method.ts')
      .flatMap((name) => [...readFileSync(join(folder, name), 'utf8').matchAll(/= defineMethod\(\{\s+id: '([^']+)'/g)])
      .map((match) => match[1]);
    expect(new Set(METHODS.map(({ id }) => id))).toEqual(new Set(declared));
  });

  it('knows no other version', () => {
    expect(methodByRef('load.per-floor@0')).toBeUndefined();
  });
});
