import { FieldFrame, type FieldTexts } from './field-frame.tsx';

interface TextAreaFieldProps extends FieldTexts {
  readonly id?: string;
  readonly name?: string;
  readonly rows?: number;
  readonly value: string;
  readonly onChange: (value: string) => void;
  readonly onBlur?: () => void;
}

/** Several lines of text. */
export function TextAreaField({ value, onChange, onBlur, name, rows = 3, ...frame }: TextAreaFieldProps) {
  return (
    <FieldFrame {...frame}>
      {(ties) => (
        <div className="field-box">
          <textarea
            {...ties}
            name={name}
            rows={rows}
            value={value}
            onBlur={onBlur}
            onChange={(event) => {
              onChange(event.target.value);
            }}
          />
        </div>
      )}
    </FieldFrame>
  );
}
