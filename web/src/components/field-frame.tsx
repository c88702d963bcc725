import { useId, type ReactNode } from 'react';

export interface FieldTexts {
  readonly label: string;
  /** One sentence, below the label. No links. */
  readonly hint?: string | undefined;
  /** What is wrong and how to put it right; the same words as in the summary of the form. */
  readonly error?: string | undefined;
  /** Says "(optional)" after the label. */
  readonly optional?: boolean | undefined;
  /** The label is heard and not seen: only inside a table whose column head says the same. */
  readonly labelUnseen?: boolean | undefined;
}

/** What the control must carry so that its label, hint and error are tied to it. */
export interface ControlTies {
  readonly id: string;
  readonly 'aria-describedby': string | undefined;
  readonly 'aria-invalid': true | undefined;
}

interface FieldFrameProps extends FieldTexts {
  /** Given by a form so that its summary can link here; made up otherwise. */
  readonly id?: string | undefined;
  readonly className?: string | undefined;
  readonly children: (ties: ControlTies) => ReactNode;
}

/** The frame every field stands in: label above, hint below it, then the error, then the control. */
export function FieldFrame({ label, hint, error, optional, labelUnseen, id, className, children }: FieldFrameProps) {
  const made = useId();
  const controlId = id ?? made;
  const hintId = `${controlId}-hint`;
  const errorId = `${controlId}-error`;
  const described = [hint === undefined ? null : hintId, error === undefined ? null : errorId].filter(
    (x) => x !== null,
  );
  return (
    <div className={`field ${className ?? ''}`} data-invalid={error === undefined ? undefined : 'yes'}>
      <label htmlFor={controlId} className={labelUnseen ? 'unseen' : undefined}>
        {label}
        {optional ? <span className="font-normal text-soft"> (optional)</span> : null}
      </label>
      {hint === undefined ? null : (
        <p id={hintId} className="field-hint">
          {hint}
        </p>
      )}
      {error === undefined ? null : (
        <p id={errorId} className="field-error">
          {error}
        </p>
      )}
      {children({
        id: controlId,
        'aria-describedby': described.length === 0 ? undefined : described.join(' '),
        'aria-invalid': error === undefined ? undefined : true,
      })}
    </div>
  );
}
