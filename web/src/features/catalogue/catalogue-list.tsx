import type { UseQueryResult } from '@tanstack/react-query';
import type { ReactNode } from 'react';
import { Button } from '../../components/button.tsx';
import { EmptyState } from '../../components/empty-state.tsx';
import { LoadFailed } from '../../components/load-failed.tsx';
import { Skeleton } from '../../components/skeleton.tsx';
import { matches } from '../../lib/matches.ts';

interface Row {
  readonly label: string;
  readonly synonyms: readonly string[];
  readonly group: string;
  readonly hazards: readonly string[];
}

interface CatalogueListProps<R extends Row> {
  /** "materials" or "kinds". */
  readonly noun: string;
  readonly rows: UseQueryResult<{ readonly items: readonly R[] }>;
  readonly typed: string;
  /** Narrows further, as to one group; what fits is said of these alone. */
  readonly only?: ((row: R) => boolean) | undefined;
  readonly onShowAll: () => void;
  readonly children: (found: readonly R[]) => ReactNode;
}

/** One list of the catalogue in each of its states, narrowed by what is typed. */
export function CatalogueList<R extends Row>({ noun, rows, typed, only, onShowAll, children }: CatalogueListProps<R>) {
  if (rows.isPending) return <Skeleton label={`Reading the ${noun}`} lines={8} />;
  if (rows.isError) {
    return (
      <LoadFailed
        what={`The ${noun}`}
        error={rows.error}
        retrying={rows.isFetching}
        onRetry={() => void rows.refetch()}
      />
    );
  }
  const all = only === undefined ? rows.data.items : rows.data.items.filter(only);
  const found = matches(all, typed);
  return (
    <>
      <p role="status" className="mb-3 text-small text-soft">
        {found.length === all.length ? `${all.length} ${noun}` : `${found.length} of ${all.length} ${noun}`}
      </p>
      {found.length > 0 ? (
        children(found)
      ) : (
        <EmptyState
          title={all.length === 0 ? `There are no ${noun}` : `No ${noun} fit “${typed}”`}
          action={all.length === 0 ? undefined : <Button onClick={onShowAll}>Show all {noun}</Button>}
        >
          {all.length === 0
            ? 'The built-in catalogue is missing from this installation; tell whoever runs it.'
            : 'Try the beginning of another word: what it is made of, what it is called elsewhere, or its group.'}
        </EmptyState>
      )}
    </>
  );
}
