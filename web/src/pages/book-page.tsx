import { useParams } from 'react-router-dom';
import { LoadFailed } from '../components/load-failed.tsx';
import { Skeleton } from '../components/skeleton.tsx';
import { OpenPages } from '../book/open-pages.tsx';
import { BookProvider } from '../book/session/book-provider.tsx';
import { useOpenBook } from '../book/use-open-book.ts';
import { usePageTitle } from '../lib/page-title.ts';

/** The Book of a building. */
export function BookPage() {
  const { surveyId = '' } = useParams();
  const opening = useOpenBook(surveyId);
  usePageTitle(opening.state === 'open' ? opening.session.state.survey.building.name : 'The Book');
  switch (opening.state) {
    case 'opening':
      return (
        <div className="p-6">
          <Skeleton label="Opening the Book" />
        </div>
      );
    case 'failed':
      return (
        <div className="p-6">
          <LoadFailed what="The Book" error={opening.error} onRetry={opening.retry} />
        </div>
      );
    case 'open':
      return (
        <BookProvider session={opening.session}>
          <OpenPages sync={opening.sync} />
        </BookProvider>
      );
  }
}
