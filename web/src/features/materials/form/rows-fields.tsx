import { useRef } from 'react';
import { Button } from '../../../components/button.tsx';
import { countName, type FieldSection, type Values } from './field-spec.ts';
import { lineCount } from './fields-of.ts';
import { SpecField } from './spec-field.tsx';
import type { MaterialForm } from './use-material-form.ts';

interface RowsFieldsProps {
  readonly material: MaterialForm;
  readonly section: FieldSection & { readonly rows: NonNullable<FieldSection['rows']> };
}

/** A list of like lines: runs, parts. Each line has its name, and can be taken out while others stay. */
export function RowsFields({ material, section }: RowsFieldsProps) {
  const { form } = material;
  const { rows, fields } = section;
  const add = useRef<HTMLButtonElement>(null);
  const count = lineCount(form.values, rows);
  const ties = form.field(rows.path);
  return (
    <div id={ties.id} tabIndex={-1} role="group" aria-label={section.title} className="grid gap-4">
      {ties.error === undefined ? null : <p className="field-error">{ties.error}</p>}
      {Array.from({ length: count }, (_, index) => (
        <fieldset key={index} className="border-rule pt-3 not-first:border-t">
          <legend className="float-left w-full font-bold">
            {rows.noun} {index + 1}
          </legend>
          <div className="clear-both flex flex-wrap items-end gap-x-4 gap-y-3 pt-2">
            {fields.map((spec) => (
              <SpecField key={spec.path} material={material} spec={spec} name={`${rows.path}/${index}/${spec.path}`} />
            ))}
            {count > 1 ? (
              <Button
                look="quiet"
                aria-label={`Take out ${rows.noun.toLowerCase()} ${index + 1}`}
                onClick={() => {
                  form.fill(without(form.values, section, index, count));
                  add.current?.focus();
                }}
              >
                Take out
              </Button>
            ) : null}
          </div>
        </fieldset>
      ))}
      {count < rows.most ? (
        <div>
          <Button
            ref={add}
            size="small"
            onClick={() => {
              form.fill({ [countName(rows.path)]: String(count + 1) });
            }}
          >
            Add a {rows.noun.toLowerCase()}
          </Button>
        </div>
      ) : null}
    </div>
  );
}

/** The lines behind the one that goes move up by one. */
function without(values: Values, { rows }: RowsFieldsProps['section'], index: number, count: number): Values {
  const patch: Record<string, string> = { [countName(rows.path)]: String(count - 1) };
  const line = (number: number) => `${rows.path}/${number}/`;
  const inside = Object.keys(values).flatMap((name) => {
    const at = new RegExp(`^${rows.path}/\\d+/(.+)$`).exec(name);
    return at?.[1] === undefined ? [] : [at[1]];
  });
  for (const rest of new Set(inside)) {
    for (let here = index; here < count; here += 1) {
      patch[line(here) + rest] = here === count - 1 ? '' : (values[line(here + 1) + rest] ?? '');
    }
  }
  return patch;
}
