import type { ReactNode } from 'react';

/** Fields that belong together, under their heading. */
export function FieldGroup({ title, children }: { readonly title: string; readonly children: ReactNode }) {
  return (
    <fieldset className="field-group">
      <legend>{title}</legend>
      <div className="field-group-fields">{children}</div>
    </fieldset>
  );
}
