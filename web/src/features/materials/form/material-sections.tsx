import { Disclosure } from '../../../components/disclosure.tsx';
import { Part } from '../../../components/part.tsx';
import type { FieldSection } from './field-spec.ts';
import { RowsFields } from './rows-fields.tsx';
import { SpecField } from './spec-field.tsx';
import type { MaterialForm } from './use-material-form.ts';

interface MaterialSectionsProps {
  readonly material: MaterialForm;
  readonly sections: readonly FieldSection[];
}

/** The parts of the form, each under its heading; what is rarely needed is folded away. */
export function MaterialSections({ material, sections }: MaterialSectionsProps) {
  const values = { ...material.form.values, way: material.way };
  return sections
    .filter((section) => section.when?.(values) !== false)
    .map((section) => {
      const { rows, title, hint } = section;
      const body = (
        <div className="grid gap-5 pt-4">
          {hint === undefined ? null : <p className="max-w-[60ch] text-soft">{hint}</p>}
          {rows === undefined ? (
            section.fields
              .filter((spec) => spec.when?.(values) !== false)
              .map((spec) => <SpecField key={spec.path} material={material} spec={spec} name={spec.path} />)
          ) : (
            <RowsFields material={material} section={{ ...section, rows }} />
          )}
        </div>
      );
      return section.folded === true ? (
        <Disclosure key={title} title={title} open={hasErrorInside(material, section)}>
          {body}
        </Disclosure>
      ) : (
        <Part key={title} title={title}>
          {body}
        </Part>
      );
    });
}

/** A fault must not hide in a fold. */
function hasErrorInside({ form }: MaterialForm, section: FieldSection): boolean {
  return section.fields.some(({ path }) => form.field(path).error !== undefined);
}
