import { readNumber } from '@embertally/shared/units/read-number';
import { useState } from 'react';
import { TextField } from '../../../components/text-field.tsx';

interface NumberChoiceProps {
  readonly label: string;
  readonly hint?: string;
  readonly unit?: string;
  readonly optional?: boolean;
  readonly value: number | undefined;
  /** Undefined: emptied. Told when the field is left. */
  readonly onChoose: (value: number | undefined) => void;
}

/** A number that changes how a file is read: taken when the field is left, so that a file is not read at every key. */
export function NumberChoice({ label, hint, unit, optional, value, onChoose }: NumberChoiceProps) {
  const [typed, setTyped] = useState<string | null>(null);
  const [error, setError] = useState<string | undefined>(undefined);
  const commit = (): void => {
    if (typed === null) return;
    if (typed.trim() === '' && optional === true) {
      setTyped(null);
      setError(undefined);
      onChoose(undefined);
      return;
    }
    const read = readNumber(typed);
    if (read.kind === 'number') {
      setTyped(null);
      setError(undefined);
      onChoose(read.value);
    } else {
      setError(
        read.kind === 'ambiguous'
          ? `Write ${read.grouped} or ${read.decimal}, whichever is meant`
          : `${label} must be a number`,
      );
    }
  };
  return (
    <TextField
      label={unit === undefined ? label : `${label} (${unit})`}
      hint={hint}
      unit={unit}
      optional={optional}
      error={error}
      width="short"
      autoComplete="off"
      value={typed ?? (value === undefined ? '' : String(value))}
      onChange={setTyped}
      onBlur={commit}
      onKeyDown={(event) => {
        if (event.key !== 'Enter') return;
        // Enter takes the number; it does not send the form around it.
        event.preventDefault();
        commit();
      }}
    />
  );
}
