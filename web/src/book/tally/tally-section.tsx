import { type ReactNode, useId } from 'react';

interface TallySectionProps {
  readonly title: string;
  /** Stands at the right end of the heading's line. */
  readonly action?: ReactNode;
  readonly children: ReactNode;
}

/** One step of the tally's argument. */
export function TallySection({ title, action, children }: TallySectionProps) {
  const heading = useId();
  return (
    <section aria-labelledby={heading} className="mt-6">
      <div className="mb-2 flex flex-wrap items-baseline justify-between gap-x-4">
        <h3 id={heading} className="text-body font-bold">
          {title}
        </h3>
        {action}
      </div>
      {children}
    </section>
  );
}
