import type { Estimate } from '@embertally/shared/methods/estimate';
import type { FurtherReading } from '@embertally/shared/further/further-reading';
import { useState } from 'react';
import { FormulaText } from '../../../components/working/formula-text.tsx';
import { UnitText } from '../../../components/working/unit-text.tsx';
import { WarningList } from '../../../components/working/warning-list.tsx';
import { WorkingView } from '../../../components/working/working-view.tsx';
import { plainUnits } from '../../../lib/plain-units.ts';
import { useQuantity } from '../../../lib/use-quantity.ts';

interface FurtherRowProps {
  readonly reading: FurtherReading;
  /** The page unfolds every working at once. */
  readonly unfolded: boolean;
}

/** One reading: what it says, its numbers, and below them how each came about. */
export function FurtherRow({ reading: { id, title, note, numbers }, unfolded }: FurtherRowProps) {
  const [own, setOwn] = useState(false);
  const open = unfolded || own;
  return (
    <article aria-labelledby={`further-${id}`} className="further-row py-4">
      <div>
        <h4 id={`further-${id}`} className="font-bold">
          {title}
        </h4>
        <p className="max-w-[60ch] text-small text-soft">
          <FormulaText>{plainUnits(note)}</FormulaText>
        </p>
      </div>
      <div>
        <dl className="text-small">
          {numbers.map(({ name, estimate }) => (
            <div key={name} className="flex items-baseline justify-between gap-4 border-b border-rule py-1">
              <dt>{name}</dt>
              <dd className="text-right whitespace-nowrap">
                <Value estimate={estimate} />
              </dd>
            </div>
          ))}
        </dl>
        <div className="mt-2 text-soft empty:hidden">
          <WarningList warnings={numbers.flatMap(({ estimate }) => estimate.warnings)} />
        </div>
      </div>
      <details
        className="fold further-workings"
        data-folded={open ? undefined : 'yes'}
        open={open}
        onToggle={(event) => {
          setOwn(event.currentTarget.open);
        }}
      >
        <summary className="not-on-paper">{numbers.length === 1 ? 'Its working' : 'Their workings'}</summary>
        {open &&
          numbers.map(({ name, estimate }, index) => (
            <div key={name} className="working-block">
              <p className="font-bold">{name}</p>
              <WorkingView
                estimate={estimate}
                name={`${title}: ${name}`}
                level={4}
                sameAs={numbers.slice(0, index).find((one) => one.estimate.method === estimate.method)?.name}
              />
            </div>
          ))}
      </details>
    </article>
  );
}

function Value({ estimate }: { readonly estimate: Estimate }) {
  const show = useQuantity();
  const { value, unit, warnings } = estimate;
  const shown = value === null ? { text: 'never', unit: '' } : show(value, unit);
  return (
    <>
      <span className="figure">{shown.text}</span>
      {shown.unit !== '' && (
        <span className="text-soft">
          {' '}
          <UnitText unit={shown.unit} />
        </span>
      )}
      {warnings.length > 0 && <span className="font-bold text-ochre">*</span>}
    </>
  );
}
