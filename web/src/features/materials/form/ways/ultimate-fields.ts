import type { FieldSection } from '../field-spec.ts';
import { elementFields } from './elements-fields.ts';
import { moistureFields } from './moisture-fields.ts';

export const ULTIMATE_FIELDS: readonly FieldSection[] = [
  {
    title: 'Elementary analysis',
    hint: 'Shares of the mass in percent.',
    fields: [
      {
        as: 'choice',
        path: 'of',
        label: 'The shares are of',
        start: 'dry',
        options: [
          { value: 'dry', label: 'the dry material' },
          { value: 'dry-ash-free', label: 'the dry material without its ash' },
          { value: 'as-received', label: 'the material as it lies there' },
        ],
      },
      ...elementFields,
      {
        as: 'choice',
        path: 'correlation',
        label: 'Correlation that estimates the heat',
        start: 'channiwala-parikh',
        options: [
          { value: 'channiwala-parikh', label: 'Channiwala and Parikh (solids, liquids, gases)' },
          { value: 'boie', label: 'Boie (solid and liquid fuels)' },
        ],
      },
      ...moistureFields('moisture', 'Water in the material as it lies there', 'Left empty: none.'),
    ],
  },
];
