import type { FieldSection, FieldSpec, Values } from '../field-spec.ts';
import { elementFields } from './elements-fields.ts';
import { moistureFields } from './moisture-fields.ts';

const GRAM = 1e-3;
const JOULE = 1e-6;
const byRuns = (values: Values): boolean => values['calibration/by'] !== 'given';
const hydrogenBy =
  (way: string) =>
  (values: Values): boolean =>
    (values['hydrogen/by'] ?? 'content') === way;

const MASS: FieldSpec = {
  as: 'number',
  path: 'mass_kg',
  label: 'Mass',
  unit: 'g',
  factor: GRAM,
  minimum: 0.001,
  maximum: 100,
};
const FUSE: FieldSpec = {
  as: 'number',
  path: 'fuse_MJ',
  label: 'Fuse and thread',
  unit: 'J',
  factor: JOULE,
  minimum: 0,
  maximum: 10_000,
};
const ACID: FieldSpec = {
  as: 'number',
  path: 'acid_MJ',
  label: 'Acids formed',
  unit: 'J',
  factor: JOULE,
  minimum: 0,
  maximum: 10_000,
  optional: true,
};

export const BOMB_FIELDS: readonly FieldSection[] = [
  {
    title: 'The calorimeter',
    hint: 'Its water equivalent says how much heat one kelvin stands for.',
    fields: [
      {
        as: 'choice',
        path: 'calibration/by',
        label: 'The water equivalent is',
        start: 'runs',
        options: [
          { value: 'runs', label: 'found from runs with benzoic acid' },
          { value: 'given', label: 'given in the report' },
        ],
      },
      {
        as: 'number',
        path: 'calibration/water_equivalent_MJ_K',
        label: 'Water equivalent',
        unit: 'kJ/K',
        factor: 1e-3,
        minimum: 0.001,
        maximum: 1000,
        when: (values) => !byRuns(values),
      },
      {
        as: 'number',
        path: 'calibration/benzoic_MJ_kg',
        label: 'Certified heat of the benzoic acid',
        hint: 'Left empty: 26.434 MJ/kg.',
        unit: 'MJ/kg',
        minimum: 26.38,
        maximum: 26.48,
        optional: true,
        when: byRuns,
      },
    ],
  },
  {
    title: 'Runs with benzoic acid',
    when: byRuns,
    rows: { path: 'calibration/runs', noun: 'Calibration', start: 1, most: 50 },
    fields: [
      MASS,
      { as: 'number', path: 'rise_K', label: 'Temperature rise', unit: 'K', minimum: 0.001, maximum: 20 },
      FUSE,
      ACID,
    ],
  },
  {
    title: 'Runs with the material',
    hint: 'Three at least. A run is left out only by somebody who says why.',
    rows: { path: 'runs', noun: 'Run', start: 3, most: 50 },
    fields: [
      MASS,
      { as: 'number', path: 'rise_K', label: 'Temperature rise', unit: 'K', minimum: -20, maximum: 20 },
      FUSE,
      ACID,
      {
        as: 'number',
        path: 'aid_kg',
        label: 'Benzoic acid added',
        unit: 'g',
        factor: GRAM,
        minimum: 0,
        maximum: 100,
        optional: true,
      },
      { as: 'text', path: 'left_out', label: 'Left out because', most: 300, width: 'medium', optional: true },
    ],
  },
  {
    title: 'From gross to net',
    hint: 'The bomb turns the water that forms to liquid; in a fire it leaves as vapour.',
    fields: [
      {
        as: 'choice',
        path: 'hydrogen/by',
        label: 'The water is known from',
        start: 'content',
        options: [
          { value: 'content', label: 'the hydrogen of the sample' },
          { value: 'condensate', label: 'the water weighed after a run' },
          { value: 'formula', label: 'the chemical formula' },
          { value: 'elements', label: 'the elementary analysis' },
        ],
      },
      {
        as: 'number',
        path: 'hydrogen/hydrogen_pct',
        label: 'Hydrogen of the sample as it was burnt',
        unit: '%',
        minimum: 0,
        maximum: 100,
        when: hydrogenBy('content'),
      },
      {
        as: 'number',
        path: 'hydrogen/water_kg_kg',
        label: 'Water weighed per kg of sample',
        unit: 'kg/kg',
        minimum: 0,
        maximum: 10,
        when: hydrogenBy('condensate'),
      },
      {
        as: 'text',
        path: 'formula',
        label: 'Chemical formula',
        hint: 'With it the heat is also held against the oxygen the material takes up.',
        most: 200,
        width: 'medium',
        when: (values) => !hydrogenBy('formula')(values) && !hydrogenBy('elements')(values),
        optional: true,
      },
      {
        as: 'text',
        path: 'formula',
        label: 'Chemical formula',
        most: 200,
        width: 'medium',
        when: hydrogenBy('formula'),
      },
    ],
  },
  {
    title: 'Elementary analysis of the dry sample',
    when: hydrogenBy('elements'),
    fields: elementFields,
  },
  {
    title: 'Water',
    fields: [
      ...moistureFields('analysed', 'Water in the sample when it was burnt', 'Left empty: it was dry.'),
      ...moistureFields('received', 'Water in the material as it lies there', 'Left empty: as it was burnt.'),
    ],
  },
];
