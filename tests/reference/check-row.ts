import { expect } from 'vitest';
import { METHODS, type AnyMethod } from '@embertally/shared/methods/registry';
import type { ReferenceRow, Tolerance } from './reference-row.ts';

/** Runs the method a row names and compares each expected output. */
export function checkRow(row: ReferenceRow): void {
  const result = methodOf(row.method).run(row.inputs);
  const outputs = typeof result === 'number' ? { value: result } : (result as Record<string, unknown>);
  for (const [name, expected] of Object.entries(row.expected))
    expectOutput(outputs[name], expected, row.tolerance, name);
}

/** A sentence for the test's name: what is checked and where the value comes from. */
export function rowTitle({ id, method, origin, source, fromMemory }: ReferenceRow): string {
  return `${id}: ${method} (${origin}: ${source}${fromMemory ? '; value from memory' : ''})`;
}

export function expectOutput(
  actual: unknown,
  expected: number | string | boolean | null,
  tolerance: Tolerance,
  name: string,
) {
  if (typeof expected !== 'number') {
    expect(actual, name).toBe(expected);
    return;
  }
  const allowed = 'rel' in tolerance ? Math.abs(expected) * tolerance.rel : tolerance.abs;
  expect(typeof actual, name).toBe('number');
  expect(Math.abs((actual as number) - expected), `${name}: ${String(actual)} against ${expected}`).toBeLessThanOrEqual(
    allowed,
  );
}

function methodOf(id: string): AnyMethod {
  const method = METHODS.find((one) => one.id === id);
  if (!method) throw new Error(`No method ${id}.`);
  return method;
}
