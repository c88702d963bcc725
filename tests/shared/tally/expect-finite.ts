import { expect } from 'vitest';

/** Fails on a NaN or an Infinity anywhere inside, with its path. */
export function expectFinite(value: unknown, path = '$'): void {
  if (typeof value === 'number') expect(Number.isFinite(value), `${path} is ${value}`).toBe(true);
  else if (value !== null && typeof value === 'object') {
    for (const [key, inner] of Object.entries(value)) expectFinite(inner, `${path}.${key}`);
  }
}
