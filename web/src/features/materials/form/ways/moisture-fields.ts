import type { FieldSpec, Values } from '../field-spec.ts';

/** Water in the material, and what it is a percentage of: the two ways of saying it differ much in wet goods. */
export function moistureFields(
  at: string,
  label: string,
  hint: string,
  when?: (values: Values) => boolean,
): readonly FieldSpec[] {
  const shown = when === undefined ? {} : { when };
  return [
    { as: 'number', path: `${at}/pct`, label, hint, unit: '%', minimum: 0, maximum: 1000, optional: true, ...shown },
    {
      as: 'choice',
      path: `${at}/per`,
      label: 'A percentage of',
      start: 'wet',
      with: `${at}/pct`,
      options: [
        { value: 'wet', label: 'the wet mass (laboratories)' },
        { value: 'dry', label: 'the dry mass (the timber trade)' },
      ],
      ...shown,
    },
  ];
}
