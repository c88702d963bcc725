import { lazy, Suspense } from 'react';
import { Skeleton } from '../../components/skeleton.tsx';

const TablesPage = lazy(() => import('./tables-page.tsx').then((module) => ({ default: module.TablesPage })));

/** The left page while it shows the tables; they and the catalogue they search come when they are first asked for. */
export function TablesLeftPage() {
  return (
    <Suspense
      fallback={
        <div className="p-6">
          <Skeleton label="Opening the tables" />
        </div>
      }
    >
      <TablesPage />
    </Suspense>
  );
}
