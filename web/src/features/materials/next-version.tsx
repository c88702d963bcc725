import { useQuery, useQueryClient } from '@tanstack/react-query';
import { useNavigate } from 'react-router-dom';
import { LoadFailed } from '../../components/load-failed.tsx';
import { Page } from '../../components/page.tsx';
import { Skeleton } from '../../components/skeleton.tsx';
import type { TrailStep } from '../../components/trail.tsx';
import { StaleError } from '../../lib/api-errors.ts';
import type { CatalogueMaterial } from '../../lib/catalogue-materials.ts';
import { paths } from '../../lib/paths.ts';
import { ToldError } from '../../lib/told-error.ts';
import { useUnits } from '../../lib/units-context.ts';
import { changeVersion, makeVersion } from './api/keep-version.ts';
import { materialVersionQuery, type OwnMaterialVersion } from './api/material-version.ts';
import { valuesOfVersion } from './form/values-of-version.ts';
import { useMaterialForm } from './form/use-material-form.ts';
import { MaterialFormPage } from './material-form-page.tsx';
import { WAY_WORDS } from './way-words.ts';

interface NextVersionProps {
  readonly materialId: string;
  readonly version: number;
  /** The version is one's own draft and is changed; otherwise the next version begins from it. */
  readonly edits: boolean;
  readonly materials: readonly CatalogueMaterial[];
  readonly trail: readonly TrailStep[];
}

/** The next version of a material, begun from what was stated before. */
export function NextVersion(props: NextVersionProps) {
  const { materialId, version, edits, trail } = props;
  const title = edits ? 'Change the draft' : 'New version';
  const before = useQuery({ ...materialVersionQuery(materialId, version), staleTime: Infinity });
  if (before.isPending) {
    return (
      <Page title={title} trail={trail}>
        <Skeleton label="Reading what was stated before" />
      </Page>
    );
  }
  if (before.isError) {
    return (
      <Page title={title} trail={trail}>
        <LoadFailed
          what="The version before"
          error={before.error}
          retrying={before.isFetching}
          onRetry={() => void before.refetch()}
        />
      </Page>
    );
  }
  return <NextVersionForm {...props} title={title} before={before.data} />;
}

interface NextVersionFormProps extends NextVersionProps {
  readonly title: string;
  readonly before: OwnMaterialVersion;
}

function NextVersionForm({ materialId, before, edits, materials, trail, title }: NextVersionFormProps) {
  const client = useQueryClient();
  const navigate = useNavigate();
  const units = useUnits();
  const { way } = before.draft;
  const material = useMaterialForm({
    name: `${edits ? 'change' : 'next'}-version-${materialId}-${before.version}`,
    way,
    initial: valuesOfVersion(before, units, (key) => materials.find((row) => row.key === key)?.label ?? key),
    materials,
    onSend: async (id, draft, evidence) => {
      const stated = { draft, evidence };
      const kept = edits
        ? await changeVersion(client, before, stated).catch((error: unknown) => staleTold(error))
        : await makeVersion(client, materialId, id, stated);
      await navigate(paths.material(materialId, kept.version), { replace: true });
    },
  });
  return (
    <MaterialFormPage
      title={title}
      lead={`${before.label}, ${edits ? '' : 'begun from '}version ${before.version}. ${WAY_WORDS[way].title}.`}
      trail={[...trail, { label: before.label, to: paths.material(materialId) }]}
      material={material}
      verb={edits ? 'Save the draft' : 'Keep as a draft'}
      next="Entries keep the version they were tallied with until somebody takes the newer one."
    />
  );
}

function staleTold(error: unknown): never {
  if (!(error instanceof StaleError)) throw error;
  throw new ToldError(
    'This draft was changed in another window while you were typing. What you typed is kept; open the material to see the other change.',
    { cause: error },
  );
}
