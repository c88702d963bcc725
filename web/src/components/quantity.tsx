import { formatQuantity } from '@embertally/shared/units/format-quantity';
import { useUnits } from '../lib/units-context.ts';

interface QuantityProps {
  /** In `unit`. */
  readonly value: number;
  /** The unit the value is kept in: `MJ/m2`, `kW`. */
  readonly unit: string;
}

/** A figure with its unit, in the units the person reads in; never bare. */
export function Quantity({ value, unit }: QuantityProps) {
  const shown = formatQuantity(value, unit, useUnits());
  return (
    <span className="whitespace-nowrap">
      <span className="figure">{shown.text}</span>
      <span className="font-sans text-soft"> {shown.unit}</span>
    </span>
  );
}
