import type { Estimate } from '@embertally/shared/methods/estimate';
import { formatNumber } from '@embertally/shared/units/format-number';
import { useState } from 'react';
import { Dialog } from '../../../components/dialog.tsx';
import { UnitText } from '../../../components/working/unit-text.tsx';
import { WorkingView } from '../../../components/working/working-view.tsx';
import { useQuantity } from '../../../lib/use-quantity.ts';

interface AnswerFigureProps {
  /** With its working. */
  readonly estimate: Estimate;
  readonly name: string;
}

/** The number an answer comes to; pressed, it opens its working. */
export function AnswerFigure({ estimate, name }: AnswerFigureProps) {
  const show = useQuantity();
  const [open, setOpen] = useState(false);
  const { value, unit } = estimate;
  const isCount = unit === '' && Number.isInteger(value);
  const shown =
    value === null
      ? { text: 'none', unit: '' }
      : isCount
        ? { text: formatNumber(value, String(value).length), unit }
        : show(unit === 'kg' ? roundedDown(value) : value, unit);
  return (
    <>
      <button
        type="button"
        className="tally-figure font-bold"
        aria-label={`${name}: ${`${shown.text} ${shown.unit}`.trim()}. Show its working`}
        aria-haspopup="dialog"
        onClick={() => {
          setOpen(true);
        }}
      >
        <span className="figure">{shown.text}</span>
        {shown.unit !== '' && (
          <span className="font-normal text-soft">
            {' '}
            <UnitText unit={shown.unit} />
          </span>
        )}
      </button>
      {open && (
        <Dialog
          open
          title={name}
          width="wide"
          onClose={() => {
            setOpen(false);
          }}
        >
          <WorkingView estimate={estimate} name={name} />
        </Dialog>
      )}
    </>
  );
}

/** Three figures, never more than was found: a kilogram too many would be over. */
function roundedDown(value: number): number {
  if (!(value > 0)) return 0;
  const step = 10 ** (Math.floor(Math.log10(value)) - 2);
  return Math.floor(value / step + 1e-9) * step;
}
