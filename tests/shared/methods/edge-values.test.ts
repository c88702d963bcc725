import { describe, expect, it } from 'vitest';
import type { MethodInput } from '@embertally/shared/methods/define-method';
import { estimate, estimateOutputs, OutOfRangeError, type Estimate } from '@embertally/shared/methods/estimate';
import { METHODS, type AnyMethod } from '@embertally/shared/methods/registry';

type Value = number | string | readonly number[];
type Inputs = Record<string, Value>;

const LIST_LENGTH = 3;

/** An ordinary value inside the range: one where it may be, else the nearest end or the middle. */
function ordinary(input: MethodInput): Value {
  if ('choices' in input) return input.choices[0]!;
  const [low, high] = input.valid;
  const one = Number.isFinite(high) ? (low + high) / 2 : Math.max(1, low * 2);
  return 'list' in input ? new Array<number>(LIST_LENGTH).fill(one) : one;
}

/** Values that break formulas, and both ends of the range with what lies just outside them. */
function edges(input: MethodInput): readonly Value[] {
  if ('choices' in input) return input.choices;
  const [low, high] = input.valid;
  const beside = (end: number, sign: number) => end + sign * Math.max(1e-9, Math.abs(end) * 1e-9);
  const values = [0, -0, 1e-300, 1e-12, -1, -1e300, 1e300, NaN, Infinity, -Infinity, low, beside(low, -1)];
  if (Number.isFinite(high)) values.push(high, beside(high, 1));
  if (!('list' in input)) return values;
  const lists = values.flatMap((value) => [
    new Array<number>(LIST_LENGTH).fill(value),
    [value, ...(ordinary(input) as readonly number[]).slice(1)],
  ]);
  return [[], ...lists];
}

/** One input at a time at each of its edges, then all at once. */
function sweep(method: AnyMethod): Inputs[] {
  const specs = Object.entries(method.inputs);
  const plain: Inputs = Object.fromEntries(specs.map(([name, input]) => [name, ordinary(input)]));
  const single = specs.flatMap(([name, input]) => edges(input).map((value) => ({ ...plain, [name]: value })));
  const all = (pick: (input: Exclude<MethodInput, { choices: readonly string[] }>) => number): Inputs =>
    Object.fromEntries(
      specs.map(([name, input]) => {
        if ('choices' in input) return [name, ordinary(input)];
        return [name, 'list' in input ? new Array<number>(LIST_LENGTH).fill(pick(input)) : pick(input)];
      }),
    );
  return [plain, ...single, all(() => 0), all(({ valid }) => valid[0]), all(({ valid }) => valid[1]), all(() => NaN)];
}

function estimatesOf(method: AnyMethod, inputs: Inputs): Estimate[] {
  if (!method.outputs) return [estimate(method as never, inputs as never)];
  const run = estimateOutputs(method as never, inputs as never) as { of(name: string, never?: string): Estimate };
  const result = method.run(inputs) as Record<string, unknown>;
  return Object.keys(method.outputs).map((name) =>
    run.of(name, result[name] === null ? 'It does not happen.' : undefined),
  );
}

const isNumber = (value: unknown): value is number => typeof value === 'number';

/** Quantities with a value that is none or outside their range. */
function outside(method: AnyMethod, inputs: Inputs): string[] {
  return Object.entries(method.inputs).flatMap(([name, input]) => {
    if ('choices' in input) return [];
    const values = [inputs[name]].flat().filter(isNumber);
    return values.every((value) => value >= input.valid[0] && value <= input.valid[1]) ? [] : [input.quantity];
  });
}

describe.each(METHODS.map((method) => [method.id, method] as const))('%s', (_id, method) => {
  it('gives a finite number with a flag for every bound left, or a refusal that names what to change', () => {
    for (const inputs of sweep(method)) {
      const where = JSON.stringify(inputs, (_key, value: unknown) => (isNumber(value) ? String(value) : value));
      try {
        for (const one of estimatesOf(method, inputs)) {
          expect(one.value === null ? one.never : Number.isFinite(one.value), where).toBeTruthy();
          for (const quantity of outside(method, inputs))
            expect(one.warnings.map(({ text }) => text).join(), where).toContain(quantity);
          expect(
            one.warnings.every(({ text }) => text.endsWith('.') && !/NaN|Infinity/.test(text)),
            where,
          ).toBe(true);
        }
      } catch (fault) {
        if (!(fault instanceof OutOfRangeError)) throw new Error(`${String(fault)} with ${where}`, { cause: fault });
        expect(fault.message, where).toMatch(/\.$/);
        expect(fault.message, where).not.toMatch(/NaN|Infinity|undefined/);
        const named = Object.values(method.inputs).some((input) => fault.message.includes(input.quantity));
        const told = /check|must|not |above|below|fewer|go back|No |no atoms|inside|order|needs|add up/i;
        expect(named || told.test(fault.message), `${fault.message} with ${where}`).toBe(true);
      }
    }
  });
});
