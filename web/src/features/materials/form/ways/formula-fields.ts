import type { FieldSection } from '../field-spec.ts';

export const FORMULA_FIELDS: readonly FieldSection[] = [
  {
    title: 'The substance',
    fields: [
      {
        as: 'text',
        path: 'formula',
        label: 'Chemical formula',
        hint: 'Of one mole: C8H18, C6H12O6, (C2H4)n or a mean one such as CH1.44O0.66.',
        most: 200,
        width: 'medium',
      },
      {
        as: 'number',
        path: 'formation_kJ_mol',
        label: 'Enthalpy of formation at 25 °C',
        hint: 'Negative for most substances, as tables print it: −250.1 for liquid octane.',
        unit: 'kJ/mol',
        minimum: -1_000_000,
        maximum: 1_000_000,
      },
      {
        as: 'choice',
        path: 'phase',
        label: 'That enthalpy is for the',
        start: 'liquid',
        options: [
          { value: 'liquid', label: 'liquid' },
          { value: 'solid', label: 'solid' },
          { value: 'gas', label: 'gas' },
        ],
      },
    ],
  },
];
