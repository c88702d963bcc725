import type { ReactNode } from 'react';

interface AnswerBoxProps {
  readonly isStale: boolean;
  readonly children: ReactNode;
}

/** Where an answer appears; said aloud when it does. A changed room is told, the old answer kept for comparison. */
export function AnswerBox({ isStale, children }: AnswerBoxProps) {
  return (
    <div role="status" className="mt-3 grid gap-1 border-l-3 border-ink pl-3">
      {isStale && <p className="text-ochre">The room has changed since this was asked. Ask again.</p>}
      {children}
    </div>
  );
}
