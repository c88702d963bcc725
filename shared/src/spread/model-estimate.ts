import type { Estimate, EstimateWarning } from '../methods/estimate.ts';
import type { WorkingInput, WorkingStep } from '../methods/working.ts';
import type { SpreadMethod } from '../methods/models/spread-method.ts';

/** One number of a model of many parts, with what a working says of it. */
export interface ModelNumber {
  /** Null with `never`: the event does not happen. */
  readonly value: number | null;
  readonly never?: string;
  readonly warnings?: readonly EstimateWarning[];
  readonly inputs?: readonly WorkingInput[];
  readonly steps?: readonly WorkingStep[];
  /** For the numbers of the whole room: assumptions and limits, which would be the same beside every entry. */
  readonly assumptions?: readonly string[];
}

const NO_WARNINGS: readonly EstimateWarning[] = [];

/**
 * Puts a model's result into the shape of an estimate.
 * @param describe called for workings only
 */
export function modelEstimate<Output extends string>(
  model: SpreadMethod<Output>,
  output: Output,
  number: Pick<ModelNumber, 'value' | 'never' | 'warnings'>,
  describe?: () => Pick<ModelNumber, 'inputs' | 'steps' | 'assumptions'>,
): Estimate {
  const { symbol, unit } = model.outputs[output];
  const { value, never, warnings = NO_WARNINGS } = number;
  const plain = { value, unit, method: model.ref, warnings, ...(never === undefined ? {} : { never }) };
  if (!describe) return plain;
  const { inputs = [], steps = [], assumptions } = describe();
  return {
    ...plain,
    title: model.title,
    symbol,
    equation: model.equation,
    inputs,
    steps: [{ text: 'The model', equation: model.equation }, ...steps, { text: never ?? `${symbol} =`, value, unit }],
    sources: model.sources,
    ...(assumptions && { assumptions }),
    why: model.why,
  };
}
