import type { FieldSection } from '../field-spec.ts';

export const COMPOSITION_FIELDS: readonly FieldSection[] = [
  {
    title: 'What it is made of',
    hint: 'Shares of its mass; with what does not burn they come to 100 %.',
    rows: { path: 'parts', noun: 'Part', start: 2, most: 20 },
    fields: [
      { as: 'material', path: 'material', version: 'version', label: 'Material' },
      { as: 'number', path: 'mass_pct', label: 'Share', unit: '%', minimum: 0, maximum: 100 },
    ],
  },
  {
    title: 'What does not burn',
    fields: [
      {
        as: 'number',
        path: 'inert_pct',
        label: 'Glass, filler, metal',
        unit: '%',
        minimum: 0,
        maximum: 100,
        optional: true,
      },
    ],
  },
];
