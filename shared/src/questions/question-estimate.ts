import type { Estimate, EstimateWarning } from '../methods/estimate.ts';
import type { WorkingInput, WorkingStep } from '../methods/working.ts';
import type { QuestionMethod } from '../methods/models/question-method.ts';

interface Given {
  /** Null with `never`: no answer in the range that was searched. */
  readonly value: number | null;
  readonly never?: string;
  readonly warnings: readonly EstimateWarning[];
  readonly inputs: readonly WorkingInput[];
  readonly steps: readonly WorkingStep[];
}

/** An answer in the shape of an estimate, its working always with it. */
export function questionEstimate(method: QuestionMethod, output: string, given: Given): Estimate {
  const spec = method.outputs[output];
  if (!spec) throw new TypeError(`${method.ref} has no output ${output}.`);
  const { value, never, warnings, inputs, steps } = given;
  return {
    value,
    unit: spec.unit,
    method: method.ref,
    warnings,
    ...(never === undefined ? {} : { never }),
    title: method.title,
    symbol: spec.symbol,
    equation: method.equation,
    inputs,
    steps: [...steps, { text: never ?? `${spec.symbol} =`, value, unit: spec.unit }],
    sources: method.sources,
    assumptions: method.assumptions,
    why: method.why,
  };
}
