import type { ReactNode } from 'react';
import { usePageTitle } from '../lib/page-title.ts';
import { Trail, type TrailStep } from './trail.tsx';

interface PageProps {
  readonly title: string;
  /** One sentence under the title. */
  readonly lead?: ReactNode;
  /** What can be done here: the first is the most likely. */
  readonly actions?: ReactNode;
  readonly trail?: readonly TrailStep[];
  readonly children: ReactNode;
  /** A second page that lies open to the right of the first. */
  readonly right?: ReactNode;
}

/**
 * A page of the book with its heading. The heading stays the same element while the page goes from reading to ready, so
 * focus that was put on it is never lost.
 */
export function Page({ title, lead, actions, trail, children, right }: PageProps) {
  usePageTitle(title);
  return (
    <div className="spread" data-pages={right === undefined ? 1 : 2}>
      <div className="sheet">
        {trail === undefined ? null : <Trail steps={trail} here={title} />}
        <header className="mb-6 flex flex-wrap items-start justify-between gap-x-6 gap-y-3">
          <div className="min-w-0">
            <h1 tabIndex={-1} className="text-display">
              {title}
            </h1>
            {lead === undefined ? null : <div className="mt-1 max-w-[68ch] text-soft">{lead}</div>}
          </div>
          {actions === undefined ? null : <div className="flex flex-wrap gap-3">{actions}</div>}
        </header>
        {children}
      </div>
      {right === undefined ? null : <div className="sheet">{right}</div>}
    </div>
  );
}
