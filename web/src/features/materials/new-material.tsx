import type { MaterialWay } from '@embertally/shared/materials/material-draft';
import { useQueryClient } from '@tanstack/react-query';
import { Link, useNavigate } from 'react-router-dom';
import type { TrailStep } from '../../components/trail.tsx';
import type { CatalogueMaterial } from '../../lib/catalogue-materials.ts';
import { paths } from '../../lib/paths.ts';
import { makeMaterial } from './api/keep-version.ts';
import { useMaterialForm } from './form/use-material-form.ts';
import { MaterialFormPage } from './material-form-page.tsx';
import { WAY_WORDS } from './way-words.ts';

interface NewMaterialProps {
  readonly way: MaterialWay;
  readonly materials: readonly CatalogueMaterial[];
  readonly trail: readonly TrailStep[];
}

/** A material the catalogue does not have yet. What was typed stays when another way is chosen. */
export function NewMaterial({ way, materials, trail }: NewMaterialProps) {
  const client = useQueryClient();
  const navigate = useNavigate();
  const material = useMaterialForm({
    name: 'new-material',
    way,
    initial: {},
    materials,
    onSend: async (id, draft, evidence) => {
      const made = await makeMaterial(client, id, { draft, evidence });
      await navigate(paths.material(made.material_id), { replace: true });
    },
  });
  return (
    <MaterialFormPage
      title="New material"
      lead={
        <>
          {WAY_WORDS[way].title}. <Link to={paths.newMaterial()}>Its heat is known from something else</Link>
        </>
      }
      trail={trail}
      material={material}
      verb="Keep as a draft"
      next="A draft is changed as often as you like. When you put it forward it never changes again, and another member of your organisation approves it before anybody can place it."
    />
  );
}
