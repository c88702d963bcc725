import { useState } from 'react';
import { FieldFrame, type FieldTexts } from './field-frame.tsx';

interface PasswordFieldProps extends FieldTexts {
  readonly id?: string;
  readonly name?: string;
  readonly autoComplete: 'current-password' | 'new-password';
  readonly value: string;
  readonly onChange: (value: string) => void;
}

/** A password: may be pasted, filled by a manager and looked at. */
export function PasswordField({ autoComplete, name, value, onChange, ...frame }: PasswordFieldProps) {
  const [shown, setShown] = useState(false);
  return (
    <FieldFrame {...frame}>
      {(ties) => (
        <div className="field-box max-w-96">
          <input
            {...ties}
            type={shown ? 'text' : 'password'}
            name={name}
            autoComplete={autoComplete}
            autoCapitalize="none"
            spellCheck={false}
            value={value}
            onChange={(event) => {
              onChange(event.target.value);
            }}
          />
          <button
            type="button"
            className="field-inside"
            onClick={() => {
              setShown(!shown);
            }}
          >
            {shown ? 'Hide' : 'Show'} <span className="unseen">password</span>
          </button>
        </div>
      )}
    </FieldFrame>
  );
}
