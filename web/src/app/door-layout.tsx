import { Outlet } from 'react-router-dom';
import { HeaderSlots } from '../components/header-slots.tsx';
import { Mark } from '../components/mark.tsx';
import { RouteFocus } from './route-focus.tsx';

/** The screens before sign-in: the cover of the book on the left, the form on the right page. */
export function DoorLayout() {
  return (
    <HeaderSlots>
      <a href="#page" className="unseen skip-link">
        Skip to the page
      </a>
      <RouteFocus />
      <div className="mx-auto grid min-h-dvh w-full max-w-[76rem] content-center wide:grid-cols-[1fr_1fr] wide:p-6">
        <div className="grid content-start gap-4 px-4 pt-8 pb-6 tablet:px-10 wide:content-center wide:py-16">
          <div className="flex items-center gap-4">
            <Mark size={44} />
            <p className="text-display font-bold">Embertally</p>
          </div>
          <p className="max-w-[34ch] text-lead wide:text-title">The fire-load book of a building.</p>
          <p className="hidden max-w-[46ch] text-soft tablet:block">
            Draw the floor, record what burns, and read for every room how much heat is kept there, how fast it could
            come out, and how sure those numbers are.
          </p>
        </div>
        <main id="page" tabIndex={-1} className="door-page sheet">
          <Outlet />
        </main>
      </div>
    </HeaderSlots>
  );
}
