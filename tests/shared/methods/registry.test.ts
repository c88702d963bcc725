import { readdirSync, readFileSync } from 'node:fs';
import { dirname, join } from 'node:path';
import { fileURLToPath } from 'node:url';
import { describe, expect, it } from 'vitest';
import { methodByRef, METHODS, MODELS } from '@embertally/shared/methods/registry';
import { referenceRows } from '../../support/reference-rows.ts';

const rows = await referenceRows();
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

describe('the values from outside', () => {
  it('each have a name of their own and hold a method that exists', () => {
    const seen = new Set<string>();
    expect(rows.filter(({ id }) => seen.size === seen.add(id).size).map(({ id }) => id)).toEqual([]);
    const known = new Set([...METHODS, ...MODELS].map(({ id }) => id));
    expect(rows.filter(({ method }) => !known.has(method)).map(({ id }) => id)).toEqual([]);
  });

  it('are all read by a test', () => {
    const reference = join(dirname(fileURLToPath(import.meta.url)), '../../reference');
    const tests = readdirSync(reference).filter((name) => name.endsWith('.test.ts'));
    const text = tests.map((name) => readFileSync(join(reference, name), 'utf8')).join();
    const lists = readdirSync(join(reference, 'rows')).filter((name) => name.endsWith('-rows.ts'));
    expect(lists.filter((name) => !text.includes(`./rows/${name}`))).toEqual([]);
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
