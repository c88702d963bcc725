import { useQuery } from '@tanstack/react-query';
import { EmptyState } from '../components/empty-state.tsx';
import { LoadFailed } from '../components/load-failed.tsx';
import { LinkButton } from '../components/link-button.tsx';
import { Page } from '../components/page.tsx';
import { Skeleton } from '../components/skeleton.tsx';
import { cautionsQuery } from '../features/cautions/api/cautions.ts';
import { paths } from '../lib/paths.ts';

export function CautionsPage() {
  const cautions = useQuery(cautionsQuery());
  return (
    <Page
      title="Cautions"
      lead="Results here are planning estimates. These notices stand with them on every screen, report and export; none of them replaces the local fire code, the authority having jurisdiction or licensed practice."
      actions={<LinkButton to={paths.methods()}>All methods</LinkButton>}
    >
      {cautions.isPending ? (
        <Skeleton label="Reading the cautions" lines={8} />
      ) : cautions.isError ? (
        <LoadFailed
          what="The cautions"
          error={cautions.error}
          retrying={cautions.isFetching}
          onRetry={() => void cautions.refetch()}
        />
      ) : cautions.data.items.length === 0 ? (
        <EmptyState title="No caution is shown">
          That is not right: every result here stands under cautions. Do not rely on results until they are back, and
          tell us.
        </EmptyState>
      ) : (
        <ol className="grid border-t-2 border-ink">
          {cautions.data.items.map((caution, index) => (
            <li
              key={caution.id}
              id={caution.id}
              className="grid gap-x-6 gap-y-1 border-b border-rule py-5 tablet:grid-cols-[2rem_minmax(0,16rem)_minmax(0,1fr)]"
            >
              <span aria-hidden="true" className="figure hidden text-lead text-soft tablet:block">
                {index + 1}
              </span>
              <h2 className="text-lead">{caution.title}</h2>
              <p className="max-w-[68ch]">{caution.text}</p>
            </li>
          ))}
        </ol>
      )}
    </Page>
  );
}
