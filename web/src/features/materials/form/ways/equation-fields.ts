import type { FieldSection } from '../field-spec.ts';

const asEquation = (values: Readonly<Record<string, string>>): boolean => values['heat/as'] !== 'mole';

export const EQUATION_FIELDS: readonly FieldSection[] = [
  {
    title: 'The heat as it is printed',
    fields: [
      {
        as: 'text',
        path: 'formula',
        label: 'Chemical formula of the fuel',
        hint: 'Of one mole, without the number in front: C8H18.',
        most: 200,
        width: 'medium',
      },
      {
        as: 'choice',
        path: 'heat/as',
        label: 'The heat belongs to',
        start: 'equation',
        options: [
          { value: 'equation', label: 'an equation as it is written' },
          { value: 'mole', label: 'one mole of the fuel' },
        ],
      },
      {
        as: 'number',
        path: 'heat/moles',
        label: 'Moles of fuel in the equation',
        hint: 'The number in front of the fuel: 2 in 2 C8H18 + 25 O2.',
        unit: 'mol',
        minimum: 0.0001,
        maximum: 10_000,
        when: asEquation,
      },
      {
        as: 'number',
        path: 'heat/enthalpy_kJ',
        label: 'Enthalpy of the equation',
        hint: 'For the whole equation, with its sign: negative, because heat leaves.',
        unit: 'kJ',
        minimum: -1e10,
        maximum: 1e10,
        when: asEquation,
      },
      {
        as: 'text',
        path: 'heat/text',
        label: 'The equation itself',
        hint: 'If you write it down, it is balanced and checked: 2 C8H18 + 25 O2 = 16 CO2 + 18 H2O.',
        most: 500,
        optional: true,
        when: asEquation,
      },
      {
        as: 'number',
        path: 'heat/heat_kJ_mol',
        label: 'Heat of one mole',
        hint: 'A positive number.',
        unit: 'kJ/mol',
        minimum: 0.001,
        maximum: 1e9,
        when: (values) => !asEquation(values),
      },
      {
        as: 'choice',
        path: 'water',
        label: 'The water that forms is',
        hint: 'Vapour gives the net heat, liquid the gross.',
        start: 'vapour',
        options: [
          { value: 'vapour', label: 'vapour' },
          { value: 'liquid', label: 'liquid' },
        ],
      },
    ],
  },
];
