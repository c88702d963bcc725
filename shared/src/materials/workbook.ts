import type { InputValues, Method, MethodInputs } from '../methods/define-method.ts';
import {
  estimate,
  estimateOutputs,
  OutOfRangeError,
  type Estimate,
  type EstimateContext,
  type EstimateWarning,
} from '../methods/estimate.ts';
import { rangeFaults } from '../methods/range-faults.ts';
import { DraftRefused } from './draft-refused.ts';

/** Where in the draft a step's numbers were stated: one place for the step, others by the name of an input. */
export interface Place<S extends MethodInputs> {
  readonly at: string;
  readonly inputs?: { readonly [K in keyof S]?: string };
}

/** Runs the methods of one derivation, keeps their workings in order, and says which field a refusal belongs to. */
export class Workbook {
  readonly workings: Estimate[] = [];
  readonly warnings: EstimateWarning[] = [];

  /** Runs a method of one result. @throws DraftRefused with the fields that are outside what the method is made for */
  run<S extends MethodInputs>(
    method: Method<S>,
    inputs: InputValues<S>,
    place: Place<S>,
    context: EstimateContext<S> = {},
  ): number {
    const made = guarded(method, inputs, place, () => estimate(method, inputs, { ...context, workings: true }));
    this.keep(made);
    return made.value ?? 0;
  }

  /** Runs a method of several results and keeps the workings of those named. @throws DraftRefused as `run` does */
  outputs<S extends MethodInputs, R extends object>(
    method: Method<S, R>,
    inputs: InputValues<S>,
    place: Place<S>,
    shown: readonly (keyof R & string)[],
    context: EstimateContext<S> = {},
  ): R {
    return guarded(method, inputs, place, () => {
      const run = estimateOutputs(method, inputs, { ...context, workings: true });
      for (const output of shown) this.keep(run.of(output));
      return run.result;
    });
  }

  warn(code: string, text: string): void {
    this.warnings.push({ code, text });
  }

  private keep(made: Estimate): void {
    this.workings.push(made);
    for (const warning of made.warnings)
      if (!this.warnings.some(({ text }) => text === warning.text)) this.warnings.push(warning);
  }
}

function guarded<S extends MethodInputs, R, T>(
  method: Method<S, R>,
  inputs: InputValues<S>,
  place: Place<S>,
  work: () => T,
): T {
  const faults = method.outOfRange === 'refuse' ? rangeFaults(method, inputs) : [];
  if (faults.length > 0)
    throw new DraftRefused(
      faults.map(({ input, text }) => ({
        pointer: place.inputs?.[input] ?? place.at,
        code: 'out_of_range',
        message: `${text} Check the value and its unit.`,
      })),
    );
  try {
    return work();
  } catch (error) {
    if (error instanceof OutOfRangeError) throw DraftRefused.at(place.at, 'not_possible', error.message);
    throw error;
  }
}
