import type { FieldSection, Values } from '../field-spec.ts';
import { moistureFields } from './moisture-fields.ts';
import { elementFields } from './elements-fields.ts';

const gross = (values: Values): boolean => values.heat === 'gross';
const bySheet = (values: Values): boolean => values['range/by'] === 'sheet';

export const SUPPLIER_FIELDS: readonly FieldSection[] = [
  {
    title: 'What the sheet says',
    fields: [
      { as: 'number', path: 'heat_MJ', label: 'Heat of combustion', unit: 'MJ', minimum: 0.000001, maximum: 1_000_000 },
      {
        as: 'choice',
        path: 'per',
        label: 'For each',
        start: 'kg',
        options: [
          { value: 'kg', label: 'kilogram' },
          { value: 'L', label: 'litre' },
          { value: 'm3', label: 'cubic metre' },
        ],
      },
      {
        as: 'number',
        path: 'density_kg_m3',
        label: 'Density',
        hint: 'Brings the heat to one kilogram.',
        unit: 'kg/m3',
        own: true,
        minimum: 0.1,
        maximum: 25_000,
        when: (values) => values.per === 'L' || values.per === 'm3',
      },
      {
        as: 'choice',
        path: 'heat',
        label: 'It is the',
        start: 'net',
        options: [
          { value: 'net', label: 'net (lower) heat: the water leaves as vapour' },
          { value: 'gross', label: 'gross (higher) heat: the water is liquid' },
        ],
      },
      {
        as: 'choice',
        path: 'state',
        label: 'Of the material',
        start: 'as-received',
        options: [
          { value: 'as-received', label: 'as it is delivered' },
          { value: 'dry', label: 'dry' },
        ],
      },
      ...moistureFields(
        'moisture',
        'Water in the material as it lies there',
        'Needed to bring a dry heat to the material as it is kept.',
      ),
    ],
  },
  {
    title: 'From gross to net',
    hint: 'One of the two is enough.',
    when: gross,
    fields: [
      {
        as: 'number',
        path: 'hydrogen_pct',
        label: 'Hydrogen of the dry material',
        unit: '%',
        minimum: 0,
        maximum: 100,
        optional: true,
      },
    ],
  },
  {
    title: 'What it is made of',
    hint: 'Holds the heat against the oxygen the material takes up, which finds a wrong basis. Formula or analysis, either is enough.',
    fields: [
      {
        as: 'text',
        path: 'formula',
        label: 'Chemical formula',
        most: 200,
        width: 'medium',
        optional: true,
      },
      {
        as: 'material',
        path: 'counterpart',
        label: 'The built-in material of the same sort',
        hint: 'The value is held against its range.',
        optional: true,
      },
    ],
  },
  {
    title: 'Elementary analysis of the dry material',
    folded: true,
    fields: elementFields.map((field) => ({ ...field, optional: true })),
  },
  {
    title: 'How sure it is',
    fields: [
      {
        as: 'choice',
        path: 'range/by',
        label: 'Low and high come from',
        start: 'class',
        options: [
          { value: 'class', label: 'the kind of evidence' },
          { value: 'sheet', label: 'the sheet itself' },
        ],
      },
      {
        as: 'number',
        path: 'range/low_MJ',
        label: 'Low',
        hint: 'On the same basis as the value.',
        unit: 'MJ',
        minimum: 0.000001,
        maximum: 1_000_000,
        when: bySheet,
      },
      {
        as: 'number',
        path: 'range/high_MJ',
        label: 'High',
        unit: 'MJ',
        minimum: 0.000001,
        maximum: 1_000_000,
        when: bySheet,
      },
      {
        as: 'choice',
        path: 'range/evidence',
        label: 'The value is',
        start: 'class',
        options: [
          { value: 'exact', label: 'of an exactly known compound (1 %)' },
          { value: 'laboratory', label: 'measured on this material (3 %)' },
          { value: 'class', label: 'of its class of materials (7 %)' },
          { value: 'mixed', label: 'of a mixed or varying good (15 %)' },
        ],
        when: (values) => !bySheet(values),
      },
    ],
  },
];
