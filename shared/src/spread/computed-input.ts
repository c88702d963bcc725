import type { WorkingInput } from '../methods/working.ts';

/** A number the model was given by what was worked out before it. */
export function computedInput(
  name: string,
  symbol: string,
  quantity: string,
  unit: string,
  value: number | string,
): WorkingInput {
  return { name, symbol, quantity, unit, value, origin: 'computed' };
}
