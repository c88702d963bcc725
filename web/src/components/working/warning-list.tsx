import type { EstimateWarning } from '@embertally/shared/methods/estimate';
import { FormulaText } from './formula-text.tsx';
import { plainUnits } from '../../lib/plain-units.ts';

/** Notes that stand with numbers, each said once. */
export function WarningList({ warnings }: { readonly warnings: readonly EstimateWarning[] }) {
  const said = new Map(warnings.map((warning) => [warning.text, warning]));
  if (said.size === 0) return null;
  return (
    <ul className="grid max-w-[72ch] gap-1 text-small" aria-label="Notes">
      {[...said.values()].map((warning) => (
        <li key={`${warning.code} ${warning.text}`} className="flex gap-1.5">
          <span aria-hidden="true" className="font-bold text-ochre">
            *
          </span>
          <span>
            <FormulaText>{plainUnits(warning.text)}</FormulaText>
          </span>
        </li>
      ))}
    </ul>
  );
}
