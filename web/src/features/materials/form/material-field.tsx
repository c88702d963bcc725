import { formatQuantity } from '@embertally/shared/units/format-quantity';
import { Combobox } from '../../../components/combobox.tsx';
import type { CatalogueMaterial } from '../../../lib/catalogue-materials.ts';
import { matches } from '../../../lib/matches.ts';
import { useUnits } from '../../../lib/units-context.ts';
import { findName, type MaterialSpec } from './field-spec.ts';
import type { MaterialForm } from './use-material-form.ts';

interface MaterialFieldProps {
  readonly material: MaterialForm;
  readonly spec: MaterialSpec;
  readonly name: string;
}

const MOST = 12;

/** A material of the catalogue: type two letters, choose. */
export function MaterialField({ material: { form, materials }, spec, name }: MaterialFieldProps) {
  const units = useUnits();
  const typed = form.values[findName(name)] ?? '';
  const ties = form.field(name);
  const version = spec.version === undefined ? null : name.replace(/[^/]+$/, spec.version);
  const offered = version === null ? materials.filter((row) => row.own === null) : materials;
  const found = typed.trim() === '' ? [] : matches(offered, typed).slice(0, MOST);
  const item = (row: CatalogueMaterial) => {
    const heat = formatQuantity(row.net_heat_MJ_kg, 'MJ/kg', units);
    return {
      id: row.key,
      label: row.label,
      detail: `${row.own === null ? row.group : `own, version ${row.own.version}`} · ${heat.text} ${heat.unit}`,
    };
  };
  return (
    <div className="w-full max-w-96">
      <Combobox
        id={ties.id}
        label={spec.label}
        hint={spec.hint}
        error={ties.error}
        optional={spec.optional}
        value={typed}
        onChange={(text) => {
          // What was chosen stands only while its name does.
          form.fill({ [findName(name)]: text, [name]: '', ...(version === null ? {} : { [version]: '' }) });
        }}
        items={found.map(item)}
        nothing={typed === '' ? 'Type two letters: pa, cotton, foam' : 'No material answers to that.'}
        onPick={({ id }) => {
          const row = offered.find(({ key }) => key === id);
          if (row === undefined) return;
          form.fill({
            [findName(name)]: row.label,
            [name]: row.key,
            ...(version === null ? {} : { [version]: row.own === null ? '' : String(row.own.version) }),
          });
        }}
      />
    </div>
  );
}
