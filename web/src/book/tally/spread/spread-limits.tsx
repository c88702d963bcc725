import { GAP_METHOD, SPREAD_METHOD } from '@embertally/shared/methods/models/spread-method';
import type { SpreadTally } from '@embertally/shared/tally/room-tally';
import { FormulaText } from '../../../components/working/formula-text.tsx';
import { plainUnits } from '../../../lib/plain-units.ts';

/** What the model does not know of, and what was assumed of entries that do not say. */
export function SpreadLimits({ spread }: { readonly spread: SpreadTally }) {
  const { defaults = [], layerIncluded } = spread;
  return (
    <div className="grid max-w-[72ch] gap-3 text-small">
      <ul className="list-disc pl-5">
        {[...SPREAD_METHOD.limits, ...GAP_METHOD.limits].map((limit) => (
          <li key={limit}>{limit}</li>
        ))}
        {layerIncluded === false && <li>The hot layer is left out here.</li>}
      </ul>
      {defaults.length > 0 && (
        <>
          <p>Assumed where entries do not say:</p>
          <ul className="list-disc pl-5">
            {defaults.map(({ code, text, entryIds }) => (
              <li key={code}>
                <FormulaText>{plainUnits(text)}</FormulaText>{' '}
                <span className="text-soft">{entryIds.length === 1 ? '1 entry' : `${entryIds.length} entries`}</span>
              </li>
            ))}
          </ul>
        </>
      )}
    </div>
  );
}
