import { useId, useState } from 'react';

interface StripFieldProps {
  readonly label: string;
  /** Heard after the label, shown in the field's end. */
  readonly unit?: string;
  /** What stands in the document, in words. */
  readonly value: string;
  /** Reads what was typed and does it; returns what is wrong, in one sentence, or null. */
  readonly onCommit: (text: string) => string | null;
  readonly wide?: boolean;
}

/** A small field beside the picked thing. Enter or leaving commits, Escape restores; what is refused stays as typed. */
export function StripField({ label, unit, value, onCommit, wide = false }: StripFieldProps) {
  const id = useId();
  const [typed, setTyped] = useState<string | null>(null);
  const [wrong, setWrong] = useState<string | null>(null);
  const commit = () => {
    if (typed === null) return;
    const fault = typed === value ? null : onCommit(typed);
    setWrong(fault);
    if (fault === null) setTyped(null);
  };
  return (
    <div className="strip-field" data-wide={wide ? 'yes' : undefined} data-invalid={wrong === null ? undefined : 'yes'}>
      <label htmlFor={id}>
        {label}
        {unit === undefined ? null : <span className="unseen"> ({unit})</span>}
      </label>
      <div className="field-box" data-compact="yes">
        <input
          id={id}
          type="text"
          autoComplete="off"
          className={unit === undefined ? undefined : 'figure'}
          value={typed ?? value}
          aria-invalid={wrong === null ? undefined : true}
          aria-describedby={wrong === null ? undefined : `${id}-wrong`}
          onChange={(event) => {
            setTyped(event.target.value);
          }}
          onBlur={commit}
          onKeyDown={(event) => {
            if (event.key === 'Enter') commit();
            if (event.key === 'Escape') {
              event.stopPropagation();
              setTyped(null);
              setWrong(null);
            }
          }}
        />
        {unit === undefined ? null : (
          <span className="field-unit" aria-hidden="true">
            {unit}
          </span>
        )}
      </div>
      {wrong === null ? null : (
        <p id={`${id}-wrong`} className="strip-wrong" role="alert">
          {wrong}
        </p>
      )}
    </div>
  );
}
