import type { ComponentPropsWithRef } from 'react';
import { FieldFrame, type FieldTexts } from './field-frame.tsx';

type InputProps = Omit<ComponentPropsWithRef<'input'>, 'value' | 'onChange' | 'className' | 'children'>;

interface TextFieldProps extends InputProps, FieldTexts {
  readonly value: string;
  readonly onChange: (value: string) => void;
  /** How much is expected: the box is as wide as its answer. */
  readonly width?: 'short' | 'medium' | 'full';
  /** Stands inside the end of the box; say it in the label as well, for those who do not see it. */
  readonly unit?: string | undefined;
  readonly compact?: boolean;
}

const WIDTHS = { short: 'max-w-40', medium: 'max-w-96', full: '' } as const;

/** One line of text. Nothing is cut off while typing: a value that is too long is said to be so afterwards. */
export function TextField(props: TextFieldProps) {
  const {
    label,
    hint,
    error,
    optional,
    labelUnseen,
    value,
    onChange,
    width = 'full',
    unit,
    compact,
    id,
    ...input
  } = props;
  return (
    <FieldFrame {...{ label, hint, error, optional, labelUnseen, id }}>
      {(ties) => (
        <div className={`field-box ${WIDTHS[width]}`} data-compact={compact ? 'yes' : undefined}>
          <input
            type="text"
            {...input}
            {...ties}
            value={value}
            onChange={(event) => {
              onChange(event.target.value);
            }}
          />
          {unit === undefined ? null : (
            <span className="field-unit" aria-hidden="true">
              {unit}
            </span>
          )}
        </div>
      )}
    </FieldFrame>
  );
}
