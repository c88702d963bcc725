import type { ReactNode } from 'react';

interface EmptyStateProps {
  readonly title: string;
  /** What this place is for, in a sentence or two. */
  readonly children: ReactNode;
  /** The one next step. */
  readonly action?: ReactNode;
}

/** A place with nothing in it yet: says what belongs here and offers the one next step. */
export function EmptyState({ title, children, action }: EmptyStateProps) {
  return (
    <div className="grid justify-items-start gap-3 border-y border-rule py-6">
      <p className="text-lead font-bold">{title}</p>
      <div className="max-w-[60ch] text-soft">{children}</div>
      {action}
    </div>
  );
}
