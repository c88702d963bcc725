import type { Estimate } from '@embertally/shared/methods/estimate';
import type { PlacedEstimate } from './tally-estimates.ts';

/** Numbers that come out of one run of a method: the derivation is the same and is printed once. */
export interface WorkingGroup {
  readonly results: readonly PlacedEstimate[];
  readonly shared: Estimate;
}

/** Puts numbers with the same method, inputs and steps together, in the order of the first of each. */
export function groupWorkings(estimates: readonly PlacedEstimate[]): WorkingGroup[] {
  const groups = new Map<string, PlacedEstimate[]>();
  for (const placed of estimates) {
    const { method, inputs, steps, warnings } = placed.estimate;
    // The last step is the number itself; the ones before it belong to the run.
    const key = JSON.stringify([method, inputs, steps?.slice(0, -1), warnings]);
    const group = groups.get(key);
    if (group === undefined) groups.set(key, [placed]);
    else group.push(placed);
  }
  return [...groups.values()].flatMap((results) => {
    const [first] = results;
    return first === undefined ? [] : [{ results, shared: first.estimate }];
  });
}
