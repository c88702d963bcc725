import { useQuery } from '@tanstack/react-query';
import { useSearchParams } from 'react-router-dom';
import { LoadFailed } from '../components/load-failed.tsx';
import { Page } from '../components/page.tsx';
import { Skeleton } from '../components/skeleton.tsx';
import { NextVersion } from '../features/materials/next-version.tsx';
import { NewMaterial } from '../features/materials/new-material.tsx';
import { WayChoice } from '../features/materials/way-choice.tsx';
import { isWay } from '../features/materials/way-words.ts';
import { materialsQuery } from '../lib/catalogue-materials.ts';
import { paths } from '../lib/paths.ts';

const TRAIL = [{ label: 'Catalogue', to: paths.catalogue() }];

/** A new material, or the next version of one: what its heat is known from, then what is known. */
export function NewMaterialPage() {
  const [url] = useSearchParams();
  const way = url.get('way');
  const of = url.get('of');
  const materials = useQuery(materialsQuery());
  const title = of === null ? 'New material' : 'New version';

  if (of === null && !isWay(way)) {
    return (
      <Page title={title} lead="What is its heat known from?" trail={TRAIL}>
        <WayChoice />
      </Page>
    );
  }
  if (materials.isPending) {
    return (
      <Page title={title} trail={TRAIL}>
        <Skeleton label="Reading the catalogue" />
      </Page>
    );
  }
  if (materials.isError) {
    return (
      <Page title={title} trail={TRAIL}>
        <LoadFailed
          what="The catalogue"
          error={materials.error}
          retrying={materials.isFetching}
          onRetry={() => void materials.refetch()}
        />
      </Page>
    );
  }
  const { items } = materials.data;
  if (of !== null) {
    const edited = url.get('edit');
    const version = Number(edited ?? url.get('from'));
    return (
      <NextVersion
        key={`${of} ${version} ${String(edited !== null)}`}
        materialId={of}
        version={version}
        edits={edited !== null}
        materials={items}
        trail={TRAIL}
      />
    );
  }
  return isWay(way) ? <NewMaterial key={way} way={way} materials={items} trail={TRAIL} /> : null;
}
