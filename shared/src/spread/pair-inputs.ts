import type { WorkingInput } from '../methods/working.ts';
import { computedInput } from './computed-input.ts';
import type { SpreadEntry } from './spread-entry.ts';

/** What the gap between two entries is worked out from; `k_f` 1, or 2 with the safety factor. */
export function pairInputs(source: SpreadEntry, target: SpreadEntry, k_f: number): WorkingInput[] {
  return [
    computedInput('Q_p', 'Q_p', 'Peak of the first entry', 'kW', source.peak_kW),
    computedInput('chi_r', 'χ_r', 'Share of it that radiates', '', source.radiativeFraction),
    computedInput('q_cr', 'q_cr', 'Critical flux of the second entry', 'kW/m2', target.ignition.critical_kW_m2),
    computedInput('dose', 'dose', 'Dose that lights the second entry', '(kW/m2)^n s', target.ignition.dose),
    computedInput('k_f', 'k_f', 'Flux factor', '', k_f),
  ];
}
