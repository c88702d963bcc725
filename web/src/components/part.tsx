import { useId, type ReactNode } from 'react';

interface PartProps {
  readonly title: string;
  /** Stands at the end of the heading's line. */
  readonly action?: ReactNode;
  readonly children: ReactNode;
}

/** A part of a page under its own ruled heading. */
export function Part({ title, action, children }: PartProps) {
  const id = useId();
  return (
    <section aria-labelledby={id} className="mb-8 last:mb-0">
      <div className="part-heading">
        <h2 id={id} className="text-lead">
          {title}
        </h2>
        {action}
      </div>
      {children}
    </section>
  );
}
