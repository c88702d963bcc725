import { useId } from 'react';

interface StripChoiceProps<T extends string> {
  readonly label: string;
  readonly value: T;
  readonly choices: readonly { readonly value: T; readonly label: string }[];
  readonly onChoose: (value: T) => void;
}

/** One of a few answers beside the picked thing. */
export function StripChoice<T extends string>({ label, value, choices, onChoose }: StripChoiceProps<T>) {
  const id = useId();
  return (
    <div className="strip-field">
      <label htmlFor={id}>{label}</label>
      <div className="field-box" data-compact="yes">
        <select
          id={id}
          value={value}
          onChange={(event) => {
            const chosen = choices.find((choice) => choice.value === event.target.value);
            if (chosen !== undefined) onChoose(chosen.value);
          }}
        >
          {choices.map((choice) => (
            <option key={choice.value} value={choice.value}>
              {choice.label}
            </option>
          ))}
        </select>
      </div>
    </div>
  );
}
