import type { InputValues, MethodInputs, Method, NumberInput } from './define-method.ts';
import { figure } from './figure.ts';

export interface RangeFault {
  readonly input: string;
  readonly value: number;
  readonly text: string;
}

/** A bound this small only keeps out nothing at all, so that is what is said. */
const LEAST = 1e-6;

/** The range of an input as words: `0.02 to 0.2`, `0 or more`. */
export function rangeText([min, max]: readonly [number, number]): string {
  if (min === -Infinity && max === Infinity) return 'any';
  if (min > 0 && min <= LEAST) return max === Infinity ? 'more than 0' : `more than 0, up to ${figure(max)}`;
  if (max === Infinity) return `${figure(min)} or more`;
  if (min === -Infinity) return `${figure(max)} or less`;
  return `${figure(min)} to ${figure(max)}`;
}

/** Every input outside the range of a method, with a sentence for each; empty when all are inside. */
export function rangeFaults<S extends MethodInputs, R>(method: Method<S, R>, inputs: InputValues<S>): RangeFault[] {
  const faults: RangeFault[] = [];
  for (const name in method.inputs) {
    const spec = method.inputs[name] as MethodInputs[string];
    if ('choices' in spec) continue;
    const [min, max] = spec.valid;
    const value = inputs[name] as number | readonly number[];
    if (typeof value === 'number') {
      if (!(value >= min && value <= max)) faults.push(fault(name, spec, value));
    } else {
      for (const one of value) {
        if (one >= min && one <= max) continue;
        faults.push(fault(name, spec, one));
        break;
      }
    }
  }
  return faults;
}

function fault(input: string, spec: NumberInput, value: number): RangeFault {
  const unit = spec.unit === '' ? '' : ` ${spec.unit}`;
  return {
    input,
    value,
    text: `${spec.quantity} is ${figure(value)}${unit}; the method is made for ${rangeText(spec.valid)}${unit}.`,
  };
}
