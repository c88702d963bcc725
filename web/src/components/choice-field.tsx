import { useId } from 'react';

export interface Choice<T extends string> {
  readonly value: T;
  readonly label: string;
  readonly hint?: string;
}

interface ChoiceFieldProps<T extends string> {
  readonly legend: string;
  readonly value: T;
  readonly choices: readonly Choice<T>[];
  readonly onChange: (value: T) => void;
}

/** One of a handful of answers that a person should see all at once. */
export function ChoiceField<T extends string>({ legend, value, choices, onChange }: ChoiceFieldProps<T>) {
  const group = useId();
  return (
    <fieldset className="choices">
      <legend className="font-bold">{legend}</legend>
      {choices.map((choice) => (
        <label key={choice.value} className="choice">
          <input
            type="radio"
            name={group}
            value={choice.value}
            checked={choice.value === value}
            onChange={() => {
              onChange(choice.value);
            }}
          />
          <span>
            {choice.label}
            {choice.hint === undefined ? null : <span className="block text-small text-soft">{choice.hint}</span>}
          </span>
        </label>
      ))}
    </fieldset>
  );
}
