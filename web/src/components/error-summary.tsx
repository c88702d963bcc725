import { useEffect, useRef } from 'react';

export interface SummaryError {
  /** The id of the control to go to; null where the error belongs to no single field. */
  readonly fieldId: string | null;
  readonly message: string;
}

interface ErrorSummaryProps {
  readonly errors: readonly SummaryError[];
  /** Rises with every refused submit: the summary takes focus each time. */
  readonly attempt: number;
}

/** The list of everything wrong with a form, at its top. Takes focus and links to each field in the field's own words. */
export function ErrorSummary({ errors, attempt }: ErrorSummaryProps) {
  const summary = useRef<HTMLDivElement>(null);
  useEffect(() => {
    if (attempt > 0) summary.current?.focus();
  }, [attempt]);
  if (errors.length === 0) return null;
  return (
    <div ref={summary} tabIndex={-1} role="alert" className="error-summary">
      <h2 className="text-lead">There is a problem</h2>
      <ul className="grid gap-1">
        {errors.map((error) => (
          <li key={`${error.fieldId ?? ''} ${error.message}`}>
            {error.fieldId === null ? (
              <p>{error.message}</p>
            ) : (
              <a
                href={`#${error.fieldId}`}
                onClick={(event) => {
                  event.preventDefault();
                  document.getElementById(error.fieldId ?? '')?.focus();
                }}
              >
                {error.message}
              </a>
            )}
          </li>
        ))}
      </ul>
    </div>
  );
}
