import type { Option } from './field-spec.ts';

interface MarksFieldProps {
  readonly legend: string;
  readonly options: readonly Option[];
  /** The chosen ones, blanks between. */
  readonly value: string;
  readonly onChange: (value: string) => void;
}

/** Any number of a few marks. */
export function MarksField({ legend, options, value, onChange }: MarksFieldProps) {
  const chosen = new Set(value.split(' ').filter((mark) => mark !== ''));
  return (
    <fieldset className="choices">
      <legend className="font-bold">
        {legend} <span className="font-normal text-soft">(optional)</span>
      </legend>
      <div className="flex flex-wrap gap-x-6">
        {options.map((option) => (
          <label key={option.value} className="choice">
            <input
              type="checkbox"
              checked={chosen.has(option.value)}
              onChange={(event) => {
                const next = options.filter((one) =>
                  one.value === option.value ? event.target.checked : chosen.has(one.value),
                );
                onChange(next.map((one) => one.value).join(' '));
              }}
            />
            <span>{option.label}</span>
          </label>
        ))}
      </div>
    </fieldset>
  );
}
