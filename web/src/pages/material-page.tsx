import { useQuery } from '@tanstack/react-query';
import { useParams, useSearchParams } from 'react-router-dom';
import { EmptyState } from '../components/empty-state.tsx';
import { LinkButton } from '../components/link-button.tsx';
import { LoadFailed } from '../components/load-failed.tsx';
import { Page } from '../components/page.tsx';
import { Skeleton } from '../components/skeleton.tsx';
import { ownMaterialQuery } from '../features/materials/api/own-material.ts';
import { BuiltInView } from '../features/materials/built-in-view.tsx';
import { OwnMaterialView } from '../features/materials/own-material-view.tsx';
import { NotFoundError } from '../lib/api-errors.ts';
import { materialsQuery } from '../lib/catalogue-materials.ts';
import { paths } from '../lib/paths.ts';

const TRAIL = [{ label: 'Catalogue', to: paths.catalogue() }];
/** An own material goes by an id made for it; a built-in one by a word. */
const ID = /^[0-9a-f]{8}-(?:[0-9a-f]{4}-){3}[0-9a-f]{12}$/i;

/** One material: a built-in one, or one of the organisation's own with its versions. */
export function MaterialPage() {
  const { materialId = '' } = useParams();
  const [url] = useSearchParams();
  const isOwn = ID.test(materialId);
  const materials = useQuery(materialsQuery());
  const own = useQuery({ ...ownMaterialQuery(materialId), enabled: isOwn });
  const read = isOwn ? own : materials;
  const items = materials.data?.items ?? [];

  if (read.isPending || (isOwn && materials.isPending)) {
    return (
      <Page title="Material" trail={TRAIL}>
        <Skeleton label="Reading the material" />
      </Page>
    );
  }
  if (read.isError && !(read.error instanceof NotFoundError)) {
    return (
      <Page title="Material" trail={TRAIL}>
        <LoadFailed
          what="The material"
          error={read.error}
          retrying={read.isFetching}
          onRetry={() => void read.refetch()}
        />
      </Page>
    );
  }
  if (own.data !== undefined && isOwn) {
    const asked = Number(url.get('version'));
    const there = own.data.versions.some(({ version }) => version === asked);
    const version = there ? asked : own.data.versions[0]?.version;
    if (version !== undefined) {
      return (
        <OwnMaterialView key={own.data.id} material={own.data} version={version} materials={items} trail={TRAIL} />
      );
    }
  }
  const builtIn = isOwn ? undefined : items.find(({ key }) => key === materialId);
  if (builtIn !== undefined) return <BuiltInView material={builtIn} trail={TRAIL} />;
  return (
    <Page title="There is no such material" trail={TRAIL}>
      <EmptyState
        title="Nothing to show"
        action={
          <LinkButton look="primary" to={paths.catalogue()}>
            Go to the catalogue
          </LinkButton>
        }
      >
        The address may be mistyped, or the material belongs to another organisation.
      </EmptyState>
    </Page>
  );
}
