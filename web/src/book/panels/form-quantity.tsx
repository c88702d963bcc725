import { displayUnit } from '@embertally/shared/units/display-unit';
import { TextField } from '../../components/text-field.tsx';
import { useUnits } from '../../lib/units-context.ts';

interface FormQuantityProps {
  readonly label: string;
  readonly hint?: string;
  readonly optional?: boolean;
  /** The unit the value is kept in. */
  readonly unit: string;
  /** What the form gives for the field. */
  readonly field: {
    readonly id: string;
    readonly name: string;
    readonly value: string;
    readonly error: string | undefined;
    readonly onChange: (value: string) => void;
  };
}

/** A quantity in a form that is read when the form is sent: the text stays as typed until then. */
export function FormQuantity({ label, unit, field, ...texts }: FormQuantityProps) {
  const symbol = displayUnit(unit, useUnits())?.symbol ?? unit;
  return (
    <TextField {...texts} {...field} label={`${label} (${symbol})`} unit={symbol} width="short" autoComplete="off" />
  );
}
