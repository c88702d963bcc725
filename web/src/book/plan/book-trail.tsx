import { Link } from 'react-router-dom';
import { paths } from '../../lib/paths.ts';
import { useBook } from '../session/use-book.ts';
import { StoreyPicker } from './storey-picker.tsx';

/** Site, building and the storey that lies open. */
export function BookTrail() {
  const survey = useBook((state) => state.survey);
  return (
    <nav aria-label="Where you are" className="flex min-w-0 flex-wrap items-center gap-x-2 text-soft">
      <Link to={paths.site(survey.site.id)} className="text-soft no-underline hover:text-ink hover:underline">
        {survey.site.name}
      </Link>
      <span aria-hidden="true">/</span>
      <span>{survey.building.name}</span>
      <span aria-hidden="true">/</span>
      <StoreyPicker />
    </nav>
  );
}
