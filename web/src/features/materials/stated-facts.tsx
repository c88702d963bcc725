import type { MaterialDraft } from '@embertally/shared/materials/material-draft';
import { useUnits } from '../../lib/units-context.ts';
import { fieldsOf, valueOf } from './form/fields-of.ts';
import type { FieldSpec } from './form/field-spec.ts';
import { fieldTitle } from './form/read-draft.ts';
import { valuesOfDraft } from './form/values-of-draft.ts';
import { sectionsOf } from './form/ways/sections-of.ts';
import { displayUnit } from '@embertally/shared/units/display-unit';
import type { UnitSystem } from '@embertally/shared/units/unit-system';
import { findName } from './form/field-spec.ts';

interface StatedFactsProps {
  readonly draft: MaterialDraft;
  /** What a material of the catalogue is called. */
  readonly nameOf: (key: string) => string;
}

/** What the author stated, figure by figure, as it was typed. */
export function StatedFacts({ draft, nameOf }: StatedFactsProps) {
  const units = useUnits();
  const values = valuesOfDraft(draft, units, nameOf);
  const stated = fieldsOf(sectionsOf(draft.way), values).flatMap((field) => {
    const { name, spec } = field;
    if (name === 'label') return [];
    if (spec.as === 'choice' && spec.with !== undefined && (values[spec.with] ?? '') === '') return [];
    const text = spec.as === 'material' ? (values[findName(name)] ?? '') : valueOf(values, name, spec);
    return text === '' ? [] : [{ name, title: fieldTitle(field), text: shownText(spec, text, units) }];
  });
  return (
    <dl>
      {stated.map(({ name, title, text }) => (
        <div
          key={name}
          className="grid gap-x-4 border-b border-rule py-1.5 tablet:grid-cols-[minmax(0,1fr)_minmax(0,1.4fr)]"
        >
          <dt className="text-soft">{title}</dt>
          <dd className="break-words whitespace-pre-line">{text}</dd>
        </div>
      ))}
    </dl>
  );
}

function shownText(spec: FieldSpec, text: string, units: UnitSystem): string {
  switch (spec.as) {
    case 'choice':
      return spec.options.find(({ value }) => value === text)?.label ?? text;
    case 'yes-no':
      return text === 'yes' ? 'Yes' : 'No';
    case 'marks':
      return text.split(' ').join(', ');
    case 'number': {
      const symbol = (spec.own === true ? displayUnit(spec.unit, units)?.symbol : undefined) ?? spec.unit;
      return symbol === '' ? text : `${text} ${symbol}`;
    }
    case 'text':
    case 'words':
    case 'material':
      return text;
  }
}
