import { formatQuantity } from '@embertally/shared/units/format-quantity';
import { useUnits } from '../lib/units-context.ts';

interface RangeProps {
  /** Both in `unit`. */
  readonly low: number;
  readonly high: number;
  readonly unit: string;
}

/** From low to high with the unit said once. */
export function Range({ low, high, unit }: RangeProps) {
  const system = useUnits();
  const from = formatQuantity(low, unit, system);
  const to = formatQuantity(high, unit, system);
  return (
    <span className="whitespace-nowrap">
      <span className="figure">
        {from.text} – {to.text}
      </span>
      <span className="font-sans text-soft"> {to.unit}</span>
    </span>
  );
}
