import type { NumberSpec } from '../field-spec.ts';

const ELEMENTS = [
  ['carbon', 'Carbon'],
  ['hydrogen', 'Hydrogen'],
  ['oxygen', 'Oxygen'],
  ['nitrogen', 'Nitrogen'],
  ['sulfur', 'Sulfur'],
  ['chlorine', 'Chlorine'],
  ['ash', 'Ash'],
] as const;

/** The shares of an elementary analysis. Without oxygen, what is left to 100 is oxygen, as laboratories report it. */
export const elementFields: readonly NumberSpec[] = ELEMENTS.map(([key, label]) => ({
  as: 'number',
  path: `elements/${key}_pct`,
  label,
  unit: '%',
  minimum: 0,
  maximum: 100,
  ...(key === 'oxygen' ? { hint: 'Left empty: what is missing to 100.' } : {}),
  ...(key === 'carbon' || key === 'hydrogen' ? {} : { optional: true }),
}));
