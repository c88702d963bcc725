import type { InputValues, Method, MethodInputs, MethodOutput } from './define-method.ts';
import { figure } from './figure.ts';
import { rangeFaults, rangeText } from './range-faults.ts';
import type { EstimateWarning, InputOrigin, MethodSource, WorkingInput, WorkingStep } from './working.ts';

export type { EstimateWarning, InputOrigin, MethodSource, WorkingInput, WorkingStep } from './working.ts';

/**
 * One number of the book with what is needed to defend it. `value: null` with `never` is an event that does not happen
 * (never a zero); an estimate that cannot be computed is absent and listed in `missing` instead.
 */
export interface Estimate {
  readonly value: number | null;
  readonly unit: string;
  /** Method id and version, as `load.per-floor@1`. */
  readonly method: string;
  readonly warnings: readonly EstimateWarning[];
  readonly never?: string;
  /** With workings only, from here on. */
  readonly title?: string;
  readonly symbol?: string;
  readonly equation?: string;
  readonly inputs?: readonly WorkingInput[];
  readonly steps?: readonly WorkingStep[];
  readonly sources?: readonly MethodSource[];
  readonly assumptions?: readonly string[];
  /** Why this method and not another. */
  readonly why?: string;
}

export type Origins<S extends MethodInputs> = {
  readonly [K in keyof S]?: InputOrigin | { readonly origin: InputOrigin; readonly note: string };
};

export interface EstimateContext<S extends MethodInputs> {
  readonly workings?: boolean;
  /** Where each input came from; `computed` where nothing is said. */
  readonly origins?: Origins<S>;
  /** Flags that come from the situation and not from the method's own range. */
  readonly warnings?: readonly EstimateWarning[];
  /** Steps that only the caller knows: what was left out, which rule chose an input. */
  readonly steps?: readonly WorkingStep[];
  /** The event does not happen: the value is null and this is the reason. */
  readonly never?: string;
}

export interface RunOutputs<R> {
  readonly result: R;
  /** @param never the event does not happen: the value is null and this is the reason */
  of(output: keyof R & string, never?: string): Estimate;
}

const NO_WARNINGS: readonly EstimateWarning[] = [];

/** Thrown when a method that refuses to leave its range is asked to: callers look at `rangeFaults` first. */
export class OutOfRangeError extends Error {
  override readonly name = 'OutOfRangeError';
}

/**
 * Runs a method of one result.
 * @throws OutOfRangeError when an input is outside the range of a method that refuses, or is no finite number where the
 *   range ends, or when the result is not finite; the message names the inputs.
 */
export function estimate<S extends MethodInputs>(
  method: Method<S>,
  inputs: InputValues<S>,
  context: EstimateContext<S> = {},
): Estimate {
  const warnings = warningsOf(method, inputs, context);
  const value = method.run(inputs);
  return assemble(method, inputs, method, value, value, warnings, context);
}

/** Runs a method of several results once; each is read as an estimate by the name of its field. */
export function estimateOutputs<S extends MethodInputs, R extends object>(
  method: Method<S, R>,
  inputs: InputValues<S>,
  context: EstimateContext<S> = {},
): RunOutputs<R> {
  const warnings = warningsOf(method, inputs, context);
  const result = method.run(inputs);
  return {
    result,
    of(output, never) {
      const spec = method.outputs?.[output];
      const value: unknown = result[output];
      if (!spec || (typeof value !== 'number' && value !== null))
        throw new TypeError(`${method.ref} has no output ${output}.`);
      return assemble(
        method,
        inputs,
        spec,
        value,
        result,
        warnings,
        never === undefined ? context : { ...context, never },
      );
    },
  };
}

function warningsOf<S extends MethodInputs, R>(
  method: Method<S, R>,
  inputs: InputValues<S>,
  context: EstimateContext<S>,
): readonly EstimateWarning[] {
  const faults = rangeFaults(method, inputs);
  const extra = context.warnings ?? NO_WARNINGS;
  if (faults.length === 0) return extra;
  if (method.outOfRange === 'refuse' || faults.some(({ value }) => !Number.isFinite(value))) {
    throw new OutOfRangeError(`${method.ref}: ${faults.map((fault) => fault.text).join(' ')}`);
  }
  return [...extra, ...faults.map((fault) => ({ code: 'OUT_OF_RANGE', text: fault.text }))];
}

function assemble<S extends MethodInputs, R>(
  method: Method<S, R>,
  inputs: InputValues<S>,
  output: Pick<MethodOutput, 'symbol' | 'unit'>,
  value: number | null,
  result: R,
  warnings: readonly EstimateWarning[],
  context: EstimateContext<S>,
): Estimate {
  const never = context.never;
  if (never === undefined && (value === null || !Number.isFinite(value))) {
    throw new OutOfRangeError(`${method.ref} has no finite result with ${inputsText(method, inputs)}: check these.`);
  }
  const plain = { value: never === undefined ? value : null, unit: output.unit, method: method.ref, warnings };
  const short = never === undefined ? plain : { ...plain, never };
  if (!context.workings) return short;
  return {
    ...short,
    title: method.title,
    symbol: output.symbol,
    equation: method.equation,
    inputs: workingInputs(method, inputs, context.origins),
    steps: [
      { text: 'The relation', equation: method.equation },
      ...(context.steps ?? []),
      ...(method.explain?.(inputs, result) ?? []),
      { text: never ?? `${output.symbol} =`, value: short.value, unit: output.unit },
    ],
    sources: method.sources,
    assumptions: method.assumptions,
    why: method.why,
  };
}

/** What went in, for a sentence: every quantity with its value. */
function inputsText<S extends MethodInputs, R>(method: Method<S, R>, inputs: InputValues<S>): string {
  return Object.entries(method.inputs)
    .flatMap(([name, spec]) => {
      const value = inputs[name] as number | string | readonly number[];
      if ('choices' in spec || typeof value === 'string') return [];
      const unit = spec.unit === '' ? '' : ` ${spec.unit}`;
      return [`${spec.quantity} ${typeof value === 'number' ? figure(value) : listText(value)}${unit}`];
    })
    .join(', ');
}

function workingInputs<S extends MethodInputs, R>(
  method: Method<S, R>,
  inputs: InputValues<S>,
  origins: Origins<S> | undefined,
): WorkingInput[] {
  return Object.entries(method.inputs).map(([name, spec]) => {
    const origin = origins?.[name] ?? 'computed';
    const value = inputs[name] as number | string | readonly number[];
    return {
      name,
      symbol: spec.symbol,
      quantity: spec.quantity,
      unit: 'choices' in spec ? '' : spec.unit,
      value: shown(value),
      origin: typeof origin === 'string' ? origin : origin.origin,
      ...(typeof origin === 'string' ? {} : { note: origin.note }),
      ...('choices' in spec ? {} : { valid: rangeText(spec.valid) }),
    };
  });
}

/** A limit that is not there is infinite inside; JSON has no word for that. */
function shown(value: number | string | readonly number[]): number | string {
  if (typeof value === 'number') return Number.isFinite(value) ? value : 'none';
  return typeof value === 'string' ? value : listText(value);
}

/** A list in a working: the first few values, then how many more. */
function listText(values: readonly number[]): string {
  const SHOWN = 12;
  if (values.length === 0) return 'none';
  const first = values
    .slice(0, SHOWN)
    .map((value) => figure(value))
    .join('; ');
  return values.length <= SHOWN ? first : `${first}; … ${values.length - SHOWN} more`;
}
