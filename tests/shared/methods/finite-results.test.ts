import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { OutOfRangeError } from '@embertally/shared/methods/estimate';
import type { MethodInput } from '@embertally/shared/methods/define-method';
import { METHODS, type AnyMethod } from '@embertally/shared/methods/registry';

type Value = number | string | readonly number[];

const LARGE = 1e6;
const LENGTH = 4;

/** A value inside the range a method declares; its ends come often. */
function inside(input: MethodInput): fc.Arbitrary<Value> {
  if ('choices' in input) return fc.constantFrom(...input.choices);
  const [low, high] = [Math.max(-LARGE, input.valid[0]), Math.min(LARGE, input.valid[1])];
  const number = fc.oneof(
    fc.constantFrom(low, high),
    fc.double({ min: low, max: high, noNaN: true }),
    fc.double({ min: 0, max: 1, noNaN: true }).map((share) => low + (high - low) * share ** 8),
  );
  return 'list' in input ? fc.array(number, { minLength: LENGTH, maxLength: LENGTH }) : number;
}

function inputsOf(method: AnyMethod): fc.Arbitrary<Record<string, Value>> {
  const given = Object.fromEntries(Object.entries(method.inputs).map(([name, input]) => [name, inside(input)]));
  return fc.record(given).map((inputs) => {
    const isCurve = Array.isArray(inputs.t) && Array.isArray(inputs.Q);
    return isCurve ? { ...inputs, t: [...(inputs.t as number[])].sort((a, b) => a - b) } : inputs;
  });
}

/** What a method says it gives, by name. */
function results(method: AnyMethod, inputs: Record<string, Value>): Record<string, unknown> {
  const result = method.run(inputs);
  if (typeof result === 'number') return { value: result };
  const fields = result as Record<string, unknown>;
  return Object.fromEntries(Object.keys(method.outputs ?? {}).map((name) => [name, fields[name]]));
}

describe.each(METHODS.map((method) => [method.id, method] as const))('%s', (_id, method) => {
  it('gives only finite numbers inside its ranges, or says why it does not', () => {
    fc.assert(
      fc.property(inputsOf(method), (inputs) => {
        try {
          for (const [name, value] of Object.entries(results(method, inputs)))
            expect(value === null || Number.isFinite(value), `${name} ${String(value)}`).toBe(true);
        } catch (fault) {
          if (!(fault instanceof OutOfRangeError)) throw fault;
        }
      }),
      { numRuns: 200 },
    );
  });
});
