import { displayUnit } from '@embertally/shared/units/display-unit';
import { formatQuantity } from '@embertally/shared/units/format-quantity';
import { parseQuantity } from '@embertally/shared/units/parse-quantity';
import { useBook } from '../session/use-book.ts';
import { StripField } from './strip-field.tsx';

interface StripQuantityProps {
  readonly label: string;
  /** The unit the value is kept in. */
  readonly unit: string;
  readonly value: number;
  /** Does it, and returns what is wrong or null. */
  readonly onCommit: (value: number) => string | null;
}

/** A quantity beside the picked thing, in the person's units. */
export function StripQuantity({ label, unit, value, onCommit }: StripQuantityProps) {
  const units = useBook((state) => state.units);
  const { text } = formatQuantity(value, unit, units, { figures: 'as entered' });
  return (
    <StripField
      label={label}
      unit={displayUnit(unit, units)?.symbol ?? unit}
      value={text}
      onCommit={(typed) => {
        const read = parseQuantity(typed, { unit, system: units, name: label });
        return read.ok ? onCommit(read.value) : read.message;
      }}
    />
  );
}
