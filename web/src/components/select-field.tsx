import { FieldFrame, type FieldTexts } from './field-frame.tsx';

export interface SelectOption<T extends string> {
  readonly value: T;
  readonly label: string;
}

interface SelectFieldProps<T extends string> extends FieldTexts {
  readonly id?: string;
  readonly name?: string;
  readonly value: T;
  readonly options: readonly SelectOption<T>[];
  readonly onChange: (value: T) => void;
  readonly width?: 'short' | 'medium' | 'full';
  readonly compact?: boolean;
}

const WIDTHS = { short: 'max-w-40', medium: 'max-w-96', full: '' } as const;

/** One of a few known answers, by the browser's own list: it works the same under touch, keyboard and readers. */
export function SelectField<T extends string>(props: SelectFieldProps<T>) {
  const { value, options, onChange, name, width = 'full', compact, ...frame } = props;
  return (
    <FieldFrame {...frame}>
      {(ties) => (
        <div className={`field-box ${WIDTHS[width]}`} data-compact={compact ? 'yes' : undefined}>
          <select
            {...ties}
            name={name}
            value={value}
            onChange={(event) => {
              const chosen = options.find((option) => option.value === event.target.value);
              if (chosen !== undefined) onChange(chosen.value);
            }}
          >
            {options.map((option) => (
              <option key={option.value} value={option.value}>
                {option.label}
              </option>
            ))}
          </select>
        </div>
      )}
    </FieldFrame>
  );
}
