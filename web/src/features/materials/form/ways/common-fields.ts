import type { FieldSection, FieldSpec } from '../field-spec.ts';

const titled = (value: string) => ({ value, label: value.charAt(0).toUpperCase() + value.slice(1) });

export const NAME_FIELDS: FieldSection = {
  title: 'What it is',
  fields: [
    {
      as: 'text',
      path: 'label',
      label: 'Name of the material',
      hint: 'As it will stand in the catalogue and in the contents.',
      most: 200,
    },
    {
      as: 'choice',
      path: 'group',
      label: 'Group',
      optional: true,
      start: '',
      options: [
        { value: '', label: 'None of these' },
        ...[
          'wood and board',
          'paper',
          'textiles',
          'food',
          'carbon',
          'plastics',
          'foams',
          'rubber',
          'liquids',
          'gases',
          'chemicals',
          'products',
        ].map(titled),
      ],
    },
    {
      as: 'text',
      path: 'source',
      label: 'Where the figures come from',
      hint: 'The report and its number, the table and page, or the sheet and its date.',
      most: 500,
      lines: 'several',
    },
  ],
};

const HAZARDS = [
  'liquid',
  'gas',
  'aerosol',
  'battery',
  'dust',
  'oxidiser',
  'water-reactive',
  'foam',
  'smouldering',
].map(titled);

const HOW_IT_BURNS: readonly FieldSpec[] = [
  {
    as: 'yes-no',
    path: 'cellulosic',
    label: 'Mainly wood, paper, cotton or their like',
    hint: 'If so, its combustion factor is 0.8 (EN 1991-1-2, E.3); otherwise 1.',
    optional: true,
  },
  {
    as: 'choice',
    path: 'ignition_class',
    label: 'Takes fire',
    optional: true,
    start: '',
    options: [
      { value: '', label: 'Not said' },
      { value: 'easy', label: 'Easily: thin, loose or foamed' },
      { value: 'normal', label: 'Normally: boards, bundles, goods' },
      { value: 'hard', label: 'Hardly: thick or dense' },
      { value: 'resistant', label: 'Only in a strong fire' },
    ],
  },
  {
    as: 'number',
    path: 'radiative_fraction',
    label: 'Share of its heat that it radiates',
    hint: 'Between 0 and 0.8; most goods have 0.3 to 0.4.',
    unit: '',
    minimum: 0,
    maximum: 0.8,
    optional: true,
  },
  {
    as: 'number',
    path: 'soot_yield',
    label: 'Soot',
    hint: 'kg of soot per kg burnt, well ventilated.',
    unit: 'kg/kg',
    minimum: 0,
    maximum: 1,
    optional: true,
  },
  {
    as: 'number',
    path: 'co_yield',
    label: 'Carbon monoxide',
    hint: 'kg per kg burnt, well ventilated.',
    unit: 'kg/kg',
    minimum: 0,
    maximum: 1,
    optional: true,
  },
  {
    as: 'number',
    path: 'density_kg_m3',
    label: 'Density as it is kept',
    unit: 'kg/m3',
    own: true,
    minimum: 0.1,
    maximum: 25_000,
    optional: true,
    // A heat per litre or m³ asks for it where the heat stands.
    when: ({ way, per }) => way !== 'supplier' || per === undefined || per === 'kg',
  },
];

export const MORE_FIELDS: FieldSection = {
  title: 'How it burns, and other words for it',
  hint: 'None of this is needed for its heat; smoke, spread and the catalogue’s search use it.',
  folded: true,
  fields: [
    ...HOW_IT_BURNS,
    { as: 'marks', path: 'hazards', label: 'What to know before touching it', options: HAZARDS, optional: true },
    {
      as: 'words',
      path: 'synonyms',
      label: 'Other words for it',
      hint: 'With commas between.',
      most: 80,
      optional: true,
    },
    { as: 'text', path: 'note', label: 'Note', most: 10_000, lines: 'several', optional: true },
  ],
};
