import type { ReactNode } from 'react';
import { Link } from 'react-router-dom';
import { HeaderSlotTarget } from '../components/header-slots.tsx';
import { Mark } from '../components/mark.tsx';
import { paths } from '../lib/paths.ts';

/** The line above every page: the mark, where we are, what the page has to say, and the person. */
export function AppHeader({ person }: { readonly person?: ReactNode }) {
  return (
    <header className="not-on-paper flex min-h-14 flex-wrap items-center gap-x-5 gap-y-1 px-4 py-1.5 tablet:px-6">
      <Link
        to={paths.today()}
        className="flex min-h-11 items-center gap-2.5 text-lead font-bold text-ink no-underline hover:no-underline"
      >
        <Mark size={24} />
        Embertally
      </Link>
      <HeaderSlotTarget
        name="trail"
        className="order-last min-w-0 flex-1 basis-full text-small tablet:order-none tablet:basis-0 tablet:text-body"
      />
      <div className="ml-auto flex items-center gap-3">
        <HeaderSlotTarget name="actions" className="flex items-center gap-3" />
        {person}
      </div>
    </header>
  );
}
