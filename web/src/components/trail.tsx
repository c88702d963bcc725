import { Link } from 'react-router-dom';
import { HeaderSlot } from './header-slots.tsx';

export interface TrailStep {
  readonly label: string;
  readonly to: string;
}

interface TrailProps {
  /** From the outermost place inwards, without the place we are at. */
  readonly steps: readonly TrailStep[];
  readonly here: string;
}

/** The way from the sites down to this place, in the header. */
export function Trail({ steps, here }: TrailProps) {
  return (
    <HeaderSlot name="trail">
      <nav aria-label="Where you are">
        <ol className="flex min-w-0 flex-wrap items-baseline gap-x-2">
          {steps.map((step) => (
            <li key={step.to} className="flex items-baseline gap-x-2 text-soft">
              <Link to={step.to} className="inline-block py-1 text-soft no-underline hover:text-ink hover:underline">
                {step.label}
              </Link>
              <span aria-hidden="true">/</span>
            </li>
          ))}
          <li aria-current="page" className="py-1 font-bold">
            {here}
          </li>
        </ol>
      </nav>
    </HeaderSlot>
  );
}
