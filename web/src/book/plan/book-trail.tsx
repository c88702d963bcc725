import { Link } from 'react-router-dom';
import { paths } from '../../lib/paths.ts';
import { useBook } from '../session/use-book.ts';
import { StoreyPicker } from './storey-picker.tsx';

/** Site, building and the storey that lies open. */
export function BookTrail() {
  const survey = useBook((state) => state.survey);
  return (
    <nav aria-label="Where you are" className="book-trail text-soft">
      <Link
        to={paths.site(survey.site.id)}
        className="book-trail-name text-soft no-underline hover:text-ink hover:underline"
      >
        {survey.site.name}
      </Link>
      <span aria-hidden="true">/</span>
      <span className="book-trail-name">{survey.building.name}</span>
      <span aria-hidden="true">/</span>
      <StoreyPicker />
    </nav>
  );
}
