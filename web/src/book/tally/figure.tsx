import type { Estimate } from '@embertally/shared/methods/estimate';
import { figureName } from '@embertally/shared/tally/figure-name';
import { use } from 'react';
import { estimateText } from './estimate-text.ts';
import { UnitText } from '../../components/working/unit-text.tsx';
import { useQuantity } from '../../lib/use-quantity.ts';
import { WorkingContext } from './working-context.ts';

interface FigureProps {
  /** Where the number stands in the tally, as `load.perFloor`. */
  readonly path: string;
  readonly estimate: Estimate;
  /** What the row is called, for numbers in a list. */
  readonly row?: string;
  /** `bare`: the unit stands in the column's heading. */
  readonly unit?: 'shown' | 'bare';
  readonly className?: string;
  readonly unitClassName?: string;
}

/** A number of the tally: a button that opens its working. A star says that a note stands below. */
export function Figure({ path, estimate, row, unit = 'shown', className = '', unitClassName = '' }: FigureProps) {
  const open = use(WorkingContext);
  const show = useQuantity();
  const name = figureName(path, row);
  const shown = estimate.value === null ? { text: 'never', unit: '' } : show(estimate.value, estimate.unit);
  const warned = estimate.warnings.length > 0;
  const body = (
    <>
      <span className="figure">{shown.text}</span>
      {unit === 'shown' && shown.unit !== '' && (
        <span className={`text-soft ${unitClassName}`}>
          {' '}
          <UnitText unit={shown.unit} />
        </span>
      )}
      {warned && <span className="font-bold text-ochre">*</span>}
    </>
  );
  if (open === null) return <span className={`whitespace-nowrap ${className}`}>{body}</span>;
  return (
    <button
      type="button"
      className={`tally-figure ${className}`}
      aria-label={`${name}: ${estimateText(estimate, show)}${warned ? ', with a note' : ''}. Show its working`}
      aria-haspopup="dialog"
      onClick={() => {
        open(estimate.equation === undefined ? { path, name } : { path, name, estimate });
      }}
    >
      {body}
    </button>
  );
}
