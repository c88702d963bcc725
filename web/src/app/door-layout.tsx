import { Outlet } from 'react-router-dom';
import { HeaderSlots } from '../components/header-slots.tsx';
import { LoadScale } from '../components/load-scale.tsx';
import { Mark } from '../components/mark.tsx';
import { RouteFocus } from './route-focus.tsx';

/** The screens before sign-in: the book lies open, what it is on the left page and the form on the right. */
export function DoorLayout() {
  return (
    <HeaderSlots>
      <a href="#page" className="unseen skip-link">
        Skip to the page
      </a>
      <RouteFocus />
      <div className="door">
        <header className="door-cover sheet">
          <div className="flex items-center gap-4">
            <Mark size={44} />
            <p className="text-display font-bold">Embertally</p>
          </div>
          <p className="mt-4 max-w-[30ch] text-lead wide:text-title">The fire-load book of a building</p>
          <div className="hidden tablet:block">
            <p className="mt-3 max-w-[46ch] text-soft">
              Draw the floor, record what burns, and read for every room how much heat is kept there, how fast it could
              come out, and how sure those numbers are.
            </p>
            <div className="mt-10">
              <LoadScale />
              <p className="mt-1 text-small text-soft">Bands of fire load density, in MJ/m² of floor</p>
            </div>
          </div>
        </header>
        <main id="page" tabIndex={-1} className="sheet">
          <Outlet />
        </main>
      </div>
    </HeaderSlots>
  );
}
