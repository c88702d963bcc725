import { lazy, Suspense } from 'react';
import { Skeleton } from '../components/skeleton.tsx';
import { Book } from './book.tsx';
import { TablesLeftPage } from './panels/tables-left-page.tsx';
import { TablesProvider } from './panels/tables-provider.tsx';
import { useBookSession } from './session/use-book-session.ts';
import type { SurveySync } from './sync/survey-sync.ts';

// The plan can be drawn on before the pages beside it are here.
const TallyPage = lazy(async () => ({ default: (await import('./tally/tally-page.tsx')).TallyPage }));
const ThumbIndex = lazy(async () => ({ default: (await import('./tally/thumb-index.tsx')).ThumbIndex }));
const RoomsList = lazy(async () => ({ default: (await import('./tally/rooms-list.tsx')).RoomsList }));

/** The Book with all its pages. */
export function OpenPages({ sync }: { readonly sync: SurveySync }) {
  const session = useBookSession();
  return (
    <TablesProvider>
      <Book
        sync={sync}
        tally={
          <Suspense fallback={<Skeleton label="Opening the tally" lines={8} />}>
            <TallyPage />
          </Suspense>
        }
        index={
          <Suspense fallback={null}>
            <ThumbIndex />
          </Suspense>
        }
        rooms={
          <Suspense fallback={<Skeleton label="Opening the list of rooms" lines={8} />}>
            <RoomsList
              onChosen={(kind) => {
                session.turnTo(kind === 'room' ? 'tally' : 'plan');
              }}
            />
          </Suspense>
        }
        tables={<TablesLeftPage />}
      />
    </TablesProvider>
  );
}
